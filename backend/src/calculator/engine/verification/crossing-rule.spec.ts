import { LoopMargin, smallestPhaseMargin } from '../chain/loop-crossings';
import { magnitude } from './complex-matrix.test-support';
import {
  HIGHEST_HZ,
  LOWEST_HZ,
  RationalLoop,
  loopGainAt,
  randomLoop,
  unstablePoles,
} from './random-loops.test-support';

const LOOPS = 1000;

interface Judged {
  readonly seed: number;
  readonly loop: RationalLoop;
  readonly rule: LoopMargin;
  readonly unstable: number;
}

const judge = (loop: RationalLoop): LoopMargin =>
  smallestPhaseMargin((hz) => loopGainAt(loop, hz), LOWEST_HZ, HIGHEST_HZ);

const judged: readonly Judged[] = Array.from({ length: LOOPS }, (_, seed) => {
  const loop = randomLoop(seed + 1);
  return { seed: seed + 1, loop, rule: judge(loop), unstable: unstablePoles(loop) };
});

const positive = ({ rule }: Judged): boolean => rule.phaseMarginDeg === null || rule.phaseMarginDeg > 0;

/**
 * The smallest unwrapped phase margin over all crossings of |T| = 1, against the Nyquist criterion (H. Nyquist,
 * Bell System Technical Journal 11 (1932), p. 126): the turns of 1 + T about zero. For loops that are stable when open:
 * every margin positive ⇒ stable; with one crossing also the other way round. With several crossings a loop whose |T|
 * rises above 1 again while its phase is beyond −180° may be stable though a margin is negative: the rule calls it bad.
 */
describe('crossing rule against the Nyquist criterion on 1,000 random loops', () => {
  it('every margin positive: no closed-loop pole in the right half plane', () => {
    expect(judged.filter((one) => positive(one) && one.unstable !== 0).map(({ seed }) => seed)).toEqual([]);
  });

  it('one crossing with a negative margin: unstable', () => {
    const single = judged.filter((one) => one.rule.crossingsHz.length === 1 && !positive(one));
    expect(single.length).toBeGreaterThan(100);
    expect(single.filter(({ unstable }) => unstable === 0).map(({ seed }) => seed)).toEqual([]);
  });

  it('stable with a negative margin only where |T| rises above 1 again', () => {
    const pessimistic = judged.filter((one) => !positive(one) && one.unstable === 0);
    expect(pessimistic.filter(({ rule }) => rule.crossingsHz.length < 3).map(({ seed }) => seed)).toEqual([]);
    expect(pessimistic.length).toBeLessThan(LOOPS / 20);
  });

  it('no crossing: stable', () => {
    const none = judged.filter(({ rule }) => rule.noCrossing);
    expect(none.length).toBeGreaterThan(10);
    expect(none.filter(({ unstable, rule }) => unstable !== 0 || rule.crossingsHz.length > 0)).toEqual([]);
  });

  it('finds every crossing that a fine walk finds', () => {
    for (const { seed, loop, rule } of judged.filter((_, i) => i % 10 === 0)) {
      let crossings = 0;
      let above = magnitude(loopGainAt(loop, LOWEST_HZ)) >= 1;
      for (let i = 1; i <= 24000; i++) {
        const now = magnitude(loopGainAt(loop, LOWEST_HZ * (HIGHEST_HZ / LOWEST_HZ) ** (i / 24000))) >= 1;
        if (now !== above) crossings++;
        above = now;
      }
      expect({ seed, crossings: rule.crossingsHz.length }).toEqual({ seed, crossings });
    }
  });

  it('the draw has loops of every sort: stable, unstable, several crossings, conditionally stable', () => {
    expect(judged.filter(({ unstable }) => unstable === 0).length).toBeGreaterThan(200);
    expect(judged.filter(({ unstable }) => unstable > 0).length).toBeGreaterThan(200);
    expect(judged.filter(({ rule }) => rule.crossingsHz.length >= 3).length).toBeGreaterThan(20);
    // Stable although the phase is beyond −180° somewhere below the crossing.
    const conditional = judged.filter(
      ({ loop, rule, unstable }) => unstable === 0 && rule.crossingHz !== null && phaseDips(loop, rule.crossingHz),
    );
    expect(conditional.length).toBeGreaterThan(5);
  });
});

/** Whether T crosses the negative real axis with |T| > 1 on the way. */
function phaseDips(loop: RationalLoop, toHz: number): boolean {
  let previous = loopGainAt(loop, LOWEST_HZ);
  for (let hz = LOWEST_HZ; hz < toHz; hz *= 1.02) {
    const now = loopGainAt(loop, hz);
    if (now.re < -1 && now.im * previous.im < 0) return true;
    previous = now;
  }
  return false;
}

describe('crossing rule on loops with a known answer', () => {
  const plain = { zerosHz: [], pairs: [] };

  it('the count of turns: three equal poles are unstable with a pair of poles above a DC gain of 8 (Routh)', () => {
    expect(unstablePoles({ ...plain, dcGain: 7.9, polesHz: [1e6, 1e6, 1e6] })).toBe(0);
    expect(unstablePoles({ ...plain, dcGain: 8.1, polesHz: [1e6, 1e6, 1e6] })).toBe(2);
  });

  it('two poles far apart: 45° where the second pole is at the crossing', () => {
    // |T| = 1 at f2 with 1000/(f2/f1)/√2, so f2 = 1000·f1/√2.
    const rule = judge({ ...plain, dcGain: 1000, polesHz: [1000, (1000 * 1000) / Math.SQRT2] });
    expect(rule.phaseMarginDeg).toBeCloseTo(45.08, 2);
    expect(rule.crossingHz! / 707.1e3).toBeCloseTo(1, 3);
  });

  it('three equal poles: margin 0 at a DC gain of 8, where each turns 60°', () => {
    const rule = judge({ ...plain, dcGain: 8, polesHz: [1e6, 1e6, 1e6] });
    expect(rule.phaseMarginDeg).toBeCloseTo(0, 6);
    expect(rule.crossingHz! / (1e6 * Math.sqrt(3))).toBeCloseTo(1, 9);
  });

  it('six poles at a high gain: the margin goes below −180°, which a principal value cannot show', () => {
    const rule = judge({ ...plain, dcGain: 1e6, polesHz: [1e3, 1e3, 1e3, 1e3, 1e3, 1e3] });
    // |T| = 1 at f/f1 = √(1e2 − 1): 6·84.26° = 505.6°.
    expect(rule.phaseMarginDeg).toBeCloseTo(180 - (6 * Math.atan(Math.sqrt(99)) * 180) / Math.PI, 6);
    expect(rule.phaseMarginDeg!).toBeLessThan(-180);
  });

  it('a loop gain below 1 everywhere has no crossing', () => {
    const rule = judge({ ...plain, dcGain: 0.9, polesHz: [1e3, 1e5] });
    expect(rule).toMatchObject({ noCrossing: true, phaseMarginDeg: null, crossingHz: null, crossingsHz: [] });
  });
});

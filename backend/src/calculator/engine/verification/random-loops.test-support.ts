import { Complex, argument, complex, divide, magnitude, multiply, add } from './complex-matrix.test-support';
import { SeededRandom } from './random-chains.test-support';

/** Taken out once: globals are slow to reach inside the test runner. */
const { sqrt, PI, round, abs, hypot, min } = Math;

/** A rational loop gain T(s) with T(0) > 0 and all its poles in the left half plane, given by corner frequencies. */
export interface RationalLoop {
  readonly dcGain: number;
  readonly polesHz: readonly number[];
  readonly zerosHz: readonly number[];
  /** Pairs of poles or zeros: natural frequency and quality factor. */
  readonly pairs: readonly LoopPair[];
}

interface LoopPair {
  readonly hz: number;
  readonly q: number;
  readonly kind: 'pole' | 'zero';
}

export const LOWEST_HZ = 1;
export const HIGHEST_HZ = 1e19;

export function loopGainAt(loop: RationalLoop, frequencyHz: number): Complex {
  const factor = (hz: number): Complex => complex(1, frequencyHz / hz);
  const pair = (hz: number, q: number): Complex => {
    const x = frequencyHz / hz;
    return complex(1 - x * x, x / q);
  };
  let numerator = complex(loop.dcGain);
  let denominator = complex(1);
  for (const hz of loop.zerosHz) numerator = multiply(numerator, factor(hz));
  for (const hz of loop.polesHz) denominator = multiply(denominator, factor(hz));
  for (const { hz, q, kind } of loop.pairs) {
    if (kind === 'zero') numerator = multiply(numerator, pair(hz, q));
    else denominator = multiply(denominator, pair(hz, q));
  }
  return divide(numerator, denominator);
}

/**
 * Two to six poles and up to two zeros, some of them as lightly damped pairs: loops that cross |T| = 1 once, several
 * times, with the phase already beyond −180° (conditionally stable) or not at all.
 */
export function randomLoop(seed: number): RationalLoop {
  const random = new SeededRandom(seed);
  const draw = random.next();
  if (draw < 0.2) return turningLoop(random);
  return draw < 0.45 ? resonantLoop(random) : plainLoop(random);
}

/** Falls through 1 and is lifted above it again by a resonance; further poles may lie before it. */
function resonantLoop(random: SeededRandom): RationalLoop {
  const poleHz = random.logBetween(1e2, 1e4);
  const dcGain = random.logBetween(10, 1e4);
  const q = random.logBetween(3, 12);
  const crossing = dcGain * poleHz;
  const hz = crossing * random.between(1.2, q);
  const further = Array.from({ length: random.integer(0, 3) }, () => crossing * random.logBetween(0.8, 30));
  return { dcGain, polesHz: [poleHz, ...further], zerosHz: [], pairs: [{ hz, q, kind: 'pole' }] };
}

function plainLoop(random: SeededRandom): RationalLoop {
  const corner = (): number => random.logBetween(1e2, 1e9);
  const polesHz = Array.from({ length: random.integer(2, 4) }, corner);
  const zerosHz = Array.from({ length: random.integer(0, 2) }, () => random.logBetween(Math.min(...polesHz), 1e9));
  const pairs: LoopPair[] = [];
  if (random.chance(0.5)) pairs.push({ hz: random.logBetween(1e4, 1e9), q: random.logBetween(0.5, 10), kind: 'pole' });
  if (random.chance(0.15)) {
    pairs.push({ hz: Math.max(...polesHz) * random.logBetween(0.1, 10), q: random.logBetween(0.5, 10), kind: 'zero' });
  }
  return { dcGain: random.logBetween(0.3, 1e6), polesHz, zerosHz: properZeros(polesHz, zerosHz, pairs), pairs };
}

/** Three low poles take the phase beyond −180°, two zeros bring it back, then come further poles or a resonance. */
function turningLoop(random: SeededRandom): RationalLoop {
  const polesHz = [0, 1, 2].map(() => random.logBetween(1e2, 1e4)).concat(random.logBetween(1e6, 1e9));
  const zerosHz = [random.logBetween(3e4, 1e6), random.logBetween(3e4, 1e6)];
  const pairs: LoopPair[] = [];
  if (random.chance(0.5)) pairs.push({ hz: random.logBetween(1e5, 1e8), q: random.logBetween(1, 10), kind: 'pole' });
  return { dcGain: random.logBetween(1e3, 1e9), polesHz, zerosHz, pairs };
}

/** |T| must fall at the end: fewer zeros than poles. */
function properZeros(
  polesHz: readonly number[],
  zerosHz: readonly number[],
  pairs: readonly LoopPair[],
): readonly number[] {
  const order = pairs.reduce((sum, { kind }) => sum + (kind === 'pole' ? 2 : -2), polesHz.length);
  return zerosHz.slice(0, Math.max(0, order - 1));
}

/**
 * Closed-loop poles in the right half plane: the turns of 1 + T(jω) about 0 from ω = 0 to ∞, followed in steps of less
 * than 0.2 rad. T has no such poles itself, so every one takes 1 + T back by half a turn on this half axis.
 */
export function unstablePoles(loop: RationalLoop): number {
  const at = (frequencyHz: number): Complex => add(complex(1), loopGainAt(loop, frequencyHz));
  let turned = argument(at(LOWEST_HZ));
  const walk = (from: number, to: number, fromValue: Complex, toValue: Complex, depth: number): void => {
    const step = argument(divide(toValue, fromValue));
    const closeToZero = min(magnitude(fromValue), magnitude(toValue));
    const moved = hypot(toValue.re - fromValue.re, toValue.im - fromValue.im);
    if (depth > 40 || (abs(step) < 0.2 && moved < 0.5 * closeToZero)) {
      turned += step;
      return;
    }
    const middle = sqrt(from * to);
    const value = at(middle);
    walk(from, middle, fromValue, value, depth + 1);
    walk(middle, to, value, toValue, depth + 1);
  };
  const stepsPerDecade = 20;
  const ratio = 10 ** (1 / stepsPerDecade);
  for (let hz = LOWEST_HZ; hz < HIGHEST_HZ * 0.999; hz *= ratio) walk(hz, hz * ratio, at(hz), at(hz * ratio), 0);
  const halfTurns = -turned / PI;
  const poles = round(halfTurns) + 0;
  if (abs(halfTurns - poles) > 0.02) throw new Error(`the locus does not close: ${halfTurns} half turns`);
  return poles;
}

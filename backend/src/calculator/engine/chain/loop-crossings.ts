import type { Complex, MutableComplex } from '../complex';
import { findRoot } from '../root';

/** Taken out once: these run at every frequency. */
const { atan2, ceil, exp, log, log10, max, sqrt } = Math;

/** What the crossings of |T| = 1 say about a loop. */
export interface LoopMargin {
  readonly noCrossing: boolean;
  /** Smallest over all crossings, degrees, phase unwrapped from the low end of the range; null without a crossing. */
  readonly phaseMarginDeg: number | null;
  /** Where that smallest margin is. */
  readonly crossingHz: number | null;
  /** Every crossing, ascending. */
  readonly crossingsHz: readonly number[];
}

/** A loop gain written into `out`, so that a scan allocates nothing per frequency. */
export type LoopFunction = (frequencyHz: number, out: MutableComplex) => void;

/** Loop gains already known on an ascending grid. */
export interface LoopSamples {
  readonly frequenciesHz: readonly number[];
  readonly re: readonly number[];
  readonly im: readonly number[];
  /** How many of them count. */
  readonly length: number;
}

interface Crossing {
  readonly frequencyHz: number;
  /** Unwrapped, radians. */
  readonly phase: number;
}

/** cos² of 60°: an interval over which the phase turns further is halved, or the unwrapped phase could be a turn off. */
const LARGEST_TURN_COS_SQUARED = 0.25;
const DEEPEST_TURN = 24;
/** Intervals beside an extremum of |T| are cut this often: two crossings could hide between their ends. */
const EXTREMUM_DEPTH = 4;
/** Of the logarithm of the frequency. */
const TOLERANCE = 1e-11;

/**
 * Walks a loop from low to high frequency and collects the crossings of |T| = 1. The phase is followed by counting the
 * passages of the negative real axis; only at a crossing is an angle computed.
 */
class LoopWalk {
  readonly crossings: Crossing[] = [];
  private readonly out: MutableComplex = { re: 0.5, im: 0.5 };
  private turns = 0;

  constructor(
    private readonly loop: LoopFunction,
    private hz: number,
    private re: number,
    private im: number,
  ) {}

  /** Goes on to the next known sample; `depth` > 0 cuts the interval that often whatever its ends look like. */
  goTo(hz: number, re: number, im: number, depth: number, halvings = 0): void {
    const fromPower = this.re * this.re + this.im * this.im;
    const toPower = re * re + im * im;
    const dot = this.re * re + this.im * im;
    const steep = dot < 0 || dot * dot < LARGEST_TURN_COS_SQUARED * fromPower * toPower;
    if (depth > 0 || (steep && halvings < DEEPEST_TURN)) {
      const middle = sqrt(this.hz * hz);
      this.loop(middle, this.out);
      this.goTo(middle, this.out.re, this.out.im, depth - 1, halvings + 1);
      this.goTo(hz, re, im, depth - 1, halvings + 1);
      return;
    }
    if (fromPower >= 1 !== toPower >= 1) this.cross(hz, fromPower, toPower);
    this.turns += this.passage(re, im);
    this.hz = hz;
    this.re = re;
    this.im = im;
  }

  /** Turns that the principal value misses on the way to a near point: −1 over the negative real axis downwards… */
  private passage(re: number, im: number): number {
    if (im >= 0 === this.im >= 0 || (re >= 0 && this.re >= 0)) return 0;
    // The chord's place on the real axis decides where one end lies to the right of the imaginary axis.
    const onRealAxis = this.re - (this.im * (re - this.re)) / (im - this.im);
    if (onRealAxis > 0) return 0;
    return im >= 0 ? -1 : 1;
  }

  private cross(toHz: number, fromPower: number, toPower: number): void {
    const { out } = this;
    const logPower = (logHz: number): number => {
      this.loop(exp(logHz), out);
      return log(out.re * out.re + out.im * out.im);
    };
    const from = log(this.hz);
    const logHz = findRoot(logPower, from, log(fromPower), log(toHz), log(toPower), TOLERANCE);
    const frequencyHz = exp(logHz);
    this.loop(frequencyHz, out);
    const turns = this.turns + this.passage(out.re, out.im);
    this.crossings.push({ frequencyHz, phase: atan2(out.im, out.re) + 2 * Math.PI * turns });
  }
}

/** |T| has an extremum at sample i that points towards 1: a local minimum above it or a local maximum below it. */
function turnsTowardsOne(power: readonly number[], i: number, length: number): boolean {
  if (i <= 0 || i >= length - 1) return false;
  const dip = power[i] < power[i - 1] && power[i] < power[i + 1];
  const rise = power[i] > power[i - 1] && power[i] > power[i + 1];
  return power[i] >= 1 ? dip : rise;
}

/**
 * Smallest phase margin over all crossings of |T| = 1 of a sampled loop; the phase is unwrapped from the first sample, whose
 * principal value counts. Intervals in which the phase turns by more than 60° and those beside an extremum that points
 * towards |T| = 1 are cut further with `loop`.
 */
export function marginFromSamples(samples: LoopSamples, loop: LoopFunction): LoopMargin {
  const { frequenciesHz, re, im, length } = samples;
  const power: number[] = [];
  for (let i = 0; i < length; i++) power.push(re[i] * re[i] + im[i] * im[i]);
  const walk = new LoopWalk(loop, frequenciesHz[0], re[0], im[0]);
  for (let i = 1; i < length; i++) {
    const hidden = turnsTowardsOne(power, i - 1, length) || turnsTowardsOne(power, i, length);
    walk.goTo(frequenciesHz[i], re[i], im[i], hidden ? EXTREMUM_DEPTH : 0);
  }
  return marginOf(walk.crossings);
}

function marginOf(crossings: readonly Crossing[]): LoopMargin {
  if (crossings.length === 0) return { noCrossing: true, phaseMarginDeg: null, crossingHz: null, crossingsHz: [] };
  const smallest = crossings.reduce((worst, next) => (next.phase < worst.phase ? next : worst));
  return {
    noCrossing: false,
    phaseMarginDeg: 180 + (smallest.phase * 180) / Math.PI,
    crossingHz: smallest.frequencyHz,
    crossingsHz: crossings.map((crossing) => crossing.frequencyHz),
  };
}

/**
 * Smallest unwrapped phase margin of a loop function over all its crossings of |T| = 1 between two frequencies. The phase
 * at `fromHz` counts with its principal value, so start where T is still near its DC value.
 * Source: definition of the phase margin; every crossing counts, because with several the last alone shows nothing.
 *
 * @param pointsPerDecade of the first grid, refined where needed
 * @example smallestPhaseMargin((f) => divide(complex(100), complex(1, f)), 1e-3, 1e6).phaseMarginDeg // ≈ 90.6
 */
export function smallestPhaseMargin(
  loop: (frequencyHz: number) => Complex,
  fromHz: number,
  toHz: number,
  pointsPerDecade = 60,
): LoopMargin {
  const length = max(2, ceil(log10(toHz / fromHz) * pointsPerDecade) + 1);
  const frequenciesHz = Array.from({ length }, (_, i) => fromHz * (toHz / fromHz) ** (i / (length - 1)));
  const values = frequenciesHz.map(loop);
  const re = values.map((value) => value.re);
  const im = values.map((value) => value.im);
  return marginFromSamples({ frequenciesHz, re, im, length }, (frequencyHz, out) => {
    const value = loop(frequencyHz);
    out.re = value.re;
    out.im = value.im;
  });
}

import type { MutableComplex } from '../complex';
import type { ChainResponse } from './response';
import { StageSpan, stageSpan } from './stage-span';

/** Taken out once: these run at every frequency. */
const { abs, ceil, log10, max, min, sqrt } = Math;

const COARSE_PER_DECADE = 2;
const FINE_PER_DECADE = 4;
const LOWEST_HZ = 1;
/** |T|² between 1/400 and 400 (±26 dB) of any loop: crossings and peaks are near, so that every interval is looked into. */
const NEAR_ONE = 400;
/** How far the middle of an interval may lie from the line between its ends, in the square of T and in power. */
const STRAIGHT = 0.1;
/** Relative power below which nothing can become the peak of a stage. */
const FAINT = 0.25;
const DEEPEST = 6;

/** One feedback stage over the common grid. */
export interface StageScan {
  /** 1-based place in the chain. */
  readonly index: number;
  readonly span: StageSpan;
  /** Plain arrays: short typed arrays live outside the heap and cost more to collect than to fill. */
  readonly re: number[];
  readonly im: number[];
  /** |H|² over the ideal gain's square. */
  readonly power: number[];
}

/** Loop gain and relative power of every scanned stage at one frequency. */
interface Point {
  readonly frequencyHz: number;
  readonly re: number[];
  readonly im: number[];
  readonly power: number[];
}

/** Ascending grid from 1 Hz: coarse where every loop still has much gain, fine up to the highest limit. */
function firstGrid(fineFromHz: number, toHz: number): number[] {
  const coarse = max(0, ceil(log10(fineFromHz / LOWEST_HZ) * COARSE_PER_DECADE));
  const startHz = coarse > 0 ? fineFromHz : LOWEST_HZ;
  const fine = max(1, ceil(log10(toHz / startHz) * FINE_PER_DECADE));
  const grid: number[] = [];
  for (let i = 0; i < coarse; i++) grid.push(LOWEST_HZ * (startHz / LOWEST_HZ) ** (i / coarse));
  for (let i = 0; i <= fine; i++) grid.push(startHz * (toHz / startHz) ** (i / fine));
  return grid;
}

/** True when any loop is near |T| = 1 at a point. */
function isNearOne({ re, im }: Point): boolean {
  for (let k = 0; k < re.length; k++) {
    const power = re[k] * re[k] + im[k] * im[k];
    if (power < NEAR_ONE && power > 1 / NEAR_ONE) return true;
  }
  return false;
}

/** |T_m²/(T_a·T_b) − 1| is small: on logarithmic axes the loop runs straight through the middle. */
function loopIsStraight(a: Point, m: Point, b: Point, k: number): boolean {
  const squareRe = m.re[k] * m.re[k] - m.im[k] * m.im[k];
  const squareIm = 2 * m.re[k] * m.im[k];
  const productRe = a.re[k] * b.re[k] - a.im[k] * b.im[k];
  const productIm = a.re[k] * b.im[k] + a.im[k] * b.re[k];
  const offRe = squareRe - productRe;
  const offIm = squareIm - productIm;
  return offRe * offRe + offIm * offIm <= STRAIGHT * STRAIGHT * (productRe * productRe + productIm * productIm);
}

function powerIsStraight(a: Point, m: Point, b: Point, k: number): boolean {
  const highest = max(a.power[k], m.power[k], b.power[k]);
  if (highest < FAINT) return true;
  const straight = sqrt(a.power[k] * b.power[k]);
  return abs(m.power[k] - straight) <= STRAIGHT * straight;
}

function isStraight(a: Point, m: Point, b: Point): boolean {
  for (let k = 0; k < m.re.length; k++) {
    if (!loopIsStraight(a, m, b, k) || !powerIsStraight(a, m, b, k)) return false;
  }
  return true;
}

/**
 * Loop gain and relative gain of all feedback stages over one grid; every point is solved once for all of them. Near
 * |T| = 1 intervals are halved until loops and gains run straight in them on logarithmic axes, so that neither a pair of
 * crossings nor a resonance hides between two points.
 *
 * @param response a chain with at least one feedback stage
 * @returns ascending frequencies in Hz, and one scan for each feedback stage
 * @example scanStages(response).scans[0].re.length === scanStages(response).grid.length
 */
export function scanStages(response: ChainResponse): { grid: number[]; scans: StageScan[] } {
  const { network } = response;
  const scans = network.prepared.flatMap((prepared, k): StageScan[] => {
    const span = stageSpan(prepared);
    return span ? [{ index: k + 1, span, re: [], im: [], power: [] }] : [];
  });
  const fineFromHz = min(...scans.map(({ span }) => span.cornerHz)) * 1e-3;
  const first = firstGrid(fineFromHz, max(...scans.map(({ span }) => span.limitHz)));
  const out: MutableComplex = { re: 0.5, im: 0.5 };
  const grid: number[] = [];

  const sample = (frequencyHz: number): Point => {
    response.solve(frequencyHz);
    const point: Point = { frequencyHz, re: [], im: [], power: [] };
    for (const { index } of scans) {
      network.stages[index - 1].loop?.loadedLoopGain(out);
      point.re.push(out.re);
      point.im.push(out.im);
      point.power.push(response.power[index]);
    }
    return point;
  };
  const keep = (point: Point): void => {
    grid.push(point.frequencyHz);
    scans.forEach((scan, k) => {
      scan.re.push(point.re[k]);
      scan.im.push(point.im[k]);
      scan.power.push(point.power[k]);
    });
  };
  /** Keeps what lies between two points, and the later one. */
  const between = (a: Point, b: Point, depth: number): void => {
    if (depth > 0 && (isNearOne(a) || isNearOne(b))) {
      const middle = sample(sqrt(a.frequencyHz * b.frequencyHz));
      const left = isStraight(a, middle, b) ? 0 : depth - 1;
      between(a, middle, left);
      between(middle, b, left);
    } else keep(b);
  };

  let last = sample(first[0]);
  keep(last);
  for (const frequencyHz of first.slice(1)) {
    const next = sample(frequencyHz);
    between(last, next, DEEPEST);
    last = next;
  }
  return { grid, scans };
}

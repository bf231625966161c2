import type { Complex } from '../complex';

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

/** Smallest unwrapped phase margin of a loop function over all its crossings of |T| = 1 in a range. */
export function smallestPhaseMargin(
  _loop: (frequencyHz: number) => Complex,
  _fromHz: number,
  _toHz: number,
): LoopMargin {
  throw new Error('not available yet');
}

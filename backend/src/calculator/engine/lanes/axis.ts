import type { FrequencyAxis, Lane } from '../report';

/** Room left of the lowest and right of the highest mark. */
const MARGIN = 1.3;
const LEAST_SPAN = 100;
/** Marks further away than this from the band are left off the axis. */
const FURTHEST_BELOW = 1e3;
const FURTHEST_ABOVE = 1e3;
const STEPS: readonly number[] = [1, 2, 5, 10];

/** Largest of 1-2-5 × 10ⁿ that is not above the value. */
export function stepDown(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value) + 1e-12);
  const step = [...STEPS].reverse().find((each) => each * decade <= value * (1 + 1e-12)) ?? 1;
  return Number((step * decade).toPrecision(6));
}

/** Smallest of 1-2-5 × 10ⁿ that is not below the value. */
export function stepUp(value: number): number {
  const decade = 10 ** Math.floor(Math.log10(value) + 1e-12);
  const step = STEPS.find((each) => each * decade >= value * (1 - 1e-12)) ?? 10;
  return Number((step * decade).toPrecision(6));
}

/**
 * One logarithmic axis for all lanes of all cases, so that nothing moves when the case is switched: 1-2-5 bounds around
 * bands, corners and ticks, at least two decades.
 *
 * @param lanes every lane of every case
 * @param bandLowHz bottom of the operating band
 * @param bandHighHz top of the operating band
 */
export function frequencyAxis(lanes: readonly Lane[], bandLowHz: number, bandHighHz: number): FrequencyAxis {
  const marks = lanes.flatMap((lane) => [lane.lowerHz, lane.solidToHz, lane.cornerHz, lane.typicalCornerHz]);
  const shown = marks.filter(
    (mark): mark is number =>
      mark !== null && mark >= bandLowHz / FURTHEST_BELOW && mark <= bandHighHz * FURTHEST_ABOVE,
  );
  const lowest = Math.min(bandLowHz / 3, ...shown);
  const highest = Math.max(bandHighHz * 3, ...shown);
  const fromHz = stepDown(lowest / MARGIN);
  const toHz = stepUp(highest * MARGIN);
  return { fromHz, toHz: Math.max(toHz, stepUp(fromHz * LEAST_SPAN)) };
}

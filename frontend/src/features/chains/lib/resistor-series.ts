import { snapToSeries, stepInSeries, type Series } from '../../../lib/preferred-values';

/** What the set-up panel snaps resistors to. */
export type ResistorSeries = Extract<Series, 'E24' | 'E96'> | 'exact';
export const RESISTOR_SERIES: readonly ResistorSeries[] = ['E24', 'E96', 'exact'];

export function nearestPreferred(series: Exclude<ResistorSeries, 'exact'>, ohm: number): number {
  return snapToSeries(ohm, series);
}

/** Every value of a series from one limit to another. */
export function preferredValuesBetween(
  series: Exclude<ResistorSeries, 'exact'>,
  fromOhm: number,
  toOhm: number,
): number[] {
  if (!(fromOhm > 0) || !Number.isFinite(toOhm)) return [];
  const values: number[] = [];
  let value = snapToSeries(fromOhm, series);
  while (value <= toOhm) {
    if (value >= fromOhm) values.push(value);
    value = stepInSeries(value, series, 1);
  }
  return values;
}

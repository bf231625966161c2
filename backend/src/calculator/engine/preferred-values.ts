/** IEC 60063:2015 preferred number series for resistors and capacitors. */
export const PREFERRED_SERIES = ['E6', 'E12', 'E24', 'E48', 'E96', 'E192'] as const;
export type PreferredSeries = (typeof PREFERRED_SERIES)[number];

/** Eight values of E24 differ from the rounded geometric series; the standard lists them, so the list stands here. */
const E24: readonly number[] = [
  10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91,
];

/** The only value of E192 that differs from the rounded geometric series (919 by the formula). */
const E192_EXCEPTION = 920;

function geometric(count: number): readonly number[] {
  return Array.from({ length: count }, (_, index) => Math.round(100 * 10 ** (index / count)));
}

const SERIES: Readonly<Record<PreferredSeries, readonly number[]>> = {
  E6: E24.filter((_, index) => index % 4 === 0).map((value) => value * 10),
  E12: E24.filter((_, index) => index % 2 === 0).map((value) => value * 10),
  E24: E24.map((value) => value * 10),
  E48: geometric(48),
  E96: geometric(96),
  E192: geometric(192).map((value) => (value === 919 ? E192_EXCEPTION : value)),
};

/** Customary tolerance of a series (common practice; the 2015 edition only advises a relation), as a fraction. */
export const CUSTOMARY_TOLERANCE: Readonly<Record<PreferredSeries, number>> = {
  E6: 0.2,
  E12: 0.1,
  E24: 0.05,
  E48: 0.02,
  E96: 0.01,
  E192: 0.005,
};

/**
 * The values of one decade, from 100 to below 1000, ascending.
 *
 * @param series E6 to E192
 * @returns e.g. `preferredDecade('E6')` → [100, 150, 220, 330, 470, 680]
 * @see IEC 60063:2015
 */
export function preferredDecade(series: PreferredSeries): readonly number[] {
  return SERIES[series];
}

/**
 * The preferred value nearest to a target by logarithmic distance (smallest relative error).
 *
 * @param target positive, in any unit (Ω, F)
 * @param series E6 to E192
 * @returns the value in the same unit; `nearestPreferred(599, 'E96')` → 604. A target that is not positive and finite
 *   comes back as it is.
 * @see IEC 60063:2015
 */
export function nearestPreferred(target: number, series: PreferredSeries): number {
  if (!(target > 0) || !Number.isFinite(target)) return target;
  const exponent = Math.floor(Math.log10(target)) - 2;
  const mantissa = target / 10 ** exponent;
  const decade = SERIES[series];
  const candidates = [...decade, decade[0] * 10, decade[decade.length - 1] / 10];
  const nearest = candidates.reduce((best, value) =>
    Math.abs(Math.log(value / mantissa)) < Math.abs(Math.log(best / mantissa)) ? value : best,
  );
  return Number((nearest * 10 ** exponent).toPrecision(4));
}

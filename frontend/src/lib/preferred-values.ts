/** Preferred series of resistors and capacitors, IEC 60063:2015. */
export type Series = 'E6' | 'E12' | 'E24' | 'E48' | 'E96';
export const SERIES: readonly Series[] = ['E6', 'E12', 'E24', 'E48', 'E96'];

/** The older series are not the rounded roots (2.7, 3.0, 3.3 … and 8.2 are historic), so they are listed. Tenths. */
const E24 = [10, 11, 12, 13, 15, 16, 18, 20, 22, 24, 27, 30, 33, 36, 39, 43, 47, 51, 56, 62, 68, 75, 82, 91];

const every = (values: readonly number[], step: number): readonly number[] =>
  values.filter((_value, index) => index % step === 0);

/** E48 and E96 are the roots of ten rounded to three digits. Hundredths. */
const rooted = (count: number): readonly number[] =>
  Array.from({ length: count }, (_unused, index) => Math.round(100 * 10 ** (index / count)));

interface SeriesTable {
  /** Whole numbers within one decade. */
  readonly values: readonly number[];
  /** What the whole numbers stand for: 10^decimals is 1. */
  readonly decimals: number;
}

const TABLES: Readonly<Record<Series, SeriesTable>> = {
  E6: { values: every(E24, 4), decimals: 1 },
  E12: { values: every(E24, 2), decimals: 1 },
  E24: { values: E24, decimals: 1 },
  E48: { values: rooted(48), decimals: 2 },
  E96: { values: rooted(96), decimals: 2 },
};

export function seriesMantissas(series: Series): readonly number[] {
  const { values, decimals } = TABLES[series];
  return values.map((value) => value / 10 ** decimals);
}

/** Preferred values of the decade of `value` and the first of the next, built from decimal text to stay exact. */
function decadeAround(value: number, series: Series): readonly number[] {
  const decade = Math.floor(Math.log10(value));
  const { values, decimals } = TABLES[series];
  const inDecade = (exponent: number): number[] =>
    values.map((mantissa) => Number(`${mantissa}e${exponent - decimals}`));
  return [...inDecade(decade - 1).slice(-1), ...inDecade(decade), ...inDecade(decade + 1).slice(0, 2)];
}

/** The preferred value nearest by ratio. Zero and what is not a positive number come back as they are. */
export function snapToSeries(value: number, series: Series): number {
  if (!(value > 0) || !Number.isFinite(value)) return value;
  return decadeAround(value, series).reduce((best, candidate) =>
    Math.abs(Math.log(candidate / value)) < Math.abs(Math.log(best / value)) ? candidate : best,
  );
}

/** The next preferred value above (1) or below (−1). */
export function stepInSeries(value: number, series: Series, direction: 1 | -1): number {
  if (!(value > 0) || !Number.isFinite(value)) return value;
  const around = decadeAround(value, series);
  const tolerance = 1e-9;
  const beyond =
    direction === 1
      ? around.filter((candidate) => candidate > value * (1 + tolerance))
      : around.filter((candidate) => candidate < value * (1 - tolerance));
  return (direction === 1 ? beyond[0] : beyond[beyond.length - 1]) ?? value;
}

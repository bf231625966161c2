import type { Figure, Unit } from '../api/types';

/** No-break space between number and unit. */
const GAP = '\u00a0';
const MINUS = '\u2212';

const PREFIXES: readonly (readonly [exponent: number, symbol: string])[] = [
  [12, 'T'],
  [9, 'G'],
  [6, 'M'],
  [3, 'k'],
  [0, ''],
  [-3, 'm'],
  [-6, 'µ'],
  [-9, 'n'],
  [-12, 'p'],
  [-15, 'f'],
];

/** A figure ready to print. `text` is number and unit together. */
export interface FormattedFigure {
  readonly number: string;
  readonly unit: string;
  readonly text: string;
}

/** Rounds to `digits` significant digits and prints without exponent, with a true minus sign. */
export function formatSignificant(value: number, digits: number): string {
  if (value === 0) return '0';
  const rounded = Number(value.toPrecision(clampDigits(digits)));
  const magnitude = Math.floor(Math.log10(Math.abs(rounded)));
  const decimals = Math.min(Math.max(0, clampDigits(digits) - 1 - magnitude), 20);
  return rounded.toFixed(decimals).replace('-', MINUS);
}

function clampDigits(digits: number): number {
  return Math.min(Math.max(1, Math.round(digits)), 12);
}

/** The SI prefix under which the rounded number is from 1 to under 1000. */
function prefixFor(value: number, digits: number): readonly [number, string] {
  const rounded = Math.abs(Number(value.toPrecision(clampDigits(digits))));
  const found = PREFIXES.find(([exponent]) => rounded >= Number(`1e${exponent}`));
  return found ?? [-15, 'f'];
}

export function formatSi(value: number, unit: string, digits: number): FormattedFigure {
  if (value === 0) return join('0', unit);
  const [exponent, symbol] = prefixFor(value, digits);
  // Dividing by an exact power of ten keeps 4.7 k from becoming 4.699999 k.
  const mantissa = exponent >= 0 ? value / Number(`1e${exponent}`) : value * Number(`1e${-exponent}`);
  return join(formatSignificant(mantissa, digits), `${symbol}${unit}`);
}

function join(number: string, unit: string, gap: string = unit === '' ? '' : GAP): FormattedFigure {
  return { number, unit, text: `${number}${gap}${unit}` };
}

/** Decibels keep at most four decimals: a droop of 10⁻⁷ dB is a zero to everybody. */
function formatDecibels(value: number, unit: string, digits: number): FormattedFigure {
  if (Math.abs(value) < 5e-5) return join('0.00', unit);
  const decimals = clampDigits(digits) - 1 - Math.floor(Math.log10(Math.abs(value)));
  const text = decimals > 4 ? value.toFixed(4).replace('-', MINUS) : formatSignificant(value, digits);
  return join(text, unit);
}

function formatGain(value: number, digits: number): FormattedFigure {
  const number = formatSignificant(Math.abs(value), digits);
  return value < 0 ? join(`${MINUS}${number}`, '') : join(`×${number}`, '');
}

type Formatter = (value: number, digits: number) => FormattedFigure;

const FORMATTERS: Readonly<Record<Unit, Formatter>> = {
  Hz: (value, digits) => formatSi(value, 'Hz', digits),
  V: (value, digits) => formatSi(value, 'V', digits),
  A: (value, digits) => formatSi(value, 'A', digits),
  W: (value, digits) => formatSi(value, 'W', digits),
  Ω: (value, digits) => formatSi(value, 'Ω', digits),
  F: (value, digits) => formatSi(value, 'F', digits),
  s: (value, digits) => formatSi(value, 's', digits),
  // The trade states slew rates in volts per microsecond whatever their size.
  'V/s': (value, digits) => join(formatSignificant(value / 1e6, digits), 'V/µs'),
  'V/√Hz': (value, digits) => formatSi(value, 'V/√Hz', digits),
  'A/√Hz': (value, digits) => formatSi(value, 'A/√Hz', digits),
  dB: (value, digits) => formatDecibels(value, 'dB', digits),
  dBΩ: (value, digits) => formatDecibels(value, 'dBΩ', digits),
  ratio: (value, digits) => join(`×${formatSignificant(value, digits)}`, ''),
  gain: formatGain,
  number: (value, digits) => join(formatSignificant(value, digits), ''),
  deg: (value, digits) => join(formatSignificant(value, digits), '°', ''),
  fraction: (value, digits) => join(formatSignificant(value * 100, digits), '%'),
};

const EMPTY: FormattedFigure = { number: '–', unit: '', text: '–' };

/** What a figure prints as; a dash when there is no value (the reason is in `figure.reason`). */
export function formatFigure(figure: Figure): FormattedFigure {
  if (figure.value === null || !Number.isFinite(figure.value)) return EMPTY;
  return FORMATTERS[figure.unit](figure.value, figure.digits);
}

/** Any plain number with a unit of the calculator, e.g. a typed resistor. */
export function formatValue(value: number, unit: Unit, digits = 3): string {
  return FORMATTERS[unit](value, digits).text;
}

/** The same quantity the other way round: a ratio in dB, decibels as a ratio. Null where that says nothing. */
export function otherNotation(figure: Figure): string | null {
  const { value, unit, digits } = figure;
  if (value === null || !Number.isFinite(value)) return null;
  if (unit === 'ratio' || unit === 'gain' || unit === 'number') {
    return value === 0 ? null : formatDecibels(20 * Math.log10(Math.abs(value)), 'dB', digits).text;
  }
  if (unit === 'dB') return `×${formatSignificant(10 ** (value / 20), digits)} in voltage`;
  if (unit === 'dBΩ') return formatSi(10 ** (value / 20), 'Ω', digits).text;
  return null;
}

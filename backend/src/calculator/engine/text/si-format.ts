import type { Figure, Money, Unit } from '../report';

/** Sentences use the real minus sign, so that a gain of −10 never breaks or reads as a hyphen. */
export const MINUS = '−';

const PREFIXES: readonly (readonly [number, string])[] = [
  [1e12, 'T'],
  [1e9, 'G'],
  [1e6, 'M'],
  [1e3, 'k'],
  [1, ''],
  [1e-3, 'm'],
  [1e-6, 'µ'],
  [1e-9, 'n'],
  [1e-12, 'p'],
  [1e-15, 'f'],
  [1e-18, 'a'],
];

const PREFIXED: ReadonlySet<Unit> = new Set(['Hz', 'V', 'A', 'W', 'Ω', 'F', 's', 'V/√Hz', 'A/√Hz']);

/**
 * A number with this many significant digits, in plain decimals with the real minus sign.
 *
 * @param value finite number
 * @param digits significant digits, 1 to 15
 * @returns e.g. `significant(77.04, 3)` → "77.0"; `significant(-1234, 3)` → "−1230"
 */
export function significant(value: number, digits: number): string {
  const rounded = Number(value.toPrecision(digits));
  if (rounded === 0) return (0).toPrecision(digits);
  const text = Math.abs(rounded).toPrecision(digits);
  const plain = text.includes('e') ? plainDecimal(Math.abs(rounded), digits) : text;
  return rounded < 0 ? MINUS + plain : plain;
}

function plainDecimal(value: number, digits: number): string {
  if (value >= 1e21) return value.toExponential(digits - 1).replace('e+', '·10^');
  if (value >= 1) return value.toFixed(0);
  const decimals = digits - 1 - Math.floor(Math.log10(value));
  return decimals <= 100 ? value.toFixed(decimals) : '0';
}

/**
 * As `significant`, without trailing zeros: for values that somebody typed ("7 MHz", "×3", "10.7 MHz").
 *
 * @param value finite number
 * @param digits most significant digits
 * @returns e.g. `trimmed(7, 4)` → "7"; `trimmed(10.70, 4)` → "10.7"
 */
export function trimmed(value: number, digits: number): string {
  const text = significant(value, digits);
  return text.includes('.') ? text.replace(/\.?0+$/, '') : text;
}

/**
 * The SI prefix under which the rounded number lies between 1 and 1000.
 *
 * @param value finite number in the base unit
 * @param digits significant digits that it is rounded to
 * @returns factor of the prefix and its letter, e.g. `prefixFor(7e6, 3)` → [1e6, 'M']
 */
export function prefixFor(value: number, digits: number): readonly [number, string] {
  const magnitude = Math.abs(Number(value.toPrecision(digits)));
  if (magnitude === 0) return [1, ''];
  return PREFIXES.find(([factor]) => magnitude >= factor) ?? [1e-18, 'a'];
}

/** How a number of a unit is written: all its digits, or without trailing zeros. */
export type NumberStyle = 'all-digits' | 'trimmed';

/**
 * A number with its unit as it stands in a sentence.
 *
 * @param value finite number in the SI unit
 * @param unit unit; `ratio` → ×0.974, `gain` → ×10 or −10, `number` → 11, `fraction` → %, `V/s` → V/µs
 * @param digits significant digits
 * @param style `trimmed` leaves trailing zeros out
 * @returns e.g. `quantity(77e6, 'Hz', 3)` → "77.0 MHz"
 */
export function quantity(value: number, unit: Unit, digits: number, style: NumberStyle = 'all-digits'): string {
  const write = style === 'trimmed' ? trimmed : significant;
  switch (unit) {
    case 'ratio':
      return `×${write(value, digits)}`;
    case 'gain':
      return value < 0 ? trimmed(value, digits) : `×${trimmed(value, digits)}`;
    case 'number':
      return write(value, digits);
    case 'deg':
      return `${write(value, digits)}°`;
    case 'fraction':
      return `${write(value * 100, digits)} %`;
    case 'V/s':
      return `${write(value / 1e6, digits)} V/µs`;
    default:
      return prefixed(value, unit, digits, write);
  }
}

function prefixed(value: number, unit: Unit, digits: number, write: (v: number, d: number) => string): string {
  if (!PREFIXED.has(unit)) return `${write(value, digits)} ${unit}`;
  const [factor, letter] = prefixFor(value, digits);
  return `${write(value / factor, digits)} ${letter}${unit}`;
}

/** A value as typed by a person: up to six digits, no trailing zeros. `typed(7e6, 'Hz')` → "7 MHz". */
export function typed(value: number, unit: Unit): string {
  return quantity(value, unit, 6, 'trimmed');
}

/** A figure in words: its number with unit, or the reason why there is none. */
export function formatFigure(figure: Figure): string {
  if (figure.value === null) return figure.reason ?? 'not known';
  return quantity(figure.value, figure.unit, figure.digits);
}

/**
 * Integer micro-units as decimals: at least two, at most six, exact.
 *
 * @param amountMicros millionths of the currency unit
 * @returns e.g. `decimalAmount(620000)` → "0.62"; `decimalAmount(4200)` → "0.0042"
 */
export function decimalAmount(amountMicros: number): string {
  const sign = amountMicros < 0 ? MINUS : '';
  const digits = BigInt(Math.abs(Math.round(amountMicros)))
    .toString()
    .padStart(7, '0');
  const fraction = digits.slice(-6).replace(/0{1,4}$/, '');
  return `${sign}${digits.slice(0, -6)}.${fraction}`;
}

/** Money in words: "8.12 USD", or the reason why there is none. */
export function formatMoney(money: Money): string {
  if (money.amountMicros === null) return money.reason ?? 'no price';
  return `${decimalAmount(money.amountMicros)} ${money.currency}`;
}

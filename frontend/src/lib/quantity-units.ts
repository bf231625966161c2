import type { Unit } from '../api/types';
import { parseQuantity, type ParsedQuantity, type QuantityKind } from './engineering-notation';
import { formatSi, formatSignificant, formatValue } from './format-figure';

interface UnitRule {
  readonly kind: QuantityKind;
  /** Power of ten of a bare number in a field with this unit. */
  readonly exponent: number;
  /** SI unit for prefixes; null: the number is printed as it is. */
  readonly base: string | null;
  /** Unit of the calculator, for printing what was understood. */
  readonly figureUnit: Unit | null;
}

const si = (kind: QuantityKind, exponent: number, base: string, figureUnit: Unit): UnitRule => ({
  kind,
  exponent,
  base,
  figureUnit,
});
const plain = (kind: QuantityKind, figureUnit: Unit | null = null): UnitRule => ({
  kind,
  exponent: 0,
  base: null,
  figureUnit,
});

/** Units that a field can show inside; a bare number counts in them. Values are always in the SI base unit. */
export const QUANTITY_UNITS = {
  Ω: si('resistance', 0, 'Ω', 'Ω'),
  kΩ: si('resistance', 3, 'Ω', 'Ω'),
  MΩ: si('resistance', 6, 'Ω', 'Ω'),
  F: si('capacitance', 0, 'F', 'F'),
  pF: si('capacitance', -12, 'F', 'F'),
  nF: si('capacitance', -9, 'F', 'F'),
  Hz: si('frequency', 0, 'Hz', 'Hz'),
  kHz: si('frequency', 3, 'Hz', 'Hz'),
  MHz: si('frequency', 6, 'Hz', 'Hz'),
  V: si('voltage', 0, 'V', 'V'),
  mV: si('voltage', -3, 'V', 'V'),
  A: si('current', 0, 'A', 'A'),
  mA: si('current', -3, 'A', 'A'),
  µA: si('current', -6, 'A', 'A'),
  W: si('power', 0, 'W', 'W'),
  mW: si('power', -3, 'W', 'W'),
  s: si('time', 0, 's', 's'),
  'V/µs': { kind: 'slew-rate', exponent: 6, base: null, figureUnit: 'V/s' },
  'nV/√Hz': si('voltage-noise', -9, 'V/√Hz', 'V/√Hz'),
  'pA/√Hz': si('current-noise', -12, 'A/√Hz', 'A/√Hz'),
  dB: plain('decibel', 'dB'),
  dBΩ: plain('decibel', 'dBΩ'),
  dBm: plain('decibel-milliwatt'),
  '°': plain('angle', 'deg'),
  '°C': plain('temperature'),
  '%': plain('percent'),
  gain: plain('gain', 'gain'),
  'V/A': si('transimpedance', 0, 'Ω', 'Ω'),
  pieces: plain('count'),
  number: plain('number'),
} as const satisfies Readonly<Record<string, UnitRule>>;

export type QuantityUnit = keyof typeof QUANTITY_UNITS;

/** What stands inside the field. */
export function unitLabel(unit: QuantityUnit): string {
  if (unit === 'gain') return '× or dB';
  if (unit === 'V/A') return 'Ω';
  return unit === 'number' ? '' : unit;
}

export function parseInUnit(text: string, unit: QuantityUnit): ParsedQuantity {
  const rule: UnitRule = QUANTITY_UNITS[unit];
  return parseQuantity(text, rule.kind, rule.exponent);
}

const SIGNIFICANT = 12;

function scaled(value: number, exponent: number): number {
  const number = exponent >= 0 ? value / Number(`1e${exponent}`) : value * Number(`1e${-exponent}`);
  return Number(number.toPrecision(SIGNIFICANT));
}

const withoutTrailingZeros = (text: string): string => (text.includes('.') ? text.replace(/\.?0+$/, '') : text);

/** Whether a bare number in the field's unit has few zeros. */
function isComfortable(bare: number, rule: UnitRule): boolean {
  if (bare === 0 || rule.base === null) return true;
  const size = Math.abs(bare);
  return size >= 0.01 && size < (rule.exponent === 0 ? 1000 : 100_000);
}

/** "4.7k" in a field of Ω, "1 µF" in one of pF. */
function withPrefix(value: number, base: string, exponent: number): string {
  const { number, unit } = formatSi(value, base, SIGNIFICANT);
  const digits = withoutTrailingZeros(number);
  const prefix = unit.slice(0, unit.length - base.length);
  return prefix !== '' && exponent === 0 ? `${digits}${prefix}` : `${digits} ${unit}`;
}

/** The text a field starts with: a bare number in its unit, or with a prefix where that would have many zeros. */
export function toFieldText(value: number | null | undefined, unit: QuantityUnit): string {
  if (value === null || value === undefined || !Number.isFinite(value)) return '';
  const rule: UnitRule = QUANTITY_UNITS[unit];
  const bare = scaled(value, rule.exponent);
  if (isComfortable(bare, rule)) return withoutTrailingZeros(formatSignificant(bare, SIGNIFICANT));
  return withPrefix(value, rule.base ?? '', rule.exponent);
}

/** What was understood, in full: "4.7 kΩ". */
export function describeQuantity(value: number, unit: QuantityUnit): string {
  const rule: UnitRule = QUANTITY_UNITS[unit];
  if (rule.figureUnit === null) return `${toFieldText(value, unit)} ${unitLabel(unit)}`.trim();
  // No more digits than were typed: a datasheet's 75 MHz is not 75.0 MHz.
  const digits = Math.min(8, significantDigitsOf(value));
  const text = formatValue(value, rule.figureUnit, digits);
  if (rule.kind !== 'gain' || value === 0) return text;
  return `${text} = ${formatValue(20 * Math.log10(Math.abs(value)), 'dB', 4)}`;
}

function significantDigitsOf(value: number): number {
  const mantissa = Number(value.toPrecision(8)).toExponential().split('e')[0] ?? '';
  return mantissa.replace(/[^0-9]/g, '').length;
}

export interface QuantityLimits {
  readonly minimum?: number;
  readonly maximum?: number;
  /** The minimum itself is not allowed. */
  readonly exclusiveMinimum?: boolean;
}

/** The limit that was broken, in words with the limit; null = none. */
export function limitMessage(value: number, unit: QuantityUnit, limits: QuantityLimits): string | null {
  const { minimum, maximum, exclusiveMinimum } = limits;
  if (minimum !== undefined && exclusiveMinimum && value <= minimum) {
    return `Must be more than ${describeQuantity(minimum, unit)}.`;
  }
  if (minimum !== undefined && value < minimum) return `Must be at least ${describeQuantity(minimum, unit)}.`;
  if (maximum !== undefined && value > maximum) return `Must be at most ${describeQuantity(maximum, unit)}.`;
  return null;
}

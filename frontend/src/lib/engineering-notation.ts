/**
 * Reads quantities as engineers write them: `4k7`, `2.2M`, `10p`, `10.7 MHz`, `20 dB`, `x10`, `−10`.
 * Prefixes are case-sensitive (m is milli, M is mega); a prefix that makes no sense for the quantity is refused
 * rather than guessed.
 */

export type QuantityKind =
  | 'resistance'
  | 'capacitance'
  | 'frequency'
  | 'voltage'
  | 'current'
  | 'power'
  | 'time'
  | 'slew-rate'
  | 'voltage-noise'
  | 'current-noise'
  | 'temperature'
  | 'angle'
  | 'decibel'
  | 'decibel-milliwatt'
  | 'gain'
  | 'transimpedance'
  | 'percent'
  | 'count'
  | 'number';

export type ParsedQuantity =
  | { readonly ok: true; readonly value: number }
  | {
      readonly ok: false;
      readonly code: 'empty' | 'unreadable' | 'wrong_unit' | 'wrong_prefix';
      readonly message: string;
    };

interface KindRule {
  readonly noun: string;
  /** Spellings of the unit without prefix, as they may be typed. */
  readonly units: readonly string[];
  /** Prefixes that make sense. */
  readonly prefixes: string;
  readonly example: string;
}

const PREFIX_EXPONENTS: Readonly<Record<string, number>> = {
  f: -15,
  p: -12,
  n: -9,
  u: -6,
  m: -3,
  '': 0,
  k: 3,
  M: 6,
  G: 9,
  T: 12,
};

export const KIND_RULES: Readonly<Record<QuantityKind, KindRule>> = {
  resistance: { noun: 'a resistance', units: ['Ω', 'ohm', 'ohms', 'R'], prefixes: 'mkMGT', example: '4k7' },
  capacitance: { noun: 'a capacitance', units: ['F'], prefixes: 'fpnum', example: '10p' },
  frequency: { noun: 'a frequency', units: ['Hz'], prefixes: 'kMGT', example: '10.7 MHz' },
  voltage: { noun: 'a voltage', units: ['V'], prefixes: 'pnumk', example: '1 mV' },
  current: { noun: 'a current', units: ['A'], prefixes: 'fpnum', example: '18 mA' },
  power: { noun: 'a power', units: ['W'], prefixes: 'numk', example: '250 mW' },
  time: { noun: 'a time', units: ['s'], prefixes: 'fpnum', example: '12 ns' },
  'slew-rate': { noun: 'a slew rate', units: ['V/us', 'V/s', 'V/ns'], prefixes: 'mk', example: '55 V/µs' },
  'voltage-noise': { noun: 'a noise density', units: ['V/rtHz'], prefixes: 'fpnum', example: '2 nV/√Hz' },
  'current-noise': { noun: 'a noise density', units: ['A/rtHz'], prefixes: 'fpnum', example: '2.5 pA/√Hz' },
  temperature: { noun: 'a temperature', units: ['°C', 'C'], prefixes: '', example: '25 °C' },
  angle: { noun: 'an angle', units: ['°', 'deg'], prefixes: '', example: '60°' },
  decibel: { noun: 'decibels', units: ['dB'], prefixes: '', example: '20 dB' },
  'decibel-milliwatt': { noun: 'a level in dBm', units: ['dBm'], prefixes: '', example: '−45 dBm' },
  gain: { noun: 'a gain', units: [], prefixes: '', example: '−10 or 20 dB' },
  transimpedance: { noun: 'a transimpedance', units: ['Ω', 'ohm', 'V/A'], prefixes: 'mkMG', example: '100k' },
  percent: { noun: 'a percentage', units: ['%'], prefixes: '', example: '20 %' },
  count: { noun: 'a whole number', units: [], prefixes: '', example: '250' },
  number: { noun: 'a number', units: [], prefixes: '', example: '1.5' },
};

const ALL_UNITS: readonly string[] = [...new Set(Object.values(KIND_RULES).flatMap((rule) => rule.units))];

/** One spelling of everything that has several. */
function normalise(text: string): string {
  return text
    .trim()
    .replace(/[−–]/g, '-')
    .replace(/[µμ]/g, 'u')
    .replace(/\u2126/g, 'Ω')
    .replace(/\/(√|rt|sqrt)\(?Hz\)?/gi, '/rtHz')
    .replace(/[\s\u00a0\u2009\u202f]+/g, ' ');
}

/** A decimal comma is taken; a comma in front of exactly three digits could be either and is refused. */
function decimalComma(text: string): string | null {
  const commas = text.match(/,/g)?.length ?? 0;
  if (commas === 0) return text;
  if (commas > 1 || text.includes('.') || /,\d{3}(?!\d)/.test(text)) return null;
  return text.replace(',', '.');
}

const refuse = (code: 'empty' | 'unreadable' | 'wrong_unit' | 'wrong_prefix', message: string): ParsedQuantity => ({
  ok: false,
  code,
  message,
});

function finite(mantissa: string, exponent: number, kind: QuantityKind): ParsedQuantity {
  const [digits, typedExponent] = mantissa.toLowerCase().split('e');
  const value = Number(`${digits}e${Number(typedExponent ?? 0) + exponent}`);
  if (!Number.isFinite(value)) return refuse('unreadable', 'This number is too large.');
  if (kind === 'count' && !Number.isInteger(value))
    return refuse('unreadable', 'Give a whole number, for example 250.');
  return { ok: true, value: value === 0 ? 0 : value };
}

function sameUnit(typed: string, unit: string, kind: QuantityKind): boolean {
  if (typed === unit) return true;
  // "r" or "c" alone would be a slip, "hz", "db" and "OHM" are not.
  return kind !== 'temperature' && unit.length > 1 && typed.toLowerCase() === unit.toLowerCase();
}

const UNIT_EXPONENTS: Readonly<Record<string, number>> = { 'V/us': 6, 'V/ns': 9 };

/** Prefixes that a kind takes, kilo also in capital. */
function prefixesOf(rule: KindRule): readonly string[] {
  return ['', ...(rule.prefixes.includes('k') ? ['K'] : []), ...rule.prefixes];
}

const exponentOf = (prefix: string): number => PREFIX_EXPONENTS[prefix === 'K' ? 'k' : prefix] ?? 0;

/** The power of ten when `suffix` is just this prefix with this unit, else null. */
function exponentIfMatches(suffix: string, prefix: string, unit: string, kind: QuantityKind): number | null {
  if (!suffix.startsWith(prefix)) return null;
  const rest = suffix.slice(prefix.length);
  const matches = unit === '' ? rest === '' : sameUnit(rest, unit, kind);
  return matches ? exponentOf(prefix) + (UNIT_EXPONENTS[unit] ?? 0) : null;
}

/** What follows the number: nothing, a prefix, a unit, or both. Its power of ten, or why it is refused. */
function readSuffix(text: string, kind: QuantityKind): number | ParsedQuantity {
  const rule = KIND_RULES[kind];
  const suffix = text.replace(/^meg/i, 'M');
  for (const unit of ['', ...rule.units]) {
    for (const prefix of prefixesOf(rule)) {
      const exponent = exponentIfMatches(suffix, prefix, unit, kind);
      if (exponent !== null) return exponent;
    }
  }
  return refuseSuffix(suffix, rule);
}

function refuseSuffix(suffix: string, rule: KindRule): ParsedQuantity {
  const ownUnit = rule.units.find((unit) => suffix.endsWith(unit) && suffix.length === unit.length + 1);
  const prefix = suffix[0] ?? '';
  if (ownUnit !== undefined || (suffix.length === 1 && prefix in PREFIX_EXPONENTS)) {
    const hint = prefix === 'm' && rule.prefixes.includes('M') ? ' (m is milli, M is mega)' : '';
    return refuse('wrong_prefix', `“${prefix}” does not fit ${rule.noun}${hint}. Write it like ${rule.example}.`);
  }
  const foreign = ALL_UNITS.find((unit) => suffix === unit || suffix.slice(1) === unit);
  if (foreign !== undefined) {
    return refuse('wrong_unit', `“${suffix}” is not the unit of ${rule.noun}. Write it like ${rule.example}.`);
  }
  return refuse('unreadable', `“${suffix}” is not understood. Write it like ${rule.example}.`);
}

/** The power of ten of a letter that stands for the decimal point, or null. */
function infixExponent(letter: string, kind: QuantityKind): number | null {
  if (letter === 'R') return kind === 'resistance' || kind === 'transimpedance' ? 0 : null;
  return prefixesOf(KIND_RULES[kind]).includes(letter) ? exponentOf(letter) : null;
}

/** `4k7`, `4R7`, `2n2`: the prefix stands for the decimal point. */
function readInfix(text: string, kind: QuantityKind): ParsedQuantity | null {
  const match = /^([+-]?\d+)([a-df-zA-DF-Z])(\d+)\s?(.*)$/.exec(text);
  if (!match) return null;
  const [, whole = '', letter = '', fraction = '', unit = ''] = match;
  const rule = KIND_RULES[kind];
  if (unit !== '' && !rule.units.some((own) => sameUnit(unit, own, kind))) return refuseSuffix(unit, rule);
  const exponent = infixExponent(letter, kind);
  return exponent === null ? refuseSuffix(letter, rule) : finite(`${whole}.${fraction}`, exponent, kind);
}

/** Gains: `x10`, `×10`, `20 dB`; transimpedance `100 dBΩ`. Null: not written that way. */
function readGain(text: string, kind: QuantityKind): ParsedQuantity | null {
  const decibels = /^([+-]?(?:\d+\.?\d*|\.\d+))\s?(db|dbΩ|dbohm)$/i.exec(text);
  if (decibels && (kind === 'gain' || kind === 'transimpedance')) {
    const value = 10 ** (Number(decibels[1]) / 20);
    return Number.isFinite(value) ? { ok: true, value } : refuse('unreadable', 'This gain is too large.');
  }
  const factor = /^(-?)\s?[x×*]\s?([+-]?(?:\d+\.?\d*|\.\d+))$/i.exec(text);
  if (!factor) return null;
  const ratio = Number(`${factor[1]}${factor[2]}`.replace('--', ''));
  if (kind === 'gain') return { ok: true, value: ratio };
  if (kind !== 'decibel' || ratio <= 0) return null;
  return { ok: true, value: 20 * Math.log10(ratio) };
}

/**
 * Reads what was typed.
 * @param bareExponent power of ten of a bare number: 6 in a field whose unit is MHz. A prefix or a unit overrides it.
 */
export function parseQuantity(text: string, kind: QuantityKind, bareExponent = 0): ParsedQuantity {
  const rule = KIND_RULES[kind];
  const normal = normalise(text);
  if (normal === '') return refuse('empty', `Give ${rule.noun}, for example ${rule.example}.`);
  const pointed = decimalComma(normal);
  if (pointed === null) {
    return refuse('unreadable', 'The comma can be read in two ways. Write 1200 or 1.2.');
  }
  return readGain(pointed, kind) ?? readInfix(pointed, kind) ?? readPlain(pointed, kind, bareExponent);
}

/** A number with what follows it. */
function readPlain(text: string, kind: QuantityKind, bareExponent: number): ParsedQuantity {
  const match = /^([+-]?(?:\d+\.?\d*|\.\d+)(?:e[+-]?\d+)?)\s?(.*)$/i.exec(text);
  if (!match) {
    return refuse('unreadable', `“${text}” is not understood. Write it like ${KIND_RULES[kind].example}.`);
  }
  const [, mantissa = '', rest = ''] = match;
  if (rest === '') return finite(mantissa, bareExponent, kind);
  const exponent = readSuffix(rest.trim(), kind);
  return typeof exponent === 'number' ? finite(mantissa, exponent, kind) : exponent;
}

import type { UsedValue } from '../analysis';
import type { Unit } from '../report';
import { decidingDigits, decibelLimitDigits, digitsForDecimals, digitsWithoutTrailingZeros } from './deciding-digits';
import { quantity, trimmed, typed } from './si-format';

/** A frequency that somebody set: "7 MHz". */
export function setFrequency(frequencyHz: number): string {
  return typed(frequencyHz, 'Hz');
}

/** A number that somebody set, with the real minus sign: "60", "−7.74". */
export function setNumber(value: number): string {
  return trimmed(value, 6);
}

/** A signed gain: "×10", "−10", "×3.162". */
export function gainText(gain: number): string {
  return quantity(gain, 'gain', digitsWithoutTrailingZeros(gain, 4));
}

/** A noise gain without sign or cross, with the digits that show its side of the limits: "11", "4.162", "6.99997". */
export function noiseGainText(noiseGain: number, limits: readonly number[] = []): string {
  return trimmed(noiseGain, decidingDigits(noiseGain, 4, limits));
}

/** A margin as a ratio, with the digits that show its side of the limits: "×0.974", "×3.38". */
export function ratioText(ratio: number, limits: readonly number[]): string {
  return quantity(ratio, 'ratio', decidingDigits(ratio, 3, limits));
}

/** A target ratio as the team set it: "×3". */
export function targetText(ratio: number): string {
  return typed(ratio, 'ratio');
}

/** A computed value, three digits or as many as show its side of the limits: "77.0 MHz". */
export function valueText(value: number, unit: Unit, limits: readonly number[] = []): string {
  return quantity(value, unit, decidingDigits(value, 3, limits));
}

/** A value that nothing may undercut: rounded up in the third digit, so that the printed number suffices. */
export function atLeastText(value: number, unit: Unit): string {
  return quantity(roundAway(value, Math.ceil), unit, 3, 'trimmed');
}

/** A value that nothing may exceed: rounded down in the third digit. */
export function atMostText(value: number, unit: Unit): string {
  return quantity(roundAway(value, Math.floor), unit, 3, 'trimmed');
}

/** Three significant digits, upwards or downwards in size. */
export function roundAway(value: number, round: (value: number) => number): number {
  if (value === 0 || !Number.isFinite(value)) return value;
  const exact = Number(value.toPrecision(12));
  const step = 10 ** (Math.floor(Math.log10(Math.abs(exact))) - 2);
  const rounded = Math.sign(exact) * round(Number((Math.abs(exact) / step).toPrecision(12))) * step;
  return Number(rounded.toPrecision(3));
}

/** Where a device value is from, in brackets: "minimum, p. 4", "typical × 0.7, assumed". */
export function basisText(used: UsedValue): string {
  const parts = [used.text];
  if ((used.basis === 'typ-derated' || used.basis === 'assumed') && !used.text.includes('assumed'))
    parts.push('assumed');
  if (used.page !== undefined && used.page !== '') parts.push(`p. ${used.page}`);
  return parts.join(', ');
}

/**
 * What a device has, in words that claim no more than its datasheet does: only a plain minimum is guaranteed.
 *
 * @param part part number
 * @param used value with its column
 * @param unit unit of the value
 * @param limits values it is compared with
 * @returns e.g. "MRWG-G072 guarantees 75.0 MHz (minimum, p. 4)"
 */
export function deviceHas(part: string, used: UsedValue, unit: Unit, limits: readonly number[] = []): string {
  const value = valueText(used.value, unit, limits);
  if (isGuaranteed(used)) return `${part} guarantees ${value} (${basisText(used)})`;
  if (used.basis === 'typ') return `${part} typically has ${value} (${basisText(used)})`;
  return `${part} is taken at ${value} (${basisText(used)})`;
}

/** True for a datasheet minimum that no factor has been applied to. */
export function isGuaranteed(used: UsedValue): boolean {
  return used.basis === 'min' && !used.text.includes('×');
}

/** "a, b and c". */
export function listText(items: readonly string[]): string {
  if (items.length < 2) return items.join('');
  return `${items.slice(0, -1).join(', ')} and ${items[items.length - 1]}`;
}

/** First letter as a capital. */
export function capitalised(text: string): string {
  return text.charAt(0).toUpperCase() + text.slice(1);
}

/** Decibels with two decimals, or as many digits as show the side of the limits: "58.08 dB". */
export function decibelText(value: number, limits: readonly number[] = [], unit: 'dB' | 'dBΩ' = 'dB'): string {
  return quantity(value, unit, decidingDigits(value, digitsForDecimals(value, 2), limits));
}

/** Decibels that somebody set as a limit: two decimals, and every further one that was set: "1.00 dB", "0.125 dB". */
export function decibelLimitText(limit: number, unit: 'dB' | 'dBΩ' = 'dB'): string {
  return quantity(limit, unit, decibelLimitDigits(limit));
}

/**
 * A reason as the end of a sentence, without its own full stop and capital.
 *
 * @param reason "Slew rate of MRWG-G072 is not entered."
 * @returns "slew rate of MRWG-G072 is not entered"
 */
export function because(reason: string): string {
  const bare = reason.trim().replace(/\.$/, '');
  return /^[A-Z][a-z ]/.test(bare) ? bare.charAt(0).toLowerCase() + bare.slice(1) : bare;
}

/** A reason as a sentence of its own. */
export function asSentence(reason: string): string {
  const text = capitalised(reason.trim());
  return /[.?]$/.test(text) ? text : `${text}.`;
}

/** Where something that is missing has to be entered; empty when nothing is. */
export function whereToEnter(reason: string): string {
  if (!/not entered|missing/.test(reason) || /enter (it|one)/i.test(reason)) return '';
  if (/input level|DC current of the source/.test(reason)) return ' Enter it in the specification.';
  return ' Enter it on the device page.';
}

/** "The slew rate cannot be judged: slew rate of MRWG-G072 is not entered. Enter it on the device page." */
export function cannotBeJudged(what: string, reason: string): string {
  return `${capitalised(what)} cannot be judged: ${because(reason)}.${whereToEnter(reason)}`;
}

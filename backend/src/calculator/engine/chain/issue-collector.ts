import type { EngineIssue, EngineIssueCode } from '../errors';

/** What a number may be. `above` is exclusive, `from` and `to` are inclusive; `least` is the smallest beside 0. */
export interface Range {
  readonly least?: number;
  readonly above?: number;
  readonly from?: number;
  readonly to: number;
  readonly unit: string;
}

/** Generous: they keep arithmetic finite and catch slips of many powers of ten; forms may be stricter. */
export const RANGES = {
  resistanceOhm: { from: 1e-9, to: 1e15, unit: 'Ω' },
  resistanceOrZeroOhm: { from: 0, least: 1e-9, to: 1e15, unit: 'Ω' },
  capacitanceF: { from: 1e-21, to: 10, unit: 'F' },
  capacitanceOrZeroF: { from: 0, least: 1e-21, to: 10, unit: 'F' },
  frequencyHz: { from: 1e-6, to: 1e15, unit: 'Hz' },
  frequencyOrZeroHz: { from: 0, least: 1e-6, to: 1e15, unit: 'Hz' },
  positive: { above: 0, to: 1e15, unit: '' },
  notNegative: { from: 0, to: 1e15, unit: '' },
  any: { from: -1e15, to: 1e15, unit: '' },
  gain: { from: 1, to: 1e9, unit: '' },
  decibel: { from: -400, to: 400, unit: 'dB' },
  decibelOrZero: { from: 0, to: 400, unit: 'dB' },
  fraction: { from: 0, to: 1, unit: '' },
  derating: { above: 0, to: 1, unit: '' },
  target: { from: 1, to: 1e6, unit: '' },
  degrees: { from: 0, to: 90, unit: '°' },
  kelvin: { above: 0, to: 2000, unit: 'K' },
  volt: { above: 0, to: 1e6, unit: 'V' },
  noVoltAbove: { from: -1e6, to: 0, unit: 'V' },
  count: { from: 1, to: 1e9, unit: '' },
} as const satisfies Record<string, Range>;

export type RangeName = keyof typeof RANGES;

function rangeText({ above, from, least, to, unit }: Range): string {
  const lowest = above === undefined ? `at least ${from}` : `above ${above}`;
  const low = least === undefined ? lowest : `0, or at least ${least}`;
  return `${low} and at most ${to}${unit ? ` ${unit}` : ''}`;
}

function isInside(value: number, { above = -Infinity, from = -Infinity, least = -Infinity, to }: Range): boolean {
  // Negative zero is no quantity that somebody measured: it comes from a slip, and 1/−0 would turn a sign.
  if (value === 0 && from === 0) return !Object.is(value, -0);
  return value <= to && value > above && value >= from && value >= least;
}

/** Gathers issues; every check adds at most one and goes on. */
export class IssueCollector {
  readonly issues: EngineIssue[] = [];

  add(code: EngineIssueCode, path: string, message: string): void {
    this.issues.push({ code, path, message });
  }

  /** A number that may be absent (undefined or null). True when it is there and good. */
  optional(path: string, value: unknown, range: RangeName): boolean {
    return value !== undefined && value !== null && this.check(path, value, RANGES[range]);
  }

  /** A number that has to be there. True when it is good. */
  required(path: string, value: unknown, range: RangeName): boolean {
    if (value === undefined || value === null) {
      this.add('required', path, `A value is needed: ${rangeText(RANGES[range])}.`);
      return false;
    }
    return this.check(path, value, RANGES[range]);
  }

  /** Whether the value is one of a list of words. */
  oneOf(path: string, value: unknown, words: readonly string[]): boolean {
    if (words.includes(value as string)) return true;
    this.add('out_of_range', path, `Has to be one of: ${words.join(', ')}.`);
    return false;
  }

  private check(path: string, value: unknown, range: Range): boolean {
    if (typeof value !== 'number' || !Number.isFinite(value)) {
      this.add('not_finite', path, 'Has to be a finite number.');
      return false;
    }
    if (isInside(value, range)) return true;
    this.add('out_of_range', path, `Has to be ${rangeText(range)}.`);
    return false;
  }
}

import type { Maybe } from '../analysis';
import type { Figure, Unit } from '../report';
import { asSentence } from '../text/phrases';
import {
  decibelLimitDigits,
  decidingDigits,
  digitsForDecimals,
  digitsWithoutTrailingZeros,
} from '../text/deciding-digits';

const MOST_DIGITS_OF_A_GAIN = 4;
const USUAL_DIGITS = 3;
const ROUNDING_NOISE = 1e-9;

/** How a figure is to be printed. */
export interface FigureOptions {
  /** Limits that it is compared with: it gets as many digits as show the side. */
  readonly limits?: readonly (number | undefined)[];
  /** Signed gains and noise gains: no trailing zeros, at most four digits. */
  readonly plainGain?: boolean;
}

/**
 * A figure from a number that may be missing. Never NaN or infinite.
 *
 * @param maybe number or reason
 * @param unit unit it is shown in
 * @param options limits that decide the digits
 */
export function figureOf(maybe: Maybe, unit: Unit, options: FigureOptions = {}): Figure {
  if (maybe.value === null) return { value: null, unit, digits: USUAL_DIGITS, reason: asSentence(maybe.reason) };
  if (!Number.isFinite(maybe.value)) {
    return { value: null, unit, digits: USUAL_DIGITS, reason: 'The result is not a finite number.' };
  }
  const value = withoutNoise(maybe.value, unit);
  const limits = (options.limits ?? []).filter((limit): limit is number => limit !== undefined);
  const digits = decidingDigits(value, usualDigits(value, unit, options.plainGain === true), limits);
  return maybe.assumed === true ? { value, unit, digits, assumed: true } : { value, unit, digits };
}

/** Decibels and angles that are only rounding noise are 0; no figure is −0. */
function withoutNoise(value: number, unit: Unit): number {
  const isLevel = unit === 'dB' || unit === 'dBΩ' || unit === 'deg';
  return (isLevel && Math.abs(value) < ROUNDING_NOISE) || value === 0 ? 0 : value;
}

function usualDigits(value: number, unit: Unit, plainGain: boolean): number {
  if (plainGain) return digitsWithoutTrailingZeros(value, MOST_DIGITS_OF_A_GAIN);
  if (unit === 'dB' || unit === 'dBΩ') return digitsForDecimals(value, 2);
  if (unit === 'deg') return digitsForDecimals(value, 1);
  if (unit === 'fraction') return Math.min(USUAL_DIGITS, digitsForDecimals(value * 100, 1));
  return USUAL_DIGITS;
}

/** A figure of a plain number. */
export function figure(value: number, unit: Unit, options: FigureOptions = {}): Figure {
  return figureOf({ value }, unit, options);
}

/** A limit as a figure: printed as it was typed. */
export function limitFigure(value: number, unit: Unit): Figure {
  const decibel = unit === 'dB' || unit === 'dBΩ';
  return { value, unit, digits: decibel ? decibelLimitDigits(value) : digitsWithoutTrailingZeros(value, 6) };
}

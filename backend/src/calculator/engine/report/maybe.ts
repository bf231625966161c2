import type { Maybe } from '../analysis';

/** A known number; a number that is not finite is none. */
export function known(value: number, assumed = false): Maybe {
  if (!Number.isFinite(value)) return { value: null, reason: 'The result is not a finite number.' };
  return assumed ? { value, assumed } : { value };
}

/** No number, with the reason in words. */
export function unknown(reason: string): Maybe {
  return { value: null, reason };
}

/**
 * A function of numbers that may be missing: the first missing one's reason, or the result.
 *
 * @param compute called with the values when all are known
 * @param inputs numbers that it takes
 * @returns result, assumed as soon as one input is
 */
export function combine<T extends readonly Maybe[]>(
  inputs: readonly [...T],
  compute: (...values: { [K in keyof T]: number }) => number,
): Maybe {
  const values: number[] = [];
  for (const input of inputs) {
    if (input.value === null) return input;
    values.push(input.value);
  }
  const assumed = inputs.some((input) => input.value !== null && input.assumed === true);
  return known(compute(...(values as { [K in keyof T]: number })), assumed);
}

/** Amplitude ratio in dB. */
export function ratioToDb(ratio: number): number {
  return 20 * Math.log10(ratio);
}

/** dB as an amplitude ratio. */
export function dbToRatio(db: number): number {
  return 10 ** (db / 20);
}

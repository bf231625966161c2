import type { Maybe } from './analysis';
import type { Device } from './types';

/**
 * A number, or the reason why a computed one is not finite.
 *
 * @example known(NaN) // { value: null, reason: … }
 */
export function known(value: number, assumed = false): Maybe {
  if (!Number.isFinite(value)) return unknown('The result is not a finite number.');
  return assumed ? { value, assumed } : { value };
}

/** No value, and why. */
export function unknown(reason: string): Maybe {
  return { value: null, reason };
}

/**
 * No value because a device's data lacks something, or several things.
 *
 * @example notEntered('slew rate', device).reason // 'Slew rate of MRWG-G072 is not entered.'
 */
export function notEntered(what: string | readonly string[], device: Pick<Device, 'partNumber'>): Maybe {
  const all = typeof what === 'string' ? [what] : what;
  const last = all.length - 1;
  const listed = last > 0 ? `${all.slice(0, last).join(', ')} and ${all[last]}` : all[last];
  const are = last > 0 ? 'are' : 'is';
  return unknown(`${listed.charAt(0).toUpperCase()}${listed.slice(1)} of ${device.partNumber} ${are} not entered.`);
}

/** f(value), or the same reason. */
export function mapMaybe(maybe: Maybe, f: (value: number) => number): Maybe {
  return maybe.value === null ? maybe : known(f(maybe.value), maybe.assumed);
}

/**
 * A function of numbers that may be missing: the first missing one's reason, or the result.
 *
 * @param compute called with the values when all are known
 * @param inputs numbers that it takes
 * @returns result, assumed as soon as one input is
 * @example combine([known(6), known(3)], (have, need) => have / need).value // 2
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

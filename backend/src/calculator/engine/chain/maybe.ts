import type { Maybe } from '../analysis';
import type { Device } from '../types';

/**
 * A number, or the reason why a computed one is not finite.
 *
 * @example known(NaN) // { value: null, reason: … }
 */
export function known(value: number, assumed = false): Maybe {
  if (!Number.isFinite(value)) return unknown('The network has no finite answer here.');
  return assumed ? { value, assumed } : { value };
}

/** No value, and why. */
export function unknown(reason: string): Maybe {
  return { value: null, reason };
}

/**
 * No value because a device's data lacks something.
 *
 * @example notEntered('slew rate', device).reason // 'Slew rate of MRWG-G072 is not entered.'
 */
export function notEntered(what: string, device: Pick<Device, 'partNumber'>): Maybe {
  return unknown(`${what.charAt(0).toUpperCase()}${what.slice(1)} of ${device.partNumber} is not entered.`);
}

/** f(value), or the same reason. */
export function mapMaybe(maybe: Maybe, f: (value: number) => number): Maybe {
  return maybe.value === null ? maybe : known(f(maybe.value), maybe.assumed);
}

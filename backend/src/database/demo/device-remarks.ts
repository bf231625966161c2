import type { Lifecycle } from '../../calculator/engine';

/** What is to be said of single parts beside their values. */
export interface DeviceRemark {
  /** Absent: active. */
  readonly lifecycle?: Lifecycle;
  /** Nobody has compared the values with the datasheet yet. */
  readonly unverified?: true;
  /** Days from seeding to the last day of the quote; negative: lapsed. Absent: about four months. */
  readonly quoteDays?: number;
  /** The quote's own breaks, where the usual steps do not fit. */
  readonly breaks?: readonly (readonly [quantity: number, usd: number])[];
  readonly notes?: string;
}

export const DEVICE_REMARKS: Readonly<Record<string, DeviceRemark>> = {
  'MRWG-G072': {
    breaks: [
      [1, 1.35],
      [10, 1.12],
      [100, 0.92],
      [250, 0.62],
      [1000, 0.55],
    ],
  },
  'MRWG-G280D': { notes: 'The datasheet gives typical GBW and slew only.' },
  'MRWG-G090': {
    unverified: true,
    notes: 'Preliminary datasheet: slew rate, output swing and supply current are still missing.',
  },
  'MRWG-G300X': { unverified: true, notes: 'Sampling. Neither phase margin nor output resistance is given yet.' },
  'MRWG-V240': { unverified: true },
  'MRWG-R110': { lifecycle: 'not-recommended' },
  'MRWG-G055': { lifecycle: 'last-time-buy' },
  'QUIL-D618B': { quoteDays: -12 },
  'QUIL-D700': { lifecycle: 'not-recommended' },
  'QUIL-D852': { notes: 'Offered by purchasing as an alternate for QUIL-D618 where the noise gain is 12 or more.' },
  'QUIL-E2200': { unverified: true, notes: 'Advance information: typical GBW only, no slew rate, no quote yet.' },
  'QUIL-D550': { lifecycle: 'obsolete', notes: 'Kept for old boards; replaced by QUIL-D618.' },
  'TLYR-C220': { quoteDays: 35 },
  'TLYR-C320X': { unverified: true, notes: 'Sampling: only the bandwidth is known so far.' },
  'TLYR-C180D': { lifecycle: 'last-time-buy' },
  'TLYR-L150': { unverified: true, quoteDays: 9 },
};

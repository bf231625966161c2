import type { PublishedCase } from './published-case';

const SEDRA = 'A. S. Sedra & K. C. Smith, Microelectronic Circuits, 6th ed., ch. 2';

/** Rise time, slew rate and full-power bandwidth. */
export const RISE_TIME_SLEW_CASES: readonly PublishedCase[] = [
  {
    id: 'B01',
    what: 'rise time from 10 % to 90 % of one pole: 0.35 over the corner',
    inputs: { cornerHz: 0.35e6 },
    expected: { riseTimeNs: 1000 },
    tolerance: { riseTimeNs: 5 },
    source: 'H. Johnson & M. Graham, High-Speed Digital Design (1993)',
    provenance: 'from memory',
    note: 'ln 9/(2π) = 0.34970 gives 999.1 ns.',
  },
  {
    id: 'B02',
    what: 'follower: largest step without slewing and its rise time',
    inputs: { slewRateVPerUs: 1, gainBandwidthHz: 1e6 },
    expected: { stepV: 0.16, riseTimeUs: 0.35 },
    tolerance: { stepV: 0.005, riseTimeUs: 0.005 },
    source: `${SEDRA}, Exercise 2.29`,
    provenance: 'from memory',
  },
  {
    id: 'B03',
    what: 'full-power bandwidth at 10 V peak, and the peak left at five times it',
    inputs: { slewRateVPerUs: 1, peakV: 10 },
    expected: { fullPowerKHz: 15.9, peakAtFiveTimesV: 2.0 },
    tolerance: { fullPowerKHz: 0.05, peakAtFiveTimesV: 0.05 },
    source: `${SEDRA}, Exercise 2.30`,
    provenance: 'from memory',
  },
  {
    id: 'B05',
    what: 'highest frequency without slewing at 1.5 V peak',
    inputs: { slewRateVPerUs: 0.5, peakV: 1.5 },
    expected: { fullPowerKHz: 53 },
    tolerance: { fullPowerKHz: 0.5 },
    source: 'M. S. Sarma, Introduction to Electrical Engineering, sect. 5.3, Example 5.3.2, p. 243',
    provenance: 'read in a published solution companion to the book',
  },
  {
    id: 'B07',
    what: 'largest peak at the small-signal corner of a ×10 amplifier',
    inputs: { gainBandwidthHz: 1e6, slewRateVPerUs: 0.5, gain: 10 },
    expected: { cornerKHz: 100, peakV: 0.795 },
    tolerance: { cornerKHz: 0.5, peakV: 0.001 },
    source: 'A. Malvino & D. Bates, Electronic Principles, 7th ed. (2007), Example 19-13, p. 724',
    provenance: 'read in a published solution companion to the book',
    note: 'Printed 0.795 is cut off, exact is 0.79577; hence the tolerance of one in the last digit.',
  },
];

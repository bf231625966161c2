import type { PublishedCase } from './published-case';

const six = 5e-7;

/** Bandwidth of cascades, and noise bandwidth of identical poles. */
export const CASCADE_CASES: readonly PublishedCase[] = [
  {
    id: 'C01',
    what: 'corner of n identical one-pole stages over the corner of one',
    inputs: { stages: [1, 2, 3, 4, 5] },
    expected: { '1': 1, '2': 0.64, '3': 0.51, '4': 0.43, '5': 0.39 },
    tolerance: { '1': 0.005, '2': 0.005, '3': 0.005, '4': 0.005, '5': 0.005 },
    source: 'J. Millman & C. Halkias, Integrated Electronics, chapter on multistage amplifiers',
    provenance: 'from memory',
    note: 'Four stages are 0.43498: tables show 0.43 or 0.44.',
  },
  {
    id: 'C02',
    what: 'the same in six digits, √(2^(1/n) − 1)',
    inputs: { stages: [2, 3, 4, 5, 6, 7, 8, 9, 10] },
    expected: {
      '2': 0.643594,
      '3': 0.509825,
      '4': 0.434979,
      '5': 0.385614,
      '6': 0.349946,
      '7': 0.322629,
      '8': 0.300845,
      '9': 0.282948,
      '10': 0.267906,
    },
    tolerance: { '2': six, '3': six, '4': six, '5': six, '6': six, '7': six, '8': six, '9': six, '10': six },
    source: 'definition of the half-power frequency',
    provenance: 'derived from the definition',
  },
  {
    id: 'C07',
    what: 'number of identical stages that gives a total gain of 100 the largest bandwidth',
    inputs: { gain: 100, stages: [7, 8, 9, 10, 11] },
    expected: { bestStages: 9 },
    tolerance: { bestStages: 0 },
    source:
      'R. P. Jindal, IEEE J. Solid-State Circuits SC-22 (1987); T. H. Lee, The Design of CMOS Radio-Frequency Integrated Circuits, chapter on high-frequency amplifiers',
    provenance: 'from memory',
    note: 'The published rule n = 2 ln A = 9.2 uses 0.833/√n; the whole number nearest to it is held against the exact corners.',
  },
  {
    id: 'C09',
    what: 'adding 1/f² overstates the corner of two identical poles by 9.9 %: it must not be used',
    inputs: { stages: 2 },
    expected: { ruleOverExact: 1.0987 },
    tolerance: { ruleOverExact: 0.0001 },
    source: 'rule as in G. E. Valley & H. Wallman, Vacuum Tube Amplifiers (1948); figures from the definition',
    provenance: 'derived from the definition',
  },
  {
    id: 'G09',
    what: 'noise bandwidth over the corner of n identical poles',
    inputs: { stages: [1, 2, 3, 4, 5] },
    expected: { '1': 1.570796, '2': 1.220331, '3': 1.155395, '4': 1.128499, '5': 1.113845 },
    tolerance: { '1': six, '2': six, '3': six, '4': six, '5': six },
    source: 'definition of the equivalent noise bandwidth',
    provenance: 'derived from the definition',
  },
  {
    id: 'G16',
    what: 'noise bandwidth of one pole at 25.9 kHz',
    inputs: { cornerHz: 25.9e3 },
    expected: { noiseBandwidthKHz: 40.7 },
    tolerance: { noiseBandwidthKHz: 0.05 },
    source: 'Texas Instruments SBOA345 (June 2021), worked example',
    provenance: 'formula or inputs read in the source, result recomputed',
  },
];

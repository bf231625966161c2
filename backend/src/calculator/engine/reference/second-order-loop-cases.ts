import type { PublishedCase } from './published-case';

const ALGEBRA = 'two-pole loop algebra';
const DERIVED = 'derived from the definition';

/** Two-pole loops: phase margin, peaking and bandwidth. */
export const SECOND_ORDER_LOOP_CASES: readonly PublishedCase[] = [
  {
    id: 'D03',
    what: 'maximally flat loop, second pole at twice the first-order corner: phase margin, no peaking',
    inputs: { secondPoleOverCorner: 2 },
    expected: { phaseMarginDeg: 65.5, peakingDb: 0 },
    tolerance: { phaseMarginDeg: 0.05, peakingDb: 0.005 },
    source: 'J. Huijsing, Operational Amplifiers: Theory and Design, frequency compensation',
    provenance: 'from memory',
  },
  {
    id: 'D04',
    what: 'critically damped loop, second pole at four times the first-order corner: phase margin',
    inputs: { secondPoleOverCorner: 4 },
    expected: { phaseMarginDeg: 76.3 },
    tolerance: { phaseMarginDeg: 0.05 },
    source: ALGEBRA,
    provenance: DERIVED,
  },
  {
    id: 'D05',
    what: 'closed-loop gain over ideal at the crossing: 1/(2 sin(φ/2))',
    inputs: { phaseMarginsDeg: [30, 45, 60, 90] },
    expected: { '30': 1.93, '45': 1.3, '60': 1.0, '90': 0.7 },
    tolerance: { '30': 0.005, '45': 0.05, '60': 0.05, '90': 0.05 },
    source:
      'P. R. Gray & R. G. Meyer, Analysis and Design of Analog Integrated Circuits, chapter on feedback stability',
    provenance: 'from memory',
  },
  {
    id: 'D08',
    what: 'second pole at twice the first-order corner: exact corner and crossing over the first-order corner',
    inputs: { secondPoleOverCorner: 2 },
    expected: { cornerRatio: 1.4142, crossingRatio: 0.9102 },
    tolerance: { cornerRatio: 5e-5, crossingRatio: 5e-5 },
    source: ALGEBRA,
    provenance: DERIVED,
  },
  {
    id: 'D09',
    what: 'second pole at 3 MHz: unity crossing of a 10 MHz decompensated and a 2 MHz unity-gain-stable amplifier',
    inputs: { gainBandwidthsHz: [10e6, 2e6], secondPoleHz: 3e6 },
    expected: { decompensatedMHz: 5.08, unityStableMHz: 1.73 },
    tolerance: { decompensatedMHz: 0.005, unityStableMHz: 0.005 },
    source: 'B. Trump, "Op amps... G=1 stable & decompensated", EDN, 2013-04-07',
    provenance: 'formula or inputs read in the source, result recomputed',
    note: 'The source says "half its GBW" and "slightly less than its GBW"; the figures are recomputed.',
  },
  {
    id: 'D10',
    what: 'peaking of a two-pole loop from its phase margin, 1/(2ζ√(1 − ζ²))',
    inputs: { phaseMarginsDeg: [30, 45, 60] },
    expected: { '30': 5.721, '45': 2.35, '60': 0.28 },
    tolerance: { '30': 0.0005, '45': 0.0005, '60': 0.0005 },
    source: ALGEBRA,
    provenance: DERIVED,
  },
];

import type { PublishedCase } from './published-case';

const SNOSB00K = 'Texas Instruments SNOSB00K (rev. October 2013), p. 32, eqs 7 and 8, Table 4';

/** Transimpedance amplifiers: feedback capacitor for about 45° and the bandwidth that goes with it. */
export const TRANSIMPEDANCE_CASES: readonly PublishedCase[] = [
  {
    id: 'E01',
    what: 'feedback capacitor and bandwidth, 1 kΩ with 24 pF',
    inputs: { gainBandwidthHz: 130e6, feedbackOhm: 1000, capacitanceF: 24e-12 },
    expected: { feedbackPf: 5.42, bandwidthMHz: 29.3 },
    tolerance: { feedbackPf: 0.005, bandwidthMHz: 0.1 },
    source: SNOSB00K,
    provenance: 'read in the source',
    note: 'The printed bandwidth is cut off; exact is 29.36.',
  },
  {
    id: 'E04',
    what: 'feedback capacitor and bandwidth, 1 kΩ with 224 pF',
    inputs: { gainBandwidthHz: 130e6, feedbackOhm: 1000, capacitanceF: 224e-12 },
    expected: { feedbackPf: 16.56, bandwidthMHz: 9.6 },
    tolerance: { feedbackPf: 0.005, bandwidthMHz: 0.05 },
    source: SNOSB00K,
    provenance: 'read in the source',
    note: 'Printed 20.39 pF does not follow from its own equation; 16.56 pF does and is held. The bandwidth is right.',
  },
  {
    id: 'E05',
    what: 'feedback capacitor and bandwidth, 1 kΩ with 332 pF',
    inputs: { gainBandwidthHz: 130e6, feedbackOhm: 1000, capacitanceF: 332e-12 },
    expected: { feedbackPf: 20.2, bandwidthMHz: 7.9 },
    tolerance: { feedbackPf: 0.05, bandwidthMHz: 0.05 },
    source: SNOSB00K,
    provenance: 'read in the source',
  },
  {
    id: 'E07',
    what: 'feedback capacitor (maximally flat) and bandwidth, 200 kΩ with a 50 pF photodiode and 5.2 pF of input',
    inputs: { gainBandwidthHz: 1600e6, feedbackOhm: 200e3, capacitanceF: 55.2e-12 },
    expected: { feedbackPf: 0.2, bandwidthMHz: 5 },
    tolerance: { feedbackPf: 0.05, bandwidthMHz: 0.5 },
    source: 'Texas Instruments SBOS197E, p. 11',
    provenance: 'result read in the source, an input from memory',
  },
  {
    id: 'E11',
    what: 'exact second-order response with either capacitor rule: half power and peaking',
    inputs: {
      gainBandwidthHz: 230e6,
      feedbackOhm: 100e3,
      capacitanceF: 23.3e-12,
      flatFeedbackF: 0.5678e-12,
      leadFeedbackF: 0.4015e-12,
    },
    expected: { flatQ: 0.707, flatMHz: 3.92, leadQ: 0.992, leadPeakingDb: 1.2, leadMHz: 4.98 },
    tolerance: { flatQ: 0.0005, flatMHz: 0.005, leadQ: 0.0005, leadPeakingDb: 0.005, leadMHz: 0.005 },
    source: 'second-order algebra of one amplifier pole with Rf, C and Cf',
    provenance: 'derived from the definition',
  },
];

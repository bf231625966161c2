import type { PublishedCase } from './published-case';

const SOURCE = 'Texas Instruments SBOS354A (August 2008)';
const RECOMPUTED = 'formula or inputs read in the source, result recomputed';

/** Current feedback: what keeps the bandwidth when the gain changes. */
export const CURRENT_FEEDBACK_CASES: readonly PublishedCase[] = [
  {
    id: 'F01',
    what: 'feedback resistor that keeps Rf + NG·Rb at 663 Ω, and its nearest E96 value',
    inputs: { sumOhm: 663, invertingInputOhm: 32, noiseGains: [2, 8] },
    expected: { at2Ohm: 599, at8Ohm: 407, nearestE96Ohm: 604 },
    tolerance: { at2Ohm: 0.5, at8Ohm: 0.5, nearestE96Ohm: 0 },
    source: `${SOURCE}, p. 27, eq. 7`,
    provenance: RECOMPUTED,
  },
  {
    id: 'F02',
    what: 'bandwidth at a noise gain of 10 over that at 1, Rf kept at 1 kΩ with 50 Ω at the inverting input',
    inputs: { feedbackOhm: 1000, invertingInputOhm: 50, noiseGain: 10 },
    expected: { ratio: 0.7 },
    tolerance: { ratio: 0.005 },
    source: `${SOURCE}, eq. 6`,
    provenance: RECOMPUTED,
  },
];

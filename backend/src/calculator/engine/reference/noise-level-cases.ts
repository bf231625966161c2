import type { PublishedCase } from './published-case';

const SI = 'definition; constants from the SI Brochure, 9th ed. (2019)';
const DERIVED = 'derived from the definition';

/** Thermal and amplifier noise, noise figure of a cascade, levels. */
export const NOISE_LEVEL_CASES: readonly PublishedCase[] = [
  {
    id: 'G01',
    what: 'thermal noise of 1 kΩ and 10 kΩ at 300 K',
    inputs: { ambientK: 300, resistancesOhm: [1000, 10000] },
    expected: { '1000': 4.07, '10000': 12.87 },
    tolerance: { '1000': 0.005, '10000': 0.005 },
    source: SI,
    provenance: DERIVED,
  },
  {
    id: 'G02',
    what: '4 nV/√Hz of 1 kΩ at 298 K',
    inputs: { ambientK: 298, resistancesOhm: [1000] },
    expected: { '1000': 4 },
    tolerance: { '1000': 0.5 },
    source: 'Texas Instruments SBOA345 (June 2021), section on thermal noise',
    provenance: 'read in the source',
  },
  {
    id: 'G17',
    what: 'thermal noise of 50 Ω at 300 K',
    inputs: { ambientK: 300, resistancesOhm: [50] },
    expected: { '50': 0.91 },
    tolerance: { '50': 0.005 },
    source: 'common practice',
    provenance: 'common practice',
  },
  {
    id: 'G04',
    what: 'thermal noise voltage of 10 kΩ in 2 MHz at 27 °C, from the density of a flat chain',
    inputs: { ambientK: 300, resistanceOhm: 10e3, bandwidthHz: 2e6 },
    expected: { noiseUv: 18.2 },
    tolerance: { noiseUv: 0.05 },
    source: 'G. Kennedy, Electronic Communication Systems, Example 2-1',
    provenance: 'from memory',
  },
  {
    id: 'G12',
    what: 'output and input noise of a ×2 amplifier with 200 Ω at its + input',
    inputs: { voltageNoiseNv: 5.5, currentNoisePa: 3.1, sourceOhm: 200, feedbackOhm: 402, gainOhm: 402, ambientK: 290 },
    expected: { outputNv: 12.3, inputNv: 6.1 },
    tolerance: { outputNv: 0.1, inputNv: 0.05 },
    source: 'Texas Instruments SBOS223H (October 2024), noise performance, eqs 1 and 2',
    provenance: 'result read in the source, an input from memory',
    note: 'Recomputes to 12.24 nV/√Hz.',
  },
  {
    id: 'H01',
    what: 'noise figure of amplifier, filter and mixer (Friis)',
    inputs: { gainsDb: [10, -1, -3], noiseFiguresDb: [2, 1, 4] },
    expected: { noiseFactor: 1.8, noiseFigureDb: 2.55, noiseTemperatureK: 232 },
    tolerance: { noiseFactor: 0.005, noiseFigureDb: 0.01, noiseTemperatureK: 0.5 },
    source: 'D. M. Pozar, Microwave Engineering, 4th ed. (2012), Example 10.2',
    provenance: 'from memory',
  },
  {
    id: 'H10',
    what: 'available thermal noise at 290 K, in dBm per Hz',
    inputs: { sourceOhm: 50 },
    expected: { densityDbm: -173.975 },
    tolerance: { densityDbm: 0.0005 },
    source: SI,
    provenance: DERIVED,
  },
  {
    id: 'I17',
    what: '0 dBm in 50 Ω',
    inputs: { powerDbm: 0, resistanceOhm: 50 },
    expected: { rmsMv: 223.6, peakToPeakMv: 632.5 },
    tolerance: { rmsMv: 0.05, peakToPeakMv: 0.05 },
    source: SI,
    provenance: DERIVED,
  },
];

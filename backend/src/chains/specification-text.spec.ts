import type { Specification } from '../calculator/engine';
import { specificationText } from './specification-text';

const specification = (change: Partial<Specification> = {}): Specification => ({
  source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf' },
  load: { resistanceOhm: 1000 },
  gainBasis: 'voltage',
  band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
  supply: { positiveV: 5, negativeV: -5 },
  requirements: { gainDb: { target: 60, tolerance: 1 } },
  ...change,
});

describe('specificationText(specification)', () => {
  it.each([
    [specification(), '60 ±1 dB at 5 MHz · 3–7 MHz · ±5 V'],
    [specification({ requirements: {} }), '5 MHz · 3–7 MHz · ±5 V'],
    [
      specification({
        gainBasis: 'transimpedance',
        requirements: { gainDb: { target: 100, tolerance: 0.5 } },
        band: { lowHz: 100, operatingHz: 20_000, highHz: 1.5e6 },
        supply: { positiveV: 3.3, negativeV: 0 },
      }),
      '100 ±0.5 dBΩ at 20 kHz · 100 Hz–1.5 MHz · 3.3 V single',
    ],
    [specification({ supply: { positiveV: 12, negativeV: -5 } }), '60 ±1 dB at 5 MHz · 3–7 MHz · +12 / −5 V'],
  ])('case %#', (given, expected) => {
    expect(specificationText(given)).toBe(expected);
  });
});

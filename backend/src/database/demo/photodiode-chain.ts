import { randomUUID } from 'node:crypto';
import type { Specification, Stage } from '../../calculator/engine';
import type { DemoOption, DeviceIdOf } from './receiver-chain';

/** An invented photodiode channel; it stands in a project that only its members see. */
export const PHOTODIODE_SPECIFICATION: Specification = {
  source: {
    kind: 'current',
    resistanceOhm: 100e6,
    capacitanceF: 12e-12,
    nominalLevel: 2e-6,
    largestLevel: 20e-6,
    dcCurrentA: 50e-9,
  },
  load: { resistanceOhm: 1000 },
  gainBasis: 'transimpedance',
  band: { lowHz: 10e3, operatingHz: 1e6, highHz: 2e6 },
  supply: { positiveV: 5, negativeV: -5 },
  requirements: {
    gainDb: { target: 100, tolerance: 1 },
    flatnessDb: 1,
    inputNoise: 3e-12,
    costMicros: 6_000_000,
  },
};

export function photodiodeOptions(idOf: DeviceIdOf): DemoOption[] {
  const stages: Stage[] = [
    {
      id: randomUUID(),
      kind: 'voltage-feedback',
      name: 'Transimpedance',
      topology: 'transimpedance',
      deviceId: idOf('QUIL-F230'),
      wantedGain: -10_000,
      feedbackOhm: 10_000,
      feedbackF: 1.2e-12,
      strayF: 0.5e-12,
    },
    {
      id: randomUUID(),
      kind: 'voltage-feedback',
      name: 'Gain',
      topology: 'non-inverting',
      deviceId: idOf('MRWG-V180'),
      wantedGain: 10,
      feedbackOhm: 910,
      gainOhm: 100,
      strayF: 0.5e-12,
    },
  ];
  return [{ name: 'Baseline', stages }];
}

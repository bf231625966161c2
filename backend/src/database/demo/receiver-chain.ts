import { randomUUID } from 'node:crypto';
import type { CurrentFeedbackStage, Specification, Stage, VoltageFeedbackStage } from '../../calculator/engine';

/** Finds a device of the demo's library by its part number. */
export type DeviceIdOf = (part: string) => string;

/** The invented ultrasonic thickness receiver: one stage spends more gain-bandwidth than it has. */
export const RECEIVER_SPECIFICATION: Specification = {
  source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', nominalLevel: 1e-3, largestLevel: 1e-3 },
  load: { resistanceOhm: 1000 },
  gainBasis: 'voltage',
  band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
  supply: { positiveV: 5, negativeV: -5 },
  requirements: {
    gainDb: { target: 60, tolerance: 1 },
    flatnessDb: 1,
    inputNoise: 2e-9,
    supplyCurrentA: 60e-3,
    costMicros: 9_000_000,
  },
};

type Parts = Pick<VoltageFeedbackStage, 'feedbackOhm' | 'gainOhm' | 'couplingF' | 'biasOhm'>;

function amplifier(
  deviceId: string,
  name: string,
  topology: 'non-inverting' | 'inverting',
  wantedGain: number,
  parts: Parts,
): VoltageFeedbackStage {
  // Half a picofarad of copper at the inverting pin.
  const strayF = 0.5e-12;
  return { id: randomUUID(), kind: 'voltage-feedback', name, topology, deviceId, wantedGain, ...parts, strayF };
}

// Every stage is coupled at about 159 kHz. An inverting stage couples into its own gain resistor.
const preamplifier = (deviceId: string, gain: number, parts: Pick<Parts, 'feedbackOhm' | 'gainOhm'>) =>
  amplifier(deviceId, 'Preamplifier', 'non-inverting', gain, { ...parts, couplingF: 330e-12, biasOhm: 3000 });

const secondHalf = (idOf: DeviceIdOf): Stage[] => [
  amplifier(idOf('MRWG-V300'), 'Post gain', 'non-inverting', 5, {
    feedbackOhm: 300,
    gainOhm: 75,
    couplingF: 1e-9,
    biasOhm: 1000,
  }),
  driver(idOf('TLYR-C220')),
];

function driver(deviceId: string): CurrentFeedbackStage {
  return {
    id: randomUUID(),
    kind: 'current-feedback',
    name: 'Driver',
    topology: 'inverting',
    deviceId,
    wantedGain: -2,
    feedbackOhm: 560,
    gainOhm: 280,
    couplingF: 3.6e-9,
  };
}

const times10 = { feedbackOhm: 180, gainOhm: 20 };
const times20 = { feedbackOhm: 511, gainOhm: 27 };

const baseline = (idOf: DeviceIdOf): Stage[] => [
  preamplifier(idOf('QUIL-D618'), 10, times10),
  amplifier(idOf('MRWG-G072'), 'Gain', 'inverting', -10, { feedbackOhm: 1000, gainOhm: 100, couplingF: 10e-9 }),
  ...secondHalf(idOf),
];

/** More gain in the preamplifier, a faster second stage at less gain. */
const optionA = (idOf: DeviceIdOf): Stage[] => [
  preamplifier(idOf('QUIL-D618'), 20, times20),
  amplifier(idOf('MRWG-V300'), 'Gain', 'inverting', -5, { feedbackOhm: 1000, gainOhm: 200, couplingF: 5.1e-9 }),
  ...secondHalf(idOf),
];

/** The second stage split into two at √10 each. */
const optionB = (idOf: DeviceIdOf): Stage[] => {
  const half = { feedbackOhm: 1000, gainOhm: 316, couplingF: 3.3e-9 };
  return [
    preamplifier(idOf('QUIL-D618'), 10, times10),
    amplifier(idOf('MRWG-G072'), 'Gain, first half', 'inverting', -3.162, half),
    amplifier(idOf('MRWG-G072'), 'Gain, second half', 'inverting', -3.162, half),
    ...secondHalf(idOf),
  ];
};

/** More gain in the preamplifier, the cheap second stage turned to non-inverting. */
const optionC = (idOf: DeviceIdOf): Stage[] => [
  preamplifier(idOf('QUIL-D618'), 20, times20),
  amplifier(idOf('MRWG-G072'), 'Gain', 'non-inverting', 5, {
    feedbackOhm: 1200,
    gainOhm: 300,
    couplingF: 1e-9,
    biasOhm: 1000,
  }),
  ...secondHalf(idOf),
];

export interface DemoOption {
  readonly name: string;
  readonly stages: readonly Stage[];
}

export function receiverOptions(idOf: DeviceIdOf): DemoOption[] {
  return [
    { name: 'Baseline', stages: baseline(idOf) },
    { name: 'A', stages: optionA(idOf) },
    { name: 'B', stages: optionB(idOf) },
    { name: 'C', stages: optionC(idOf) },
  ];
}

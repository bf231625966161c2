import { DEFAULT_POLICY } from '../policy';
import type {
  ChainInput,
  CurrentFeedbackDevice,
  CurrentFeedbackStage,
  VoltageFeedbackDevice,
  VoltageFeedbackStage,
} from '../types';

/**
 * An ultrasonic receiver with the assumptions of a hand calculation: one pole, DC gain practically infinite, output
 * resistance 0, no input capacitance, a source that does not load.
 */
export function handVoltageFeedback(id: string, typicalMhz: number, minimumMhz: number): VoltageFeedbackDevice {
  return {
    kind: 'voltage-feedback',
    id,
    partNumber: id,
    grade: 'general-purpose',
    channels: 1,
    gainBandwidthHz: { typ: typicalMhz * 1e6, min: minimumMhz * 1e6 },
    openLoopGainDb: { typ: 240 },
    secondPoleHz: 1e15,
    outputResistanceOhm: { typ: 0 },
    slewRateVPerS: { min: 250e6 },
    supplyCurrentA: { typ: 4e-3 },
  };
}

export const HAND_DRIVER: CurrentFeedbackDevice = {
  kind: 'current-feedback',
  id: 'TLYR-C220',
  partNumber: 'TLYR-C220',
  grade: 'rf',
  channels: 1,
  referenceBandwidthHz: { typ: 180e6, min: 150e6 },
  referenceNoiseGain: 3,
  referenceFeedbackOhm: 1000,
  invertingInputResistanceOhm: { typ: 0 },
  openLoopTransimpedanceOhm: { typ: 1e15 },
  secondPoleHz: 1e15,
  outputResistanceOhm: { typ: 0 },
};

export function nonInverting(id: string, deviceId: string, gain: number): VoltageFeedbackStage {
  return {
    kind: 'voltage-feedback',
    id,
    name: id,
    topology: 'non-inverting',
    deviceId,
    feedbackOhm: 100 * (gain - 1),
    gainOhm: 100,
  };
}

export function inverting(id: string, deviceId: string, gain: number): VoltageFeedbackStage {
  return {
    kind: 'voltage-feedback',
    id,
    name: id,
    topology: 'inverting',
    deviceId,
    feedbackOhm: 100 * gain,
    gainOhm: 100,
  };
}

export const HAND_DRIVER_STAGE: CurrentFeedbackStage = {
  kind: 'current-feedback',
  id: 's4',
  name: 'Driver',
  topology: 'inverting',
  deviceId: 'TLYR-C220',
  feedbackOhm: 1000,
  gainOhm: 500,
};

export const HAND_DEVICES = [
  handVoltageFeedback('QUIL-D618', 1600, 1200),
  handVoltageFeedback('MRWG-G072', 100, 75),
  handVoltageFeedback('MRWG-V300', 350, 260),
  HAND_DRIVER,
];

/** 3–7 MHz around 5 MHz, 1 mV peak from next to nothing into 1 kΩ. */
export function handReceiver(stages: ChainInput['stages']): ChainInput {
  return {
    specification: {
      source: {
        kind: 'voltage',
        resistanceOhm: 1e-6,
        levelKind: 'peak-emf',
        nominalLevel: 1e-3,
        largestLevel: 1e-3,
      },
      load: { resistanceOhm: 1000 },
      gainBasis: 'voltage',
      band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
      supply: { positiveV: 5, negativeV: -5 },
      requirements: {},
    },
    policy: DEFAULT_POLICY,
    stages,
    devices: HAND_DEVICES,
    currency: 'USD',
    buildQuantity: 250,
  };
}

export const HAND_BASELINE = [
  nonInverting('s1', 'QUIL-D618', 10),
  inverting('s2', 'MRWG-G072', 10),
  nonInverting('s3', 'MRWG-V300', 5),
  HAND_DRIVER_STAGE,
];

import { randomUUID } from 'node:crypto';
import { type ChainInput, DEFAULT_POLICY, type Stage, type VoltageFeedbackDevice } from './calculator/engine';

/** An invented amplifier with everything that a datasheet may give, so that no computation is left out. */
export function benchDevice(id: string, gainBandwidthHz: number): VoltageFeedbackDevice {
  return {
    id,
    kind: 'voltage-feedback',
    partNumber: `BENCH-${id}`,
    grade: 'general-purpose',
    channels: 1,
    gainBandwidthHz: { min: 0.75 * gainBandwidthHz, typ: gainBandwidthHz, max: 1.3 * gainBandwidthHz },
    openLoopGainDb: { typ: 100 },
    minimumStableGain: 1,
    phaseMarginDeg: 60,
    outputResistanceOhm: { typ: 30 },
    inputResistanceOhm: { typ: 1e6 },
    commonModeCapacitanceF: { typ: 1.5e-12 },
    differentialCapacitanceF: { typ: 1e-12 },
    slewRateVPerS: { min: 200e6, typ: 300e6 },
    headroomPositiveV: { max: 1.2 },
    headroomNegativeV: { max: 1.2 },
    outputCurrentA: { min: 40e-3 },
    inputOffsetVoltageV: { max: 1e-3 },
    inputBiasCurrentA: { max: 1e-6 },
    voltageNoiseVPerRtHz: { typ: 3e-9 },
    currentNoiseAPerRtHz: { typ: 2e-12 },
    supplyVoltageV: { min: 4.5, max: 12.6 },
    supplyCurrentA: { typ: 5e-3 },
    quote: { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 900_000 }] },
  };
}

/** Alternating stages of ×2 and −2 with coupling, as many as wanted. */
export function benchStages(count: number, deviceId: string): Stage[] {
  return Array.from({ length: count }, (_, index) => {
    const inverting = index % 2 === 1;
    return {
      id: randomUUID(),
      name: `Stage ${index + 1}`,
      kind: 'voltage-feedback',
      topology: inverting ? 'inverting' : 'non-inverting',
      deviceId,
      feedbackOhm: inverting ? 1000 : 500,
      gainOhm: 500,
      feedbackF: 0.2e-12,
      strayF: 1e-12,
      couplingF: 10e-9,
      ...(inverting ? {} : { biasOhm: 2000 }),
      isolationOhm: 10,
    };
  });
}

export function benchChain(stageCount: number): ChainInput {
  return {
    specification: {
      source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', nominalLevel: 1e-4, largestLevel: 1e-3 },
      load: { resistanceOhm: 1000, capacitanceF: 5e-12 },
      gainBasis: 'voltage',
      band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
      supply: { positiveV: 5, negativeV: -5 },
      requirements: {
        gainDb: { target: 6 * stageCount, tolerance: 1 },
        flatnessDb: 1,
        inputNoise: 5e-9,
        supplyCurrentA: 60e-3,
        costMicros: 9_000_000,
      },
    },
    policy: DEFAULT_POLICY,
    stages: benchStages(stageCount, 'amplifier'),
    devices: [benchDevice('amplifier', 400e6)],
    currency: 'USD',
    buildQuantity: 250,
  };
}

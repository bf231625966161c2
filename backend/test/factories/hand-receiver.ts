import { randomUUID } from 'node:crypto';

/**
 * An invented ultrasonic receiver whose figures were computed by hand with one pole, A0 → ∞, no output resistance and
 * no capacitance: every value that would depart from this is left out or made ideal.
 */
const usd = (amount: number) => ({
  currency: 'USD',
  breaks: [{ quantity: 1, unitPriceMicros: Math.round(amount * 1e6) }],
});

const amplifier = (id: string, minHz: number, typHz: number, slewVPerUs: number, supplyMa: number, price: number) => ({
  id,
  kind: 'voltage-feedback',
  partNumber: id.toUpperCase(),
  grade: 'general-purpose',
  channels: 1,
  gainBandwidthHz: { min: minHz, typ: typHz },
  openLoopGainDb: { typ: 180 },
  slewRateVPerS: { typ: slewVPerUs * 1e6 },
  supplyCurrentA: { typ: supplyMa / 1000 },
  quote: usd(price),
});

export const HAND_DEVICES = [
  { ...amplifier('hand-pre', 1200e6, 1600e6, 300, 18, 4.1), minimumStableGain: 7 },
  amplifier('hand-gain', 75e6, 100e6, 55, 4, 0.62),
  amplifier('hand-video', 260e6, 350e6, 250, 7, 1.45),
  {
    id: 'hand-driver',
    kind: 'current-feedback',
    partNumber: 'HAND-DRIVER',
    grade: 'rf',
    channels: 1,
    referenceBandwidthHz: { min: 150e6, typ: 180e6 },
    referenceNoiseGain: 3,
    referenceFeedbackOhm: 500,
    invertingInputResistanceOhm: { typ: 0 },
    openLoopTransimpedanceOhm: { typ: 1e15 },
    slewRateVPerS: { typ: 900e6 },
    supplyCurrentA: { typ: 9e-3 },
    quote: usd(1.95),
  },
];

const stage = (name: string, deviceId: string, topology: string, feedbackOhm: number, gainOhm: number) => ({
  id: randomUUID(),
  name,
  kind: deviceId === 'hand-driver' ? 'current-feedback' : 'voltage-feedback',
  topology,
  deviceId,
  feedbackOhm,
  gainOhm,
});

export function handReceiver(overrides: Record<string, unknown> = {}) {
  return {
    specification: {
      source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', nominalLevel: 1e-3, largestLevel: 1e-3 },
      load: { resistanceOhm: 1000 },
      gainBasis: 'voltage',
      band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
      supply: { positiveV: 5, negativeV: -5 },
      requirements: {
        gainDb: { target: 60, tolerance: 1 },
        flatnessDb: 1,
        supplyCurrentA: 60e-3,
        costMicros: 9_000_000,
      },
    },
    stages: [
      stage('Preamplifier', 'hand-pre', 'non-inverting', 9000, 1000),
      stage('Gain', 'hand-gain', 'inverting', 10_000, 1000),
      stage('Post gain', 'hand-video', 'non-inverting', 4000, 1000),
      stage('Driver', 'hand-driver', 'inverting', 500, 250),
    ],
    devices: HAND_DEVICES,
    currency: 'USD',
    buildQuantity: 250,
    ...overrides,
  };
}

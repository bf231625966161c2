import { performance } from 'node:perf_hooks';
import { isMainThread } from 'node:worker_threads';
import { DEFAULT_POLICY } from './engine';
import type { ChainInput, Device, Stage } from './engine';

const AMPLIFIER: Device = {
  id: 'amplifier',
  kind: 'voltage-feedback',
  partNumber: 'WARM-UP',
  grade: 'general-purpose',
  channels: 1,
  gainBandwidthHz: { min: 75e6, typ: 100e6 },
  minimumStableGain: 1,
  phaseMarginDeg: 60,
  outputResistanceOhm: { typ: 20 },
  commonModeCapacitanceF: { typ: 1e-12 },
  slewRateVPerS: { typ: 50e6 },
  voltageNoiseVPerRtHz: { typ: 4e-9 },
  currentNoiseAPerRtHz: { typ: 1e-12 },
  supplyCurrentA: { typ: 4e-3 },
};

const DRIVER: Device = {
  id: 'driver',
  kind: 'current-feedback',
  partNumber: 'WARM-UP-C',
  grade: 'rf',
  channels: 1,
  referenceBandwidthHz: { min: 150e6, typ: 180e6 },
  referenceNoiseGain: 3,
  referenceFeedbackOhm: 560,
};

const parts = { name: '', deviceId: 'amplifier', feedbackOhm: 1000, gainOhm: 200, strayF: 1e-12 } as const;

const STAGES: readonly Stage[] = [
  { id: '1', kind: 'voltage-feedback', topology: 'non-inverting', ...parts, couplingF: 1e-9, biasOhm: 1000 },
  { id: '2', kind: 'voltage-feedback', topology: 'inverting', ...parts, couplingF: 1e-9 },
  { id: '3', kind: 'rc-section', name: '', seriesOhm: 50, shuntF: 1e-12 },
  {
    id: '4',
    kind: 'current-feedback',
    topology: 'inverting',
    ...parts,
    deviceId: 'driver',
    feedbackOhm: 560,
    gainOhm: 280,
  },
];

/** A small chain of every amplifier kind, over its limit, so that remedies are looked for as well. */
const SAMPLE: ChainInput = {
  specification: {
    source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', largestLevel: 1e-3 },
    load: { resistanceOhm: 1000 },
    gainBasis: 'voltage',
    band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
    supply: { positiveV: 5, negativeV: -5 },
    requirements: { gainDb: { target: 35, tolerance: 1 }, flatnessDb: 0.5, inputNoise: 5e-9 },
  },
  policy: DEFAULT_POLICY,
  stages: STAGES,
  devices: [AMPLIFIER, DRIVER],
  currency: 'USD',
  buildQuantity: 1,
};

const WARM_UP_MS = 400;

/**
 * Lets the compiler see the calculator at work before the first person waits for it: fresh threads are several times
 * slower for their first few dozen calculations. Does nothing on the main thread.
 */
export function warmUp(run: (input: ChainInput) => unknown): void {
  if (isMainThread) return;
  const end = performance.now() + WARM_UP_MS;
  try {
    do run(SAMPLE);
    while (performance.now() < end);
  } catch {
    // A thread must start whatever the sample does: the first real calculation will tell what is wrong.
  }
}

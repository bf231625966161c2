import type { ChainInput, DatasheetValue, Device, Quote, Stage } from '../types';
import {
  chainInput,
  currentFeedbackDevice,
  currentFeedbackStage,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from './chain-builder.test-support';

/**
 * An invented ultrasonic receiver, 3 to 7 MHz, whose figures were computed by hand: one pole, A0 → ∞, no output
 * resistance, no capacitance, a source that does not load, no coupling, resistors without noise.
 */
export type ReceiverOption = 'Baseline' | 'A' | 'B' | 'C';

/** What is added to the hand assumptions. */
export interface Departure {
  readonly phaseMarginDeg?: number;
  readonly outputOhm?: number;
  /** Resistor to ground or from the stage in front, of every stage. */
  readonly gainOhm?: number;
  readonly couplingHz?: number;
}

/** A0 → ∞ */
const HUGE: DatasheetValue = { typ: 180 };
const HUGE_OHM: DatasheetValue = { typ: 1e15 };

function quote(...breaks: readonly (readonly [number, number])[]): Quote {
  return {
    currency: 'USD',
    breaks: breaks.map(([quantity, price]) => ({ quantity, unitPriceMicros: Math.round(price * 1e6) })),
  };
}

export const PREAMPLIFIER = 'quil-d618';
export const GENERAL = 'mrwg-g072';
export const VIDEO = 'mrwg-v300';
export const DRIVER = 'tlyr-c220';
export const ALTERNATE = 'quil-d852';

export function receiverDevices(departure: Departure): Device[] {
  const margin = departure.phaseMarginDeg === undefined ? {} : { phaseMarginDeg: departure.phaseMarginDeg };
  const ro = departure.outputOhm === undefined ? {} : { outputResistanceOhm: { typ: departure.outputOhm } };
  const amplifier = (id: string, minHz: number, typHz: number, slew: number, supply: number, price: Quote) =>
    voltageFeedbackDevice(id, minHz, {
      gainBandwidthHz: { min: minHz, typ: typHz },
      openLoopGainDb: HUGE,
      slewRateVPerS: { typ: slew * 1e6 },
      supplyCurrentA: { typ: supply * 1e-3 },
      quote: price,
      ...margin,
      ...ro,
    });
  const preamplifier = amplifier(PREAMPLIFIER, 1200e6, 1600e6, 300, 18, quote([1, 4.1]));
  const alternate = amplifier(ALTERNATE, 2900e6, 2900e6, 300, 18, quote([1, 3.55]));
  const breaks = quote([1, 1.35], [10, 1.12], [100, 0.92], [250, 0.62], [1000, 0.55]);
  return [
    { ...preamplifier, minimumStableGain: 7 },
    { ...alternate, minimumStableGain: 12 },
    { ...amplifier(GENERAL, 75e6, 100e6, 55, 4, breaks), minimumStableGain: 1 },
    { ...amplifier(VIDEO, 260e6, 350e6, 250, 7, quote([1, 1.45])), minimumStableGain: 1 },
    currentFeedbackDevice(DRIVER, 150e6, 3, 500, {
      referenceBandwidthHz: { min: 150e6, typ: 180e6 },
      openLoopTransimpedanceOhm: HUGE_OHM,
      invertingInputResistanceOhm: { typ: 0 },
      slewRateVPerS: { typ: 900e6 },
      supplyCurrentA: { typ: 9e-3 },
      quote: quote([1, 1.95]),
      ...ro,
    }),
  ];
}

type Link = readonly [deviceId: string, gain: number];

const LINKS: Readonly<Record<ReceiverOption, readonly Link[]>> = {
  Baseline: [
    [PREAMPLIFIER, 10],
    [GENERAL, -10],
    [VIDEO, 5],
    [DRIVER, -2],
  ],
  A: [
    [PREAMPLIFIER, 20],
    [VIDEO, -5],
    [VIDEO, 5],
    [DRIVER, -2],
  ],
  B: [
    [PREAMPLIFIER, 10],
    [GENERAL, -Math.sqrt(10)],
    [GENERAL, -Math.sqrt(10)],
    [VIDEO, 5],
    [DRIVER, -2],
  ],
  C: [
    [PREAMPLIFIER, 20],
    [GENERAL, 5],
    [VIDEO, 5],
    [DRIVER, -2],
  ],
};

/** The bias resistor of a coupled + input, and the resistor that an inverting stage couples into without a departure. */
const COUPLED_OHM = 1000;

export function receiverStages(option: ReceiverOption, departure: Departure, preamplifier = PREAMPLIFIER): Stage[] {
  return LINKS[option].map(([deviceId, gain], k) => {
    const id = `S${k + 1}`;
    const driver = deviceId === DRIVER;
    const gainOhm = departure.gainOhm ?? (driver ? 250 : COUPLED_OHM);
    const feedbackOhm = gain < 0 ? -gain * gainOhm : (gain - 1) * gainOhm;
    const parts = coupling(departure, gain < 0 ? gainOhm : null);
    if (driver) return currentFeedbackStage(id, DRIVER, 'inverting', 500, 250, coupling(departure, 250));
    const topology = gain < 0 ? 'inverting' : 'non-inverting';
    const device = deviceId === PREAMPLIFIER ? preamplifier : deviceId;
    return voltageFeedbackStage(id, device, topology, feedbackOhm, gainOhm, parts);
  });
}

function coupling(departure: Departure, gainOhm: number | null) {
  if (departure.couplingHz === undefined) return {};
  const ohm = gainOhm ?? COUPLED_OHM;
  const couplingF = 1 / (2 * Math.PI * departure.couplingHz * ohm);
  return gainOhm === null ? { couplingF, biasOhm: COUPLED_OHM } : { couplingF };
}

/** Source of 50 Ω EMF 1 mV peak, load 1 kΩ, ±5 V; the hand assumptions plus a departure. */
export function receiver(option: ReceiverOption, departure: Departure = {}, preamplifier = PREAMPLIFIER): ChainInput {
  return chainInput(receiverStages(option, departure, preamplifier), receiverDevices(departure), {
    load: { resistanceOhm: 1000 },
    requirements: {
      gainDb: { target: 60, tolerance: 1 },
      flatnessDb: 1,
      inputNoise: 2e-9,
      supplyCurrentA: 60e-3,
      costMicros: 9_000_000,
    },
  });
}

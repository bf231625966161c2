import type {
  CurrentFeedbackDevice,
  DatasheetValue,
  Device,
  GbwCase,
  MatchedBlockDevice,
  Policy,
  VoltageFeedbackDevice,
} from '../types';
import { Circuit, GROUND } from './circuit.test-support';
import { Complex, complex, divide, magnitudeSquared, multiply, scale } from './complex-matrix.test-support';

/**
 * Numbers of one device in one GBW case, read from its datasheet values without the calculator. Values other than
 * the bandwidth are expected in the typical column only.
 */
interface AmplifierModel {
  readonly ro: number;
  readonly inputOhm: number;
  readonly ccm: number;
  readonly voltageNoise: number;
  readonly voltageCorner: number;
  readonly plusCurrentNoise: number;
  readonly minusCurrentNoise: number;
  readonly currentCorner: number;
  readonly secondPoleHz: number;
}

export interface VoltageFeedbackModel extends AmplifierModel {
  readonly kind: 'voltage-feedback';
  readonly gbwHz: number;
  readonly dcGain: number;
  readonly cdiff: number;
}

export interface CurrentFeedbackModel extends AmplifierModel {
  readonly kind: 'current-feedback';
  readonly rb: number;
  readonly dcTransimpedance: number;
  /** K = Z0·ωz in Ω·rad/s. */
  readonly k: number;
}

export interface BlockModel {
  readonly kind: 'matched-block';
  readonly z0: number;
  readonly gain: number;
  readonly lowerHz: number;
  readonly upperHz: number;
  /** Null: a matched passive, whose factor is 1/|S21|² at each frequency. */
  readonly noiseFactor: number | null;
}

export type DeviceModel = VoltageFeedbackModel | CurrentFeedbackModel | BlockModel;

const only = (value: DatasheetValue | undefined, silent: number): number => value?.typ ?? silent;

function bandwidth(value: DatasheetValue, gbwCase: GbwCase, policy: Policy): number {
  if (gbwCase === 'typical') return value.typ ?? value.min ?? NaN;
  const minimum = value.min ?? (value.typ ?? NaN) * policy.gbwDerating;
  return gbwCase === 'minimum' ? minimum : minimum * policy.temperatureFactor;
}

const known = new WeakMap<Device, Map<string, DeviceModel>>();

/** Remembered by device: a current-feedback device is a search of its own. */
export function deviceModel(device: Device, gbwCase: GbwCase, policy: Policy): DeviceModel {
  const key = `${gbwCase} ${policy.gbwDerating} ${policy.temperatureFactor}`;
  const models = known.get(device) ?? new Map<string, DeviceModel>();
  known.set(device, models);
  const model = models.get(key) ?? resolveModel(device, gbwCase, policy);
  models.set(key, model);
  return model;
}

function resolveModel(device: Device, gbwCase: GbwCase, policy: Policy): DeviceModel {
  if (device.kind === 'voltage-feedback') return voltageFeedbackModel(device, gbwCase, policy);
  if (device.kind === 'current-feedback') return currentFeedbackModel(device, gbwCase, policy);
  return blockModel(device, gbwCase, policy);
}

function amplifierModel(device: VoltageFeedbackDevice | CurrentFeedbackDevice): Omit<AmplifierModel, 'secondPoleHz'> {
  const plus = only(device.currentNoiseAPerRtHz, 0);
  return {
    ro: only(device.outputResistanceOhm, 0),
    inputOhm: only(device.inputResistanceOhm, Infinity),
    ccm: only(device.commonModeCapacitanceF, 0),
    voltageNoise: only(device.voltageNoiseVPerRtHz, 0),
    voltageCorner: device.voltageNoiseCornerHz ?? 0,
    plusCurrentNoise: plus,
    minusCurrentNoise: device.kind === 'current-feedback' ? only(device.invertingCurrentNoiseAPerRtHz, 0) : plus,
    currentCorner: device.currentNoiseCornerHz ?? 0,
  };
}

function voltageFeedbackModel(device: VoltageFeedbackDevice, gbwCase: GbwCase, policy: Policy): VoltageFeedbackModel {
  return {
    kind: 'voltage-feedback',
    ...amplifierModel(device),
    gbwHz: bandwidth(device.gainBandwidthHz, gbwCase, policy),
    dcGain: 10 ** (only(device.openLoopGainDb, 120) / 20),
    cdiff: only(device.differentialCapacitanceF, 0),
    secondPoleHz: device.secondPoleHz ?? secondPoleFromMargin(device),
  };
}

/** |A| of two poles is G where the second pole alone turns the phase by 90° − φ; A0 → ∞. */
function secondPoleFromMargin(device: VoltageFeedbackDevice): number {
  if (device.phaseMarginDeg === undefined) return Infinity;
  const gain = device.phaseMarginGain ?? device.minimumStableGain ?? 1;
  const phi = (device.phaseMarginDeg * Math.PI) / 180;
  const typical = device.gainBandwidthHz.typ ?? device.gainBandwidthHz.min ?? NaN;
  // Crossover fc = f2·cot φ and GBW/fc/√(1 + cot²φ) = G.
  const crossover = (typical / gain) * Math.sin(phi);
  return crossover * Math.tan(phi);
}

function blockModel(device: MatchedBlockDevice, gbwCase: GbwCase, policy: Policy): BlockModel {
  const gainDb = only(device.gainDb, NaN);
  return {
    kind: 'matched-block',
    z0: device.impedanceOhm,
    gain: 10 ** (gainDb / 20),
    lowerHz: only(device.lowerCornerHz, 0),
    upperHz: device.upperCornerHz ? bandwidth(device.upperCornerHz, gbwCase, policy) : Infinity,
    noiseFactor: device.noiseFigureDb ? 10 ** (only(device.noiseFigureDb, NaN) / 10) : null,
  };
}

const pole = (hz: number, frequencyHz: number): Complex => complex(1, frequencyHz / hz);

export function openLoopGain(model: VoltageFeedbackModel, frequencyHz: number): Complex {
  const first = pole(model.gbwHz / model.dcGain, frequencyHz);
  return divide(complex(model.dcGain), multiply(first, pole(model.secondPoleHz, frequencyHz)));
}

export function openLoopTransimpedance(model: CurrentFeedbackModel, frequencyHz: number): Complex {
  const first = pole(model.k / (2 * Math.PI * model.dcTransimpedance), frequencyHz);
  return divide(complex(model.dcTransimpedance), multiply(first, pole(model.secondPoleHz, frequencyHz)));
}

export function blockS21(model: BlockModel, frequencyHz: number): Complex {
  const high = pole(model.upperHz, frequencyHz);
  const low = model.lowerHz === 0 ? complex(1) : pole(frequencyHz, -model.lowerHz);
  return divide(complex(model.gain), multiply(high, low));
}

function currentFeedbackModel(device: CurrentFeedbackDevice, gbwCase: GbwCase, policy: Policy): CurrentFeedbackModel {
  const model: CurrentFeedbackModel = {
    kind: 'current-feedback',
    ...amplifierModel(device),
    rb: only(device.invertingInputResistanceOhm, 0),
    dcTransimpedance: only(device.openLoopTransimpedanceOhm, NaN),
    secondPoleHz: device.secondPoleHz ?? Infinity,
    k: NaN,
  };
  return { ...model, k: solveK(device, model, bandwidth(device.referenceBandwidthHz, gbwCase, policy)) };
}

/** Bisection of K on the nodal solution of the maker's circuit: half power of the ideal gain at its bandwidth. */
function solveK(device: CurrentFeedbackDevice, model: CurrentFeedbackModel, bandwidthHz: number): number {
  const gain = device.referenceNoiseGain;
  const power = (k: number): number => magnitudeSquared(referenceGain(device, { ...model, k }, bandwidthHz));
  const guess = 2 * Math.PI * bandwidthHz * (device.referenceFeedbackOhm + gain * model.rb);
  let low = Math.log(guess) - 7;
  let high = Math.log(guess) + 7;
  while (high - low > 1e-15 * Math.abs(high)) {
    const middle = (low + high) / 2;
    if (middle === low || middle === high) break;
    if (power(Math.exp(middle)) < (gain * gain) / 2) low = middle;
    else high = middle;
  }
  return Math.exp((low + high) / 2);
}

/** Non-inverting, driven from 0 Ω, no load, no capacitance at the inverting node. */
function referenceGain(device: CurrentFeedbackDevice, model: CurrentFeedbackModel, frequencyHz: number): Complex {
  const circuit = new Circuit();
  const plus = circuit.node();
  const source = circuit.branch(plus, GROUND, complex(0));
  const { out, inverting } = currentFeedbackCore(circuit, model, plus, frequencyHz, model.ro);
  circuit.branch(out, inverting, complex(device.referenceFeedbackOhm));
  if (device.referenceNoiseGain > 1) {
    const gainOhm = device.referenceFeedbackOhm / (device.referenceNoiseGain - 1);
    circuit.admittance(inverting, GROUND, complex(1 / gainOhm));
  }
  return circuit
    .solver()
    .solve({ kind: 'emf', branch: source, factor: complex(1) })
    .voltage(out);
}

export interface AmplifierNodes {
  readonly out: number;
  readonly inverting: number;
  readonly plus: number;
  /** The branch whose controlled source closes the loop, and its gain (A or Z). */
  readonly controlled: number;
  readonly openLoop: Complex;
  /** Where a voltage in series with the amplifier's own + input acts, and with which factor. */
  readonly inputEmf: { readonly branch: number; readonly factor: Complex };
  /** Buffer of a current-feedback amplifier. */
  readonly buffer: number | null;
}

export function currentFeedbackCore(
  circuit: Circuit,
  model: CurrentFeedbackModel,
  plus: number,
  frequencyHz: number,
  ro: number,
): AmplifierNodes {
  const inverting = circuit.node();
  const out = circuit.node();
  const buffer = circuit.branch(plus, inverting, complex(model.rb), { drawsFrom: false });
  const openLoop = openLoopTransimpedance(model, frequencyHz);
  const controlled = circuit.branch(out, GROUND, complex(ro), {
    currentControls: [{ branch: buffer, gain: openLoop }],
  });
  return { out, inverting, plus, controlled, openLoop, inputEmf: { branch: buffer, factor: complex(-1) }, buffer };
}

export function voltageFeedbackCore(
  circuit: Circuit,
  model: VoltageFeedbackModel,
  plus: number,
  frequencyHz: number,
  ro: number,
): AmplifierNodes {
  const inverting = circuit.node();
  const out = circuit.node();
  const openLoop = openLoopGain(model, frequencyHz);
  const controlled = circuit.branch(out, GROUND, complex(ro), {
    controls: [
      { node: plus, gain: openLoop },
      { node: inverting, gain: scale(openLoop, -1) },
    ],
  });
  circuit.capacitor(plus, inverting, model.cdiff, 2 * Math.PI * frequencyHz);
  return {
    out,
    inverting,
    plus,
    controlled,
    openLoop,
    inputEmf: { branch: controlled, factor: openLoop },
    buffer: null,
  };
}

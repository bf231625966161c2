import type { Maybe } from '../analysis';
import { upperWorst } from '../devices/amplifier-values';
import type { DeviceCorner } from '../devices/used-values';
import type { FeedbackPartValues } from '../stages/feedback-parts';
import type { PreparedStage } from '../stages/prepare-stage';
import type { AmplifierDevice, ChainInput } from '../types';
import { known, unknown } from '../maybe';

/** Offsets, worst case: the magnitudes of all contributions add, because their signs are not known. */
export interface DcOffsets {
  /** Per stage, in order: at the amplifier's output, of a passive stage at its open end. V. */
  readonly stages: readonly Maybe[];
  /** At the load. V. */
  readonly load: Maybe;
}

/** What the offset of a feedback stage is made of, for its working. */
export interface DcTerms {
  /** 1 + Rf·(conductance from the inverting node to the left or to ground) at DC. */
  readonly noiseGain: number;
  /** What the bias current of the + pin flows through, Ω. */
  readonly plusOhm: number;
  /** Offset of the stages in front, as it stands at this output, V. */
  readonly carriedV: number;
}

interface DcPort {
  volt: number;
  /** Infinity: nothing conducts to the left. */
  ohm: number;
  /** First thing that is not known on the way here; null: all known. */
  missing: string | null;
}

function shunt(port: DcPort, siemens: number): void {
  if (siemens === 0) return;
  if (port.ohm === Infinity) {
    port.ohm = 1 / siemens;
    return;
  }
  const divisor = 1 + port.ohm * siemens;
  port.volt /= divisor;
  port.ohm /= divisor;
}

/** A series capacitor: nothing from the left gets past it. */
function block(port: DcPort): void {
  port.volt = 0;
  port.ohm = Infinity;
  port.missing = null;
}

const conductance = (ohm: number | null): number => (ohm ? 1 / ohm : 0);

function advanceFeedback(
  port: DcPort,
  values: FeedbackPartValues,
  device: AmplifierDevice,
  corner: DeviceCorner,
): DcTerms {
  shunt(port, conductance(values.terminationOhm));
  if (values.couplingF) block(port);
  let missing = port.missing;
  const contribution = (what: string, value: number | undefined, factor: number): number => {
    if (factor === 0) return 0;
    if (value === undefined) missing ??= `${what} of ${device.partNumber} is not entered.`;
    return Math.abs(value ?? 0) * factor;
  };
  if (!values.inverting) shunt(port, conductance(values.biasOhm) + values.inputS);
  const legS = values.inverting ? 1 / (port.ohm + values.seriesOhm) : values.gainS;
  const noiseGain = 1 + values.feedbackOhm * legS;
  const signal = port.volt * (values.inverting ? values.feedbackOhm * legS : noiseGain);
  const plusOhm = values.inverting ? 0 : port.ohm;
  const bias = upperWorst(device.inputBiasCurrentA, corner)?.value;
  const minusBias = device.kind === 'current-feedback' ? upperWorst(device.invertingBiasCurrentA, corner)?.value : bias;
  port.volt =
    signal +
    contribution('Input offset voltage', upperWorst(device.inputOffsetVoltageV, corner)?.value, noiseGain) +
    contribution('Input bias current', bias, plusOhm * noiseGain) +
    contribution('Bias current of the inverting input', minusBias, values.feedbackOhm);
  port.ohm = values.isolationOhm;
  port.missing = missing;
  return { noiseGain, plusOhm, carriedV: signal };
}

function advance(port: DcPort, stage: PreparedStage, corner: DeviceCorner): DcTerms | null {
  const { section, block: matched, feedback, device } = stage;
  if (section) {
    port.ohm += section.seriesOhm;
    if (section.seriesF > 0) block(port);
    shunt(port, section.shuntS);
  } else if (matched) {
    if (matched.lowerCornerHz > 0) block(port);
    port.volt = port.ohm === Infinity ? 0 : (2 * matched.gain * matched.impedanceOhm * port.volt) / sum(port, matched);
    port.ohm = matched.impedanceOhm;
  } else if (feedback && device && device.kind !== 'matched-block') {
    return advanceFeedback(port, feedback, device, corner);
  }
  return null;
}

/** The terms of one stage's offset; null for a stage without feedback. */
export function dcTerms(
  input: ChainInput,
  stages: readonly PreparedStage[],
  corner: DeviceCorner,
  index: number,
): DcTerms | null {
  const port = sourcePort(input);
  return stages.slice(0, index + 1).reduce<DcTerms | null>((_, stage) => advance(port, stage, corner), null);
}

const sum = (port: DcPort, { impedanceOhm }: { impedanceOhm: number }): number => port.ohm + impedanceOhm;

const offsetOf = (port: DcPort): Maybe => (port.missing === null ? known(port.volt) : unknown(port.missing));

function sourcePort(input: ChainInput): DcPort {
  const { source } = input.specification;
  const port: DcPort = { volt: 0, ohm: source.resistanceOhm, missing: null };
  if (source.kind === 'voltage') return port;
  port.volt = Math.abs(source.dcCurrentA ?? 0) * source.resistanceOhm;
  if (source.dcCurrentA === undefined) port.missing = 'The DC current of the source is not entered.';
  return port;
}

/**
 * DC offset at every output and at the load: input offset voltage and bias current times what each pin sees, times the DC
 * noise gain; dark or ambient current times Rf; carried on along the chain up to the next coupling capacitor.
 * Source: node equations at DC with an ideal amplifier; textbook network theory.
 *
 * @example Vos 1 mV, non-inverting ×10, no bias current: 10 mV, and 50 mV behind a further ×5
 */
export function dcOffsets(input: ChainInput, stages: readonly PreparedStage[], corner: DeviceCorner): DcOffsets {
  const port = sourcePort(input);
  const offsets = stages.map((stage) => {
    advance(port, stage, corner);
    return offsetOf(port);
  });
  shunt(port, conductance(input.specification.load.resistanceOhm));
  return { stages: offsets, load: offsetOf(port) };
}

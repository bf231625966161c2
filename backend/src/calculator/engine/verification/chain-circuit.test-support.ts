import type { ChainInput, FeedbackStage, GbwCase, RcSectionStage, Source, Stage } from '../types';
import { Circuit, GROUND, Injection, parallelRc } from './circuit.test-support';
import { Complex, complex, reciprocal, scale } from './complex-matrix.test-support';
import {
  AmplifierNodes,
  BlockModel,
  CurrentFeedbackModel,
  DeviceModel,
  VoltageFeedbackModel,
  blockS21,
  currentFeedbackCore,
  deviceModel,
  voltageFeedbackCore,
} from './device-models.test-support';

/** SI Brochure, 9th edition (2019): exact. */
const BOLTZMANN = 1.380649e-23;
/** IEEE standard noise temperature. */
const T0 = 290;

/** Which part of a chain is drawn; with or without the source in front and the load behind. */
export interface Extent {
  readonly first: number;
  readonly last: number;
  readonly withSource: boolean;
  readonly withLoad: boolean;
}

export interface ChainCircuit {
  readonly circuit: Circuit;
  /** nodes[k] is in front of stage k, nodes[k + 1] behind it. */
  readonly nodes: readonly number[];
  /** EMF of 1 V (voltage source) or the Norton current × Z, so that both have the same unit transfer. */
  readonly sourceEmf: Injection | null;
  readonly amplifiers: ReadonlyMap<number, AmplifierNodes>;
}

export interface ChainContext {
  readonly input: ChainInput;
  readonly models: readonly (DeviceModel | null)[];
  readonly frequencyHz: number;
  readonly omega: number;
  readonly ambientK: number;
}

export function chainContext(input: ChainInput, gbwCase: GbwCase, frequencyHz: number): ChainContext {
  const byId = new Map(input.devices.map((device) => [device.id, deviceModel(device, gbwCase, input.policy)]));
  return {
    input,
    models: input.stages.map((stage) => ('deviceId' in stage ? (byId.get(stage.deviceId) ?? null) : null)),
    frequencyHz,
    omega: 2 * Math.PI * frequencyHz,
    ambientK: input.specification.ambientK ?? 298.15,
  };
}

export const wholeChain = (context: ChainContext): Extent => ({
  first: 0,
  last: context.input.stages.length - 1,
  withSource: true,
  withLoad: true,
});

export function sourceImpedance(source: Source, omega: number): Complex {
  return source.kind === 'voltage'
    ? complex(source.resistanceOhm)
    : parallelRc(source.resistanceOhm, source.capacitanceF, omega);
}

/** `outputOhm` replaces the output resistance of one stage's amplifier. */
export function chainCircuit(
  context: ChainContext,
  extent: Extent,
  outputOhm?: { readonly stage: number; readonly ohm: number },
): ChainCircuit {
  const circuit = new Circuit();
  const { specification, stages } = context.input;
  const nodes: number[] = [];
  const amplifiers = new Map<number, AmplifierNodes>();
  nodes[extent.first] = circuit.node();
  const sourceEmf = extent.withSource ? drawSource(context, circuit, nodes[0]) : null;
  for (let k = extent.first; k <= extent.last; k++) {
    const override = outputOhm?.stage === k ? outputOhm.ohm : undefined;
    const drawn = drawStage(new StagePen(context, circuit, stages[k]), context.models[k], nodes[k], override);
    nodes[k + 1] = drawn.out;
    if (drawn.amplifier) amplifiers.set(k, drawn.amplifier);
  }
  if (extent.withLoad) {
    const { resistanceOhm, capacitanceF } = specification.load;
    const end = nodes[stages.length];
    if (resistanceOhm !== null) circuit.admittance(end, GROUND, complex(1 / resistanceOhm));
    circuit.capacitor(end, GROUND, capacitanceF ?? 0, context.omega);
  }
  return { circuit, nodes, sourceEmf, amplifiers };
}

function drawSource(context: ChainContext, circuit: Circuit, node: number): Injection {
  const impedance = sourceImpedance(context.input.specification.source, context.omega);
  const branch = circuit.branch(node, GROUND, impedance);
  return { kind: 'emf', branch, factor: complex(1) };
}

/** Draws parts of one stage, each resistor with its thermal noise. */
class StagePen {
  constructor(
    readonly context: ChainContext,
    readonly circuit: Circuit,
    readonly stage: Stage,
  ) {}

  thermal(ohm: number): number {
    return 4 * BOLTZMANN * this.context.ambientK * ohm;
  }

  generator(name: string, injection: Injection, density: number): void {
    if (density > 0) this.circuit.noise.push({ name, owner: this.stage.id, injection, density });
  }

  shuntResistor(node: number, ohm: number | null | undefined, name: string): void {
    if (ohm === null || ohm === undefined || ohm === Infinity) return;
    this.circuit.admittance(node, GROUND, complex(1 / ohm));
    this.generator(name, { kind: 'current', from: GROUND, to: node }, this.thermal(1) / ohm);
  }

  /** Series resistor, 0 Ω included; gives the node behind it. */
  seriesResistor(node: number, ohm: number, name: string, behind = this.circuit.node()): number {
    const branch = this.circuit.branch(node, behind, complex(ohm));
    this.generator(name, { kind: 'emf', branch, factor: complex(1) }, this.thermal(ohm));
    return behind;
  }

  seriesCapacitor(node: number, farad: number | null | undefined): number {
    if (farad === null || farad === undefined) return node;
    const behind = this.circuit.node();
    this.circuit.branch(node, behind, reciprocal(complex(0, this.context.omega * farad)));
    return behind;
  }

  capacitorToGround(node: number, farad: number): void {
    this.circuit.capacitor(node, GROUND, farad, this.context.omega);
  }
}

interface DrawnStage {
  readonly out: number;
  readonly amplifier?: AmplifierNodes;
}

function drawStage(pen: StagePen, model: DeviceModel | null, node: number, outputOhm?: number): DrawnStage {
  const { stage } = pen;
  if (stage.kind === 'rc-section') return { out: drawRcSection(pen, stage, node) };
  if (stage.kind === 'matched-block') return { out: drawBlock(pen, model as BlockModel, node) };
  return drawFeedbackStage(pen, stage, model as VoltageFeedbackModel | CurrentFeedbackModel, node, outputOhm);
}

function drawRcSection(pen: StagePen, stage: RcSectionStage, node: number): number {
  const behindResistor = pen.seriesResistor(node, stage.seriesOhm ?? 0, 'series R');
  const out = pen.seriesCapacitor(behindResistor, stage.seriesF);
  pen.shuntResistor(out, stage.shuntOhm, 'shunt R');
  pen.capacitorToGround(out, stage.shuntF ?? 0);
  return out;
}

function drawBlock(pen: StagePen, model: BlockModel, node: number): number {
  const { circuit, context } = pen;
  circuit.admittance(node, GROUND, complex(1 / model.z0));
  const out = circuit.node();
  const s21 = blockS21(model, context.frequencyHz);
  const branch = circuit.branch(out, GROUND, complex(model.z0), { controls: [{ node, gain: scale(s21, 2) }] });
  const s21Power = s21.re * s21.re + s21.im * s21.im;
  const noiseFactor = model.noiseFactor ?? 1 / s21Power;
  const density = 4 * BOLTZMANN * T0 * model.z0 * (noiseFactor - 1) * s21Power;
  pen.generator('block', { kind: 'emf', branch, factor: complex(1) }, density);
  return out;
}

function drawFeedbackStage(
  pen: StagePen,
  stage: FeedbackStage,
  model: VoltageFeedbackModel | CurrentFeedbackModel,
  node: number,
  outputOhm = model.ro,
): DrawnStage {
  const { circuit, context } = pen;
  const nonInverting = stage.topology === 'non-inverting' || stage.topology === 'follower';
  pen.shuntResistor(node, stage.terminationOhm, 'termination');
  const behindCoupling = pen.seriesCapacitor(node, stage.couplingF);
  const plus = nonInverting ? behindCoupling : GROUND;
  const amplifier =
    model.kind === 'voltage-feedback'
      ? voltageFeedbackCore(circuit, model, plus, context.frequencyHz, outputOhm)
      : currentFeedbackCore(circuit, model, plus, context.frequencyHz, outputOhm);
  const { inverting, out } = amplifier;
  if (nonInverting) drawPlusPin(pen, stage, model, plus, inverting);
  else pen.seriesResistor(behindCoupling, stage.gainOhm ?? 0, 'Rg', inverting);
  pen.capacitorToGround(inverting, model.ccm + (stage.strayF ?? 0));
  drawFeedback(pen, stage, out, inverting);
  drawAmplifierNoise(pen, model, amplifier, plus);
  return { out: pen.seriesResistor(out, stage.isolationOhm ?? 0, 'isolation'), amplifier };
}

function drawPlusPin(
  pen: StagePen,
  stage: FeedbackStage,
  model: VoltageFeedbackModel | CurrentFeedbackModel,
  plus: number,
  inverting: number,
): void {
  pen.shuntResistor(plus, stage.biasOhm, 'bias');
  if (Number.isFinite(model.inputOhm)) pen.circuit.admittance(plus, GROUND, complex(1 / model.inputOhm));
  pen.capacitorToGround(plus, model.ccm);
  if (stage.topology === 'non-inverting') pen.shuntResistor(inverting, stage.gainOhm, 'Rg');
}

function drawFeedback(pen: StagePen, stage: FeedbackStage, out: number, inverting: number): void {
  const zf = parallelRc(stage.feedbackOhm, stage.feedbackF ?? 0, pen.context.omega);
  const branch = pen.circuit.branch(out, inverting, zf);
  if (stage.feedbackOhm === 0) return;
  // The thermal current of Rf flows in Rf ∥ Cf: an EMF of i·Zf in series with Zf.
  pen.generator('Rf', { kind: 'emf', branch, factor: zf }, pen.thermal(1) / stage.feedbackOhm);
}

function drawAmplifierNoise(
  pen: StagePen,
  model: VoltageFeedbackModel | CurrentFeedbackModel,
  amplifier: AmplifierNodes,
  plus: number,
): void {
  const { frequencyHz } = pen.context;
  const currentRise = 1 + model.currentCorner / frequencyHz;
  const voltageDensity = model.voltageNoise ** 2 * (1 + model.voltageCorner / frequencyHz);
  pen.generator('en', { kind: 'emf', ...amplifier.inputEmf }, voltageDensity);
  if (plus !== GROUND) {
    const density = model.plusCurrentNoise ** 2 * currentRise;
    pen.generator('in+', { kind: 'current', from: GROUND, to: plus }, density);
  }
  const minusDensity = model.minusCurrentNoise ** 2 * currentRise;
  pen.generator('in-', { kind: 'current', from: GROUND, to: amplifier.inverting }, minusDensity);
}

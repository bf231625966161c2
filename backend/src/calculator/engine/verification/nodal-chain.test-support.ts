import type { ChainInput, GbwCase } from '../types';
import { ChainCircuit, ChainContext, chainCircuit, chainContext, wholeChain } from './chain-circuit.test-support';
import { GROUND, NoiseGenerator, Solution, Solver } from './circuit.test-support';
import { Complex, complex, divide, magnitudeSquared, scale, subtract } from './complex-matrix.test-support';

/** What a nodal solution of the whole chain says at one frequency; the counterpart of the calculator's probe. */
export class NodalChain {
  readonly context: ChainContext;
  private readonly whole: ChainCircuit;
  private readonly solver: Solver;
  private readonly signal: Solution;

  constructor(input: ChainInput, gbwCase: GbwCase, frequencyHz: number) {
    this.context = chainContext(input, gbwCase, frequencyHz);
    this.whole = chainCircuit(this.context, wholeChain(this.context));
    this.solver = this.whole.circuit.solver();
    this.signal = this.solver.solve(this.whole.sourceEmf!);
  }

  private get last(): number {
    return this.context.input.stages.length - 1;
  }

  private get loadNode(): number {
    return this.whole.nodes[this.last + 1];
  }

  /** V_load / EMF. */
  gain(): Complex {
    return this.signal.voltage(this.loadNode);
  }

  /** Voltage behind stage k with everything connected, per volt of EMF. */
  node(k: number): Complex {
    return this.signal.voltage(this.whole.nodes[k + 1]);
  }

  /** Open-circuit voltage behind stage k, and the impedance there, with everything behind cut off. */
  port(k: number): { readonly openCircuit: Complex; readonly impedance: Complex; readonly noiseV2PerHz: number } {
    const cut = chainCircuit(this.context, { first: 0, last: k, withSource: true, withLoad: false });
    const solver = cut.circuit.solver();
    const out = cut.nodes[k + 1];
    return {
      openCircuit: solver.solve(cut.sourceEmf!).voltage(out),
      impedance: solver.solve({ kind: 'current', from: GROUND, to: out }).voltage(out),
      noiseV2PerHz: solver.noiseAt(out, cut.circuit.noise),
    };
  }

  /** Impedance seen from the left into stage k with all that follows connected. */
  inputImpedance(k: number): Complex {
    const cut = chainCircuit(this.context, { first: k, last: this.last, withSource: false, withLoad: true });
    const node = cut.nodes[k];
    return cut.circuit.solver().solve({ kind: 'current', from: GROUND, to: node }).voltage(node);
  }

  /** Return ratio of the amplifier's controlled source in the complete chain; null for stages without a loop. */
  loopGain(k: number): Complex | null {
    return returnRatio(this.whole, k);
  }

  /** What A must exceed: A over the return ratio with no output resistance; current feedback: 1/β with Rb taken out. */
  noiseGain(k: number): Complex | null {
    const ideal = chainCircuit(this.context, wholeChain(this.context), { stage: k, ohm: 0 });
    const amplifier = ideal.amplifiers.get(k);
    if (!amplifier) return null;
    if (amplifier.buffer === null) return divide(amplifier.openLoop, returnRatio(ideal, k)!);
    const open = ideal.circuit.withoutControl(amplifier.controlled).withOpen(amplifier.buffer).solver();
    const driven = open.solve({ kind: 'emf', branch: amplifier.controlled, factor: complex(1) });
    return divide(complex(1), driven.voltage(amplifier.inverting));
  }

  generators(k: number): readonly NoiseGenerator[] {
    const { id } = this.context.input.stages[k];
    return this.whole.circuit.noise.filter((generator) => generator.owner === id);
  }

  /** Noise that stage k adds, at the load, V²/Hz. */
  stageNoiseAtLoad(k: number): number {
    return this.solver.noiseAt(this.loadNode, this.generators(k));
  }

  /** |V_load / generator|² of one generator. */
  noiseTransferSquared(generator: NoiseGenerator): number {
    return magnitudeSquared(this.solver.solve(generator.injection).voltage(this.loadNode));
  }

  /** Noise of all stages at the load, V²/Hz. */
  noiseAtLoad(): number {
    return this.solver.noiseAt(this.loadNode, this.whole.circuit.noise);
  }
}

function returnRatio(chain: ChainCircuit, k: number): Complex | null {
  const amplifier = chain.amplifiers.get(k);
  if (!amplifier) return null;
  const opened = chain.circuit.withoutControl(amplifier.controlled).solver();
  const returned = opened.solve({ kind: 'emf', branch: amplifier.controlled, factor: amplifier.openLoop });
  if (amplifier.buffer !== null) return scale(returned.current(amplifier.buffer), -1);
  return subtract(returned.voltage(amplifier.inverting), returned.voltage(amplifier.plus));
}

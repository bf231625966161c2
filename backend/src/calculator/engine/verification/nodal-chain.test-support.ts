import type { ChainInput, GbwCase } from '../types';
import { ChainCircuit, ChainContext, chainCircuit, chainContext, wholeChain } from './chain-circuit.test-support';
import { GROUND, NoiseGenerator, Solution, Solver } from './circuit.test-support';
import {
  Complex,
  SingularCircuit,
  complex,
  divide,
  magnitudeSquared,
  scale,
  subtract,
} from './complex-matrix.test-support';

export interface NodalPort {
  readonly openCircuit: Complex;
  readonly impedance: Complex;
  /** Added by all stages up to here. */
  readonly noiseV2PerHz: number;
  /** Of each generator of this stage. */
  readonly ownNoiseV2PerHz: readonly number[];
}

/** What a nodal solution of the whole chain says at one frequency; the counterpart of the calculator's probe. */
export class NodalChain {
  readonly context: ChainContext;
  private readonly whole: ChainCircuit;
  private readonly solver: Solver;
  private readonly signal: Solution;
  private readonly ports = new Map<number, NodalPort>();

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

  /** Open-circuit voltage, impedance and noise behind stage k with everything that follows cut off. */
  port(k: number): NodalPort {
    const known = this.ports.get(k) ?? this.solvePort(k);
    this.ports.set(k, known);
    return known;
  }

  private solvePort(k: number): NodalPort {
    const cut = chainCircuit(this.context, { first: 0, last: k, withSource: true, withLoad: false });
    const solver = cut.circuit.solver();
    const out = cut.nodes[k + 1];
    const density = (generator: NoiseGenerator): number =>
      magnitudeSquared(solver.solve(generator.injection).voltage(out)) * generator.density;
    const noise = cut.circuit.noise.map((generator) => ({ ...generator, v2PerHz: density(generator) }));
    const { id } = this.context.input.stages[k];
    return {
      openCircuit: solver.solve(cut.sourceEmf!).voltage(out),
      impedance: solver.solve({ kind: 'current', from: GROUND, to: out }).voltage(out),
      noiseV2PerHz: noise.reduce((sum, { v2PerHz }) => sum + v2PerHz, 0),
      ownNoiseV2PerHz: noise.filter(({ owner }) => owner === id).map(({ v2PerHz }) => v2PerHz),
    };
  }

  /** Impedance seen from the left into stage k with all that follows connected. */
  inputImpedance(k: number): Complex {
    const cut = chainCircuit(this.context, { first: k, last: this.last, withSource: false, withLoad: true });
    const node = cut.nodes[k];
    try {
      return cut.circuit.solver().solve({ kind: 'current', from: GROUND, to: node }).voltage(node);
    } catch (error) {
      // An input without any path to ground: no current can flow into it.
      if (error instanceof SingularCircuit) return complex(Infinity);
      throw error;
    }
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

  /** Noise of all stages at the load, V²/Hz. */
  noiseAtLoad(): number {
    const power = ({ injection, density }: NoiseGenerator): number =>
      magnitudeSquared(this.solver.solve(injection).voltage(this.loadNode)) * density;
    return this.whole.circuit.noise.reduce((sum, generator) => sum + power(generator), 0);
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

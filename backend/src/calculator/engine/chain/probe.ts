import type { Complex } from '../complex';
import type { ChainInput, GbwCase } from '../types';

/** One noise source's own share at the Thevenin EMF behind its stage. */
export interface ProbedNoiseSource {
  readonly label: string;
  readonly v2PerHzAtOutput: number;
}

/** One stage at one frequency; complex values per unit source EMF (also with a current source: per unit I·Z). */
export interface StageProbe {
  readonly stageId: string;
  /** Open-circuit EMF behind the stage, everything after it removed. */
  readonly openCircuit: Complex;
  /** Thevenin impedance behind the stage, Ω. */
  readonly outputImpedance: Complex;
  /** Into the stage with what follows as its load, Ω; re is Infinity for an open input. */
  readonly inputImpedance: Complex;
  /** Voltage of the node behind the stage with everything connected. */
  readonly node: Complex;
  /** Loaded T; null without feedback. */
  readonly loopGain: Complex | null;
  /** m·NG + Zf·Yd; null without feedback. */
  readonly noiseGain: Complex | null;
  /** Accumulated added noise at the open-circuit EMF, V²/Hz. Sources whose data is missing are left out. */
  readonly addedNoiseV2PerHz: number;
  /** Each source of this stage at its open-circuit EMF. */
  readonly noiseSources: readonly ProbedNoiseSource[];
}

export interface ChainProbe {
  readonly frequencyHz: number;
  readonly sourceImpedance: Complex;
  /** Impedance of the load, Ω; re is Infinity when open. */
  readonly load: Complex;
  /** V_load/E. */
  readonly gain: Complex;
  readonly stages: readonly StageProbe[];
}

/** The chain at one frequency in one GBW case, for tests and for working. Throws EngineInputError like analyzeChain. */
export function probeChain(_input: ChainInput, _gbwCase: GbwCase, _frequencyHz: number): ChainProbe {
  throw new Error('not available yet');
}

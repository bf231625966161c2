import { Complex, MutableComplex, divide, complex, multiply, reciprocal } from '../complex';
import { TWO_PI } from '../constants';
import type { NoiseSource } from '../stages/network-stage';
import type { ChainInput, GbwCase } from '../types';
import { addedNoise } from './added-noise';
import { assertValid } from './analyze-chain';
import { ChainNetwork } from './chain-network';

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
  readonly noiseSources: readonly NoiseSource[];
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

/**
 * The chain at one frequency in one GBW case, for tests and for working.
 *
 * @throws EngineInputError like analyzeChain
 * @example probeChain(input, 'minimum', 5e6).stages[0].loopGain
 */
export function probeChain(input: ChainInput, gbwCase: GbwCase, frequencyHz: number): ChainProbe {
  assertValid(input);
  const network = new ChainNetwork(input, gbwCase);
  const omega = TWO_PI * frequencyHz;
  const noise = addedNoise(input, network, frequencyHz);
  network.solve(omega);
  const source: MutableComplex = { re: 0, im: 0 };
  network.sourceImpedance(omega, source);
  let added = 0;
  const stages = network.stages.map((stage, k): StageProbe => {
    const own = noise.stages[k];
    const emf = emfOf(network, k + 1);
    const transfer = divide(emf, emfOf(network, k));
    added = added * multiply(transfer, { re: transfer.re, im: -transfer.im }).re + own.ownV2PerHz;
    return {
      stageId: stage.stageId,
      openCircuit: emf,
      outputImpedance: complex(network.ports[k + 1].impedanceRe, network.ports[k + 1].impedanceIm),
      inputImpedance: loadOf(network, k),
      node: nodeOf(network, k + 1),
      loopGain: stage.loop ? read((out) => stage.loop?.loadedLoopGain(out)) : null,
      noiseGain: stage.loop ? read((out) => stage.loop?.noiseGain(out)) : null,
      addedNoiseV2PerHz: added,
      noiseSources: own.sources,
    };
  });
  return {
    frequencyHz,
    sourceImpedance: { re: source.re, im: source.im },
    load: loadOf(network, network.count),
    gain: nodeOf(network, network.count),
    stages,
  };
}

function read(write: (out: MutableComplex) => void): Complex {
  const out: MutableComplex = { re: 0, im: 0 };
  write(out);
  return out;
}

const emfOf = (network: ChainNetwork, k: number): Complex => complex(network.ports[k].emfRe, network.ports[k].emfIm);

const nodeOf = (network: ChainNetwork, k: number): Complex => complex(network.nodeRe[k], network.nodeIm[k]);

const loadOf = (network: ChainNetwork, k: number): Complex =>
  reciprocal(complex(network.loads[k].admittanceRe, network.loads[k].admittanceIm));

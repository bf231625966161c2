import type { PreparedStage } from '../stages/prepare-stage';
import type { ChainInput } from '../types';

/**
 * The chain with ideal amplifiers, coupling shorted and shunt capacitances removed, same resistive loading: real numbers,
 * the same at every frequency. All voltages are per unit source EMF.
 */
export interface IdealChain {
  /** Signed EMF behind stage k (index k; 0 = the source). */
  readonly emf: readonly number[];
  /** Resistance behind stage k, Ω. */
  readonly resistanceOhm: readonly number[];
  /**
   * Signed node voltage behind stage k; index 0 is the EMF, 1 (the load's own node when there are no stages).
   * At a virtual ground there is no node voltage to speak of: the EMF stands in for it.
   */
  readonly node: readonly number[];
  /** True where what follows is a virtual ground. */
  readonly virtualGround: readonly boolean[];
  /** Signed voltage at the amplifier's own output pin (in front of Riso); of a passive stage its node. */
  readonly pin: readonly number[];
  /** Conductance that stage k drives, S; Infinity at a virtual ground. */
  readonly loadS: readonly number[];
  /** Resistive noise gain of stage k with the resistance in front included; null without feedback. Index from 1. */
  readonly noiseGain: readonly (number | null)[];
}

interface RealPort {
  emf: number;
  ohm: number;
}

function shunt(port: RealPort, siemens: number): void {
  const divisor = 1 + port.ohm * siemens;
  port.emf /= divisor;
  port.ohm /= divisor;
}

const conductance = (ohm: number | null): number => (ohm ? 1 / ohm : 0);

function advanceFeedback(port: RealPort, stage: PreparedStage): number | null {
  const values = stage.feedback;
  if (!values) return null;
  shunt(port, conductance(values.terminationOhm));
  if (values.inverting) {
    const legOhm = port.ohm + values.seriesOhm;
    port.emf *= -values.feedbackOhm / legOhm;
    port.ohm = values.isolationOhm;
    return 1 + values.feedbackOhm / legOhm;
  }
  shunt(port, conductance(values.biasOhm) + values.inputS);
  const noiseGain = 1 + values.feedbackOhm * values.gainS;
  port.emf *= noiseGain;
  port.ohm = values.isolationOhm;
  return noiseGain;
}

/** The rightward fold with ideal amplifiers; gives the stage's noise gain. */
function advance(port: RealPort, stage: PreparedStage): number | null {
  const { section, block } = stage;
  if (section) {
    port.ohm += section.seriesOhm;
    shunt(port, section.shuntS);
    return null;
  }
  if (block) {
    port.emf *= (2 * block.gain * block.impedanceOhm) / (port.ohm + block.impedanceOhm);
    port.ohm = block.impedanceOhm;
    return null;
  }
  return advanceFeedback(port, stage);
}

/** The leftward fold with ideal amplifiers: conductance of the input. */
function inputConductance(stage: PreparedStage, loadS: number): number {
  const { section, block, feedback } = stage;
  if (section) return 1 / (section.seriesOhm + 1 / (section.shuntS + loadS));
  if (block) return 1 / block.impedanceOhm;
  if (!feedback) return 0;
  const front = conductance(feedback.terminationOhm);
  if (feedback.inverting) return front + 1 / feedback.seriesOhm;
  return front + conductance(feedback.biasOhm) + feedback.inputS;
}

/**
 * The ideal chain of prepared stages; see {@link IdealChain}.
 *
 * @example an inverting stage with Rf = 1 kΩ, Rg = 100 Ω behind 0 Ω: node −10, noise gain 11
 */
export function idealChain(input: ChainInput, stages: readonly PreparedStage[]): IdealChain {
  const { source, load } = input.specification;
  const loadS: number[] = new Array<number>(stages.length + 1);
  loadS[stages.length] = conductance(load.resistanceOhm);
  for (let k = stages.length; k > 0; k--) loadS[k - 1] = inputConductance(stages[k - 1], loadS[k]);
  const port: RealPort = { emf: 1, ohm: source.resistanceOhm };
  const emf = [port.emf];
  const resistanceOhm = [port.ohm];
  const noiseGain: (number | null)[] = [null];
  for (const stage of stages) {
    noiseGain.push(advance(port, stage));
    emf.push(port.emf);
    resistanceOhm.push(port.ohm);
  }
  const virtualGround = loadS.map((siemens) => siemens === Infinity);
  const node = emf.map((value, k) => (virtualGround[k] ? value : value / (1 + resistanceOhm[k] * loadS[k])));
  if (stages.length > 0) node[0] = 1;
  const pin = node.map((value, k) => (k > 0 && stages[k - 1].feedback ? emf[k] : value));
  return { emf, resistanceOhm, node, virtualGround, pin, loadS, noiseGain };
}

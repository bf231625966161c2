import type { MutableComplex } from '../complex';
import { TWO_PI } from '../constants';
import type { ChainInput } from '../types';
import { ChainNetwork } from './chain-network';
import { IdealChain, idealChain } from './ideal-chain';

/**
 * Gains of one corner against the ideal chain. Stage gain is node to node, the first from the EMF — with a current source
 * from the current, in Ω; where a virtual ground follows, the open-circuit EMF stands in for the node. The chain's gain is
 * V_load/E, with a current source in the transimpedance basis V_load/I.
 */
export class ChainResponse {
  readonly network: ChainNetwork;
  readonly ideal: IdealChain;
  /** Signed ideal gains: [0] the chain, [k] stage k node to node. */
  readonly idealGain: readonly number[];
  /** |H|² over the ideal gain's square, of the last `solve`: [0] the chain, [k] stage k. */
  readonly power: Float64Array;
  private readonly perCurrent: boolean;
  private readonly chainPerCurrent: boolean;
  private readonly gain: MutableComplex = { re: 0.5, im: 0.5 };
  private readonly source: MutableComplex = { re: 0.5, im: 0.5 };

  constructor(input: ChainInput, network: ChainNetwork) {
    const { source, gainBasis } = input.specification;
    this.network = network;
    this.ideal = idealChain(input, network.prepared);
    this.perCurrent = source.kind === 'current';
    this.chainPerCurrent = this.perCurrent && gainBasis === 'transimpedance';
    const { node } = this.ideal;
    const toCurrent = source.resistanceOhm;
    this.idealGain = node.map((voltage, k) => {
      if (k === 0) return node[network.count] * (this.chainPerCurrent ? toCurrent : 1);
      return (voltage / node[k - 1]) * (k === 1 && this.perCurrent ? toCurrent : 1);
    });
    this.power = new Float64Array(network.count + 1);
  }

  /** Solves both folds at a frequency and sets `power`. */
  solve(frequencyHz: number): void {
    const omega = TWO_PI * frequencyHz;
    this.network.solve(omega);
    this.network.sourceImpedance(omega, this.source);
    for (let k = 0; k <= this.network.count; k++) {
      if (k === 0) this.chainGain(this.gain);
      else this.stageGain(k, this.gain);
      this.power[k] = this.relative(k);
    }
  }

  private relative(k: number): number {
    const ideal = this.idealGain[k];
    return (this.gain.re * this.gain.re + this.gain.im * this.gain.im) / (ideal * ideal);
  }

  /** Chain power over ideal by the rightward fold alone. */
  chainPower(frequencyHz: number): number {
    const omega = TWO_PI * frequencyHz;
    this.network.loadVoltage(omega, this.gain);
    if (this.chainPerCurrent) {
      this.network.sourceImpedance(omega, this.source);
      this.timesSource(this.gain);
    }
    return this.relative(0);
  }

  private timesSource(out: MutableComplex): void {
    const { re, im } = out;
    out.re = re * this.source.re - im * this.source.im;
    out.im = re * this.source.im + im * this.source.re;
  }

  /** Voltage that stands for node k in the last `solve`, per unit EMF. */
  reference(k: number, out: MutableComplex): void {
    const { network } = this;
    const virtual = k > 0 && this.ideal.virtualGround[k];
    out.re = virtual ? network.ports[k].emfRe : network.nodeRe[k];
    out.im = virtual ? network.ports[k].emfIm : network.nodeIm[k];
  }

  /** V_k/E, with a current source V_k/I, of the last `solve`. */
  runningGain(k: number, out: MutableComplex): void {
    this.reference(k, out);
    if (this.perCurrent) this.timesSource(out);
  }

  /** V_k/V_{k−1} of the last `solve`. */
  stageGain(k: number, out: MutableComplex): void {
    const { network } = this;
    this.reference(k, out);
    if (k === 1) {
      if (this.perCurrent) this.timesSource(out);
      return;
    }
    const virtual = this.ideal.virtualGround[k - 1];
    const dRe = virtual ? network.ports[k - 1].emfRe : network.nodeRe[k - 1];
    const dIm = virtual ? network.ports[k - 1].emfIm : network.nodeIm[k - 1];
    const { re, im } = out;
    const squared = dRe * dRe + dIm * dIm;
    out.re = (re * dRe + im * dIm) / squared;
    out.im = (im * dRe - re * dIm) / squared;
  }

  /** V_load/E (or /I, by the basis) of the last `solve`. */
  chainGain(out: MutableComplex): void {
    out.re = this.network.nodeRe[this.network.count];
    out.im = this.network.nodeIm[this.network.count];
    if (this.chainPerCurrent) this.timesSource(out);
  }

  /** |noise gain| of stage k at a frequency; NaN for a stage without feedback. */
  noiseGain(k: number, frequencyHz: number): number {
    const { loop } = this.network.stages[k - 1];
    if (!loop) return NaN;
    this.network.advance(TWO_PI * frequencyHz, k);
    loop.noiseGain(this.gain);
    return Math.hypot(this.gain.re, this.gain.im);
  }
}

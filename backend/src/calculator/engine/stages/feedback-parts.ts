import type { MutableComplex } from '../complex';
import { InputNetwork } from './input-network';
import { LoadPort, Port, seriesLoad } from './port';

/** The parts around a feedback amplifier, as numbers; 0 S and 0 F stand for parts that are not there. */
export interface FeedbackPartValues {
  readonly inverting: boolean;
  readonly feedbackOhm: number;
  readonly feedbackF: number;
  /** Inverting: in series with the node in front (0 for transimpedance). Non-inverting: see `gainS`. */
  readonly seriesOhm: number;
  /** Non-inverting: conductance of Rg to ground, 0 for a follower. */
  readonly gainS: number;
  /** Capacitance of the inverting node to ground: input plus stray. */
  readonly nodeF: number;
  readonly inputS: number;
  readonly inputF: number;
  readonly outputOhm: number;
  readonly isolationOhm: number;
  readonly terminationOhm: number | null;
  readonly couplingF: number | null;
  readonly biasOhm: number | null;
}

/**
 * What voltage- and current-feedback stages share: the network in front, V₊, Zp, J, Yg and NG of the two topologies,
 * the output loaded through Riso. Fields are scratch of the last call; a stage object serves one sweep at a time.
 * Source: node equations at the two inputs and the output; textbook network theory.
 */
export class FeedbackParts {
  readonly input: InputNetwork;
  /** The tuned frequency. */
  omega = 0.5;
  /** Zf at the tuned frequency. */
  zfRe = 0.5;
  zfIm = 0.5;
  /** V₊ per unit EMF, its impedance Zp, and J. */
  vPlusRe = 0.5;
  vPlusIm = 0.5;
  zpRe = 0.5;
  zpIm = 0.5;
  jRe = 0.5;
  jIm = 0.5;
  yLegRe = 0.5;
  yLegIm = 0.5;
  ygRe = 0.5;
  ygIm = 0.5;
  ngRe = 0.5;
  ngIm = 0.5;
  /** 1/(1 + Ro·YL) of the last load, and Ro times it. */
  dividerRe = 0.5;
  dividerIm = 0.5;
  loadedRoRe = 0.5;
  loadedRoIm = 0.5;

  constructor(readonly values: FeedbackPartValues) {
    this.input = new InputNetwork(values.terminationOhm, values.couplingF, values.biasOhm);
  }

  tune(omega: number): void {
    const { feedbackOhm, feedbackF } = this.values;
    this.omega = omega;
    this.input.omega = omega;
    const x = omega * feedbackOhm * feedbackF;
    this.zfRe = feedbackOhm / (1 + x * x);
    this.zfIm = -x * this.zfRe;
    if (this.values.inverting) return;
    this.yLegRe = this.values.gainS;
    this.yLegIm = 0;
    this.setLeg();
  }

  /** Yleg → Yg = Yleg + s·Cn and NG = 1 + Zf·Yg. */
  private setLeg(): void {
    this.ygRe = this.yLegRe;
    this.ygIm = this.yLegIm + this.omega * this.values.nodeF;
    this.ngRe = 1 + this.zfRe * this.ygRe - this.zfIm * this.ygIm;
    this.ngIm = this.zfRe * this.ygIm + this.zfIm * this.ygRe;
  }

  /** Leads the port through the parts in front and sets V₊, Zp, J, Yleg, Yg and NG from it. */
  drive(port: Port): void {
    this.input.advance(port);
    const { emfRe, emfIm, impedanceRe, impedanceIm } = port;
    if (this.values.inverting) {
      const zRe = impedanceRe + this.values.seriesOhm;
      const squared = zRe * zRe + impedanceIm * impedanceIm;
      const yRe = (this.yLegRe = zRe / squared);
      const yIm = (this.yLegIm = -impedanceIm / squared);
      this.setLeg();
      this.vPlusRe = this.vPlusIm = this.zpRe = this.zpIm = 0;
      this.jRe = emfRe * yRe - emfIm * yIm;
      this.jIm = emfRe * yIm + emfIm * yRe;
      return;
    }
    const yRe = this.values.inputS;
    const yIm = this.omega * this.values.inputF;
    const dRe = 1 + impedanceRe * yRe - impedanceIm * yIm;
    const dIm = impedanceRe * yIm + impedanceIm * yRe;
    const squared = dRe * dRe + dIm * dIm;
    this.vPlusRe = (emfRe * dRe + emfIm * dIm) / squared;
    this.vPlusIm = (emfIm * dRe - emfRe * dIm) / squared;
    this.zpRe = (impedanceRe * dRe + impedanceIm * dIm) / squared;
    this.zpIm = (impedanceIm * dRe - impedanceRe * dIm) / squared;
    this.jRe = this.jIm = 0;
  }

  /** Sets what a load behind Riso makes of A (or Z) and Ro: everywhere A → A/(1 + Ro·YL), Ro → Ro/(1 + Ro·YL). */
  loadOutput(load: LoadPort): void {
    const { isolationOhm, outputOhm } = this.values;
    if (isolationOhm > 0) seriesLoad(load, isolationOhm, 0);
    const qRe = 1 + outputOhm * load.admittanceRe;
    const qIm = outputOhm * load.admittanceIm;
    const squared = qRe * qRe + qIm * qIm;
    this.dividerRe = qRe / squared;
    this.dividerIm = -qIm / squared;
    this.loadedRoRe = outputOhm * this.dividerRe;
    this.loadedRoIm = outputOhm * this.dividerIm;
  }

  /** The parts in front of the amplifier's own input impedance, right to left. */
  leaveInput(load: LoadPort): void {
    this.input.inputImpedance(load);
  }

  /** Ideal amplifier: Yg/NG (non-inverting), 1/Zf (inverting: virtual ground). Of the last `tune` and `drive`. */
  feedbackAdmittance(out: MutableComplex): void {
    const nRe = this.values.inverting ? 1 : this.ygRe;
    const nIm = this.values.inverting ? 0 : this.ygIm;
    const dRe = this.values.inverting ? this.zfRe : this.ngRe;
    const dIm = this.values.inverting ? this.zfIm : this.ngIm;
    const squared = dRe * dRe + dIm * dIm;
    out.re = (nRe * dRe + nIm * dIm) / squared;
    out.im = (nIm * dRe - nRe * dIm) / squared;
  }
}

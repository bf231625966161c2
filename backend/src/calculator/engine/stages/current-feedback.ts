import type { MutableComplex } from '../complex';
import { AmplifierNoise, NoiseTransfers, currentFeedbackTransfers, feedbackNoise } from './feedback-noise';
import { FeedbackPartValues, FeedbackParts } from './feedback-parts';
import type { FeedbackLoop, NetworkStage, StageNoise } from './network-stage';
import { LoadPort, Port, clonePort } from './port';

/** The amplifier itself: Z(s) = Z0/((1 + s·Z0/K)(1 + s/ω2)), seen through Rb from the inverting node. */
export interface CurrentFeedbackValues {
  readonly openLoopOhm: number;
  /** K = Z0·ωz, Ω·rad/s. */
  readonly transimpedanceBandwidth: number;
  /** Infinity: no second pole. */
  readonly secondPoleHz: number;
  readonly invertingInputOhm: number;
  readonly noise: AmplifierNoise;
}

/**
 * Current-feedback stage, non-inverting and inverting.
 *
 *     D = Z + Rb + (Zf + Ro)·(1 + Rb·Yg)
 *     E_out = [V₊·(Z·NG + Ro) − J·(Z·Zf − Rb·Ro)]/D   Z_out = Ro·(Rb·NG + Zf)/D + Riso      T = Z/(D − Z)
 *
 * Source: node equations of a buffer through Rb into the inverting node; textbook network theory.
 */
export class CurrentFeedbackNetwork implements NetworkStage, FeedbackLoop {
  readonly loop = this;
  readonly isolationOhm: number;
  private readonly parts: FeedbackParts;
  private readonly tau1Tau2: number;
  private readonly tauSum: number;
  private tunedOmega = -0.5;
  private zRe = 0.5;
  private zIm = 0.5;

  constructor(
    readonly stageId: string,
    partValues: FeedbackPartValues,
    private readonly values: CurrentFeedbackValues,
  ) {
    this.parts = new FeedbackParts(partValues);
    this.isolationOhm = partValues.isolationOhm;
    const tau1 = values.openLoopOhm / values.transimpedanceBandwidth;
    const tau2 = 1 / (2 * Math.PI * values.secondPoleHz);
    this.tau1Tau2 = tau1 * tau2;
    this.tauSum = tau1 + tau2;
  }

  private tune(omega: number): void {
    if (omega === this.tunedOmega) return;
    this.tunedOmega = omega;
    const dRe = 1 - omega * omega * this.tau1Tau2;
    const dIm = omega * this.tauSum;
    const scale = this.values.openLoopOhm / (dRe * dRe + dIm * dIm);
    this.zRe = dRe * scale;
    this.zIm = -dIm * scale;
    this.parts.tune(omega);
  }

  advance(port: Port, omega: number): void {
    this.tune(omega);
    const { parts, zRe, zIm } = this;
    parts.drive(port);
    const { zfRe, zfIm, ygRe, ygIm, ngRe, ngIm, vPlusRe, vPlusIm, jRe, jIm } = parts;
    const ro = parts.values.outputOhm;
    const rb = this.values.invertingInputOhm;
    // (Zf + Ro)·(1 + Rb·Yg)
    const sRe = zfRe + ro;
    const bRe = 1 + rb * ygRe;
    const bIm = rb * ygIm;
    const dRe = zRe + rb + sRe * bRe - zfIm * bIm;
    const dIm = zIm + sRe * bIm + zfIm * bRe;
    const squared = dRe * dRe + dIm * dIm;
    // V₊·(Z·NG + Ro) − J·(Z·Zf − Rb·Ro)
    const plusRe = zRe * ngRe - zIm * ngIm + ro;
    const plusIm = zRe * ngIm + zIm * ngRe;
    const minusRe = zRe * zfRe - zIm * zfIm - rb * ro;
    const minusIm = zRe * zfIm + zIm * zfRe;
    const nRe = vPlusRe * plusRe - vPlusIm * plusIm - jRe * minusRe + jIm * minusIm;
    const nIm = vPlusRe * plusIm + vPlusIm * plusRe - jRe * minusIm - jIm * minusRe;
    port.emfRe = (nRe * dRe + nIm * dIm) / squared;
    port.emfIm = (nIm * dRe - nRe * dIm) / squared;
    const gRe = rb * ngRe + zfRe;
    const gIm = rb * ngIm + zfIm;
    port.impedanceRe = (ro * (gRe * dRe + gIm * dIm)) / squared + this.isolationOhm;
    port.impedanceIm = (ro * (gIm * dRe - gRe * dIm)) / squared;
  }

  inputImpedance(load: LoadPort, omega: number): void {
    this.tune(omega);
    this.parts.loadOutput(load);
    const { values } = this.parts;
    if (values.inverting) {
      this.intoInvertingNode(load);
    } else {
      load.admittanceRe = values.inputS;
      load.admittanceIm = omega * values.inputF;
    }
    this.parts.leaveInput(load);
  }

  /**
   * Node: 1/Rb + s·Cn + (1 + Z/Rb)/(Zf + Ro), written without a division by Rb:
   * z = Rb·(Zf + Ro)/[(Zf + Ro)·(1 + s·Cn·Rb) + Rb + Z]. Z and Ro loaded; Rg in front of it.
   */
  private intoInvertingNode(load: LoadPort): void {
    const { parts } = this;
    const rb = this.values.invertingInputOhm;
    const sRe = parts.zfRe + parts.loadedRoRe;
    const sIm = parts.zfIm + parts.loadedRoIm;
    const b = this.tunedOmega * parts.values.nodeF * rb;
    const nRe = sRe - sIm * b + rb + this.loadedRe();
    const nIm = sIm + sRe * b + this.loadedIm();
    // Zin = Rg + Rb·s/n  →  Yin = n/(Rg·n + Rb·s)
    const rg = parts.values.seriesOhm;
    const dRe = rg * nRe + rb * sRe;
    const dIm = rg * nIm + rb * sIm;
    const squared = dRe * dRe + dIm * dIm;
    load.admittanceRe = (nRe * dRe + nIm * dIm) / squared;
    load.admittanceIm = (nIm * dRe - nRe * dIm) / squared;
  }

  private loadedRe(): number {
    return this.zRe * this.parts.dividerRe - this.zIm * this.parts.dividerIm;
  }

  private loadedIm(): number {
    return this.zRe * this.parts.dividerIm + this.zIm * this.parts.dividerRe;
  }

  loadedLoopGain(out: MutableComplex): void {
    const { parts } = this;
    const rb = this.values.invertingInputOhm;
    const sRe = parts.zfRe + parts.loadedRoRe;
    const sIm = parts.zfIm + parts.loadedRoIm;
    const bRe = 1 + rb * parts.ygRe;
    const bIm = rb * parts.ygIm;
    const dRe = rb + sRe * bRe - sIm * bIm;
    const dIm = sRe * bIm + sIm * bRe;
    const squared = dRe * dRe + dIm * dIm;
    const zRe = this.loadedRe();
    const zIm = this.loadedIm();
    out.re = (zRe * dRe + zIm * dIm) / squared;
    out.im = (zIm * dRe - zRe * dIm) / squared;
  }

  noiseGain(out: MutableComplex): void {
    out.re = this.parts.ngRe;
    out.im = this.parts.ngIm;
  }

  feedbackAdmittance(omega: number, out: MutableComplex): void {
    this.tune(omega);
    this.parts.feedbackAdmittance(out);
  }

  ownNoise(front: Readonly<Port>, omega: number): StageNoise {
    const networkPort = clonePort(front);
    this.advance(clonePort(front), omega);
    this.parts.input.advance(networkPort);
    return feedbackNoise(this.parts, networkPort, front, omega, this.values.noise, this.transfers());
  }

  /** tN, tP, tJ and tX of the last `advance`. */
  private transfers(): NoiseTransfers {
    const { parts } = this;
    return currentFeedbackTransfers({
      z: { re: this.zRe, im: this.zIm },
      rb: this.values.invertingInputOhm,
      zf: { re: parts.zfRe, im: parts.zfIm },
      yg: { re: parts.ygRe, im: parts.ygIm },
      ng: { re: parts.ngRe, im: parts.ngIm },
      ro: parts.values.outputOhm,
    });
  }
}

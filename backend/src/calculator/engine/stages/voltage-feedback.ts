import type { MutableComplex } from '../complex';
import { AmplifierNoise, feedbackNoise, voltageFeedbackTransfers } from './feedback-noise';
import { FeedbackParts, FeedbackPartValues } from './feedback-parts';
import type { FeedbackLoop, NetworkStage, StageNoise } from './network-stage';
import { LoadPort, Port, clonePort } from './port';

/** The amplifier itself: A(s) = A0/((1 + s/ω1)(1 + s/ω2)). */
export interface VoltageFeedbackValues {
  readonly openLoopGain: number;
  readonly gainBandwidthHz: number;
  /** Infinity: no second pole. */
  readonly secondPoleHz: number;
  readonly differentialF: number;
  readonly noise: AmplifierNoise;
}

/**
 * Voltage-feedback stage: non-inverting, follower, inverting and transimpedance (inverting with Rg = 0).
 *
 *     D = A + m·(NG + Ro·Yg) + (Zf + Ro)·Yd            m = 1 + Zp·Yd
 *     E_out = [V₊·(A·NG + Ro·Yd) − J·(A·Zf − m·Ro)]/D  Z_out = Ro·(m·NG + Zf·Yd)/D + Riso     T = A/(D − A)
 *
 * Source: node equations of the amplifier with bridging input capacitance; textbook network theory.
 */
export class VoltageFeedbackNetwork implements NetworkStage, FeedbackLoop {
  readonly loop = this;
  readonly isolationOhm: number;
  private readonly parts: FeedbackParts;
  private readonly tau1Tau2: number;
  private readonly tauSum: number;
  private tunedOmega = -0.5;
  private aRe = 0.5;
  private aIm = 0.5;
  private yd = 0.5;
  private mRe = 0.5;
  private mIm = 0.5;

  constructor(
    readonly stageId: string,
    partValues: FeedbackPartValues,
    private readonly values: VoltageFeedbackValues,
  ) {
    this.parts = new FeedbackParts(partValues);
    this.isolationOhm = partValues.isolationOhm;
    const tau1 = values.openLoopGain / (2 * Math.PI * values.gainBandwidthHz);
    const tau2 = 1 / (2 * Math.PI * values.secondPoleHz);
    this.tau1Tau2 = tau1 * tau2;
    this.tauSum = tau1 + tau2;
  }

  private tune(omega: number): void {
    if (omega === this.tunedOmega) return;
    this.tunedOmega = omega;
    const dRe = 1 - omega * omega * this.tau1Tau2;
    const dIm = omega * this.tauSum;
    const scale = this.values.openLoopGain / (dRe * dRe + dIm * dIm);
    this.aRe = dRe * scale;
    this.aIm = -dIm * scale;
    this.yd = omega * this.values.differentialF;
    this.parts.tune(omega);
  }

  advance(port: Port, omega: number): void {
    this.tune(omega);
    const { parts, aRe, aIm, yd } = this;
    parts.drive(port);
    const { zfRe, zfIm, ygRe, ygIm, ngRe, ngIm, vPlusRe, vPlusIm, jRe, jIm } = parts;
    const ro = parts.values.outputOhm;
    const mRe = (this.mRe = 1 - parts.zpIm * yd);
    const mIm = (this.mIm = parts.zpRe * yd);
    const bracketRe = ngRe + ro * ygRe;
    const bracketIm = ngIm + ro * ygIm;
    const dRe = aRe + mRe * bracketRe - mIm * bracketIm - zfIm * yd;
    const dIm = aIm + mRe * bracketIm + mIm * bracketRe + (zfRe + ro) * yd;
    const squared = dRe * dRe + dIm * dIm;
    // V₊·(A·NG + Ro·Yd) − J·(A·Zf − m·Ro)
    const plusRe = aRe * ngRe - aIm * ngIm;
    const plusIm = aRe * ngIm + aIm * ngRe + ro * yd;
    const minusRe = aRe * zfRe - aIm * zfIm - mRe * ro;
    const minusIm = aRe * zfIm + aIm * zfRe - mIm * ro;
    const nRe = vPlusRe * plusRe - vPlusIm * plusIm - jRe * minusRe + jIm * minusIm;
    const nIm = vPlusRe * plusIm + vPlusIm * plusRe - jRe * minusIm - jIm * minusRe;
    port.emfRe = (nRe * dRe + nIm * dIm) / squared;
    port.emfIm = (nIm * dRe - nRe * dIm) / squared;
    // Ro·(m·NG + Zf·Yd)/D + Riso
    const gRe = mRe * ngRe - mIm * ngIm - zfIm * yd;
    const gIm = mRe * ngIm + mIm * ngRe + zfRe * yd;
    port.impedanceRe = (ro * (gRe * dRe + gIm * dIm)) / squared + this.isolationOhm;
    port.impedanceIm = (ro * (gIm * dRe - gRe * dIm)) / squared;
  }

  /** D − A with the loaded Ro: m·(NG + Ro·Yg) + (Zf + Ro)·Yd; m as given (1 when the + pin is held). */
  private remainder(mRe: number, mIm: number, out: MutableComplex): void {
    const { parts, yd } = this;
    const { ygRe, ygIm, ngRe, ngIm, loadedRoRe: roRe, loadedRoIm: roIm } = parts;
    const bracketRe = ngRe + roRe * ygRe - roIm * ygIm;
    const bracketIm = ngIm + roRe * ygIm + roIm * ygRe;
    out.re = mRe * bracketRe - mIm * bracketIm - (parts.zfIm + roIm) * yd;
    out.im = mRe * bracketIm + mIm * bracketRe + (parts.zfRe + roRe) * yd;
  }

  inputImpedance(load: LoadPort, omega: number): void {
    this.tune(omega);
    this.parts.loadOutput(load);
    if (this.parts.values.inverting) this.intoInvertingNode(load);
    else this.intoPlusPin(load);
    this.parts.leaveInput(load);
  }

  /** 1/(Rg + 1/(s·(Cn + Cdiff) + (1 + A)/(Zf + Ro))), A and Ro loaded. */
  private intoInvertingNode(load: LoadPort): void {
    const { parts } = this;
    const zRe = parts.zfRe + parts.loadedRoRe;
    const zIm = parts.zfIm + parts.loadedRoIm;
    const b = this.tunedOmega * parts.values.nodeF + this.yd;
    const nRe = 1 + this.loadedGainRe() - zIm * b;
    const nIm = this.loadedGainIm() + zRe * b;
    // Zin = Rg + z/n  →  Yin = n/(Rg·n + z)
    const rg = parts.values.seriesOhm;
    const dRe = rg * nRe + zRe;
    const dIm = rg * nIm + zIm;
    const squared = dRe * dRe + dIm * dIm;
    load.admittanceRe = (nRe * dRe + nIm * dIm) / squared;
    load.admittanceIm = (nIm * dRe - nRe * dIm) / squared;
  }

  /** Yi + Yd·(NG + Ro·Yg)/(A + NG + Ro·Yg + (Zf + Ro)·Yd), A and Ro loaded. */
  private intoPlusPin(load: LoadPort): void {
    const { values } = this.parts;
    load.admittanceRe = values.inputS;
    load.admittanceIm = this.tunedOmega * values.inputF;
    const { yd, parts } = this;
    if (yd === 0) return;
    const bracketRe = parts.ngRe + parts.loadedRoRe * parts.ygRe - parts.loadedRoIm * parts.ygIm;
    const bracketIm = parts.ngIm + parts.loadedRoRe * parts.ygIm + parts.loadedRoIm * parts.ygRe;
    const dRe = this.loadedGainRe() + bracketRe - (parts.zfIm + parts.loadedRoIm) * yd;
    const dIm = this.loadedGainIm() + bracketIm + (parts.zfRe + parts.loadedRoRe) * yd;
    const squared = dRe * dRe + dIm * dIm;
    load.admittanceRe -= (yd * (bracketIm * dRe - bracketRe * dIm)) / squared;
    load.admittanceIm += (yd * (bracketRe * dRe + bracketIm * dIm)) / squared;
  }

  private loadedGainRe(): number {
    return this.aRe * this.parts.dividerRe - this.aIm * this.parts.dividerIm;
  }

  private loadedGainIm(): number {
    return this.aRe * this.parts.dividerIm + this.aIm * this.parts.dividerRe;
  }

  loadedLoopGain(out: MutableComplex): void {
    this.remainder(this.mRe, this.mIm, out);
    const { re, im } = out;
    const squared = re * re + im * im;
    const aRe = this.loadedGainRe();
    const aIm = this.loadedGainIm();
    out.re = (aRe * re + aIm * im) / squared;
    out.im = (aIm * re - aRe * im) / squared;
  }

  noiseGain(out: MutableComplex): void {
    const { ngRe, ngIm, zfRe, zfIm } = this.parts;
    out.re = this.mRe * ngRe - this.mIm * ngIm - zfIm * this.yd;
    out.im = this.mRe * ngIm + this.mIm * ngRe + zfRe * this.yd;
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
  private transfers() {
    const { parts, yd } = this;
    const ro = parts.values.outputOhm;
    const a = { re: this.aRe, im: this.aIm };
    const m = { re: this.mRe, im: this.mIm };
    const zf = { re: parts.zfRe, im: parts.zfIm };
    const yg = { re: parts.ygRe, im: parts.ygIm };
    const ng = { re: parts.ngRe, im: parts.ngIm };
    return voltageFeedbackTransfers({ a, m, zf, yg, ng, yd: { re: 0, im: yd }, ro });
  }
}

import { findRoot } from '../root';

/** The maker's reference circuit of a current-feedback amplifier: non-inverting, driven from 0 Ω, unloaded. */
export interface ReferenceCircuit {
  readonly bandwidthHz: number;
  readonly noiseGain: number;
  readonly feedbackOhm: number;
  readonly invertingInputOhm: number;
  readonly outputOhm: number;
  readonly openLoopOhm: number;
  /** Infinity: none. */
  readonly secondPoleHz: number;
}

/**
 * K = Z0·ωz (Ω·rad/s) of a current-feedback amplifier, solved so that the complete model — second pole and output
 * resistance included — is at half power of its ideal gain at the reference bandwidth in the reference circuit.
 * First order, and the answer where the circuit never comes to half power: K = 2π·BW·(Rf + G·Rb).
 * Source: loop gain Z(s)/(Rf + NG·Rb) of a current-feedback amplifier; textbook network theory.
 *
 * @example 150 MHz at G = 2 with Rf = 1 kΩ, Rb = 0, Ro = 0, Z0 → ∞, no second pole: 2π·150e6·1000
 */
export function transimpedanceBandwidthOf(circuit: ReferenceCircuit): number {
  const { bandwidthHz, noiseGain, feedbackOhm, invertingInputOhm } = circuit;
  const firstOrder = 2 * Math.PI * bandwidthHz * (feedbackOhm + noiseGain * invertingInputOhm);
  const excess = (logK: number): number => Math.log(2 * referencePower(circuit, Math.exp(logK)));
  let high = Math.log(firstOrder);
  let atHigh = excess(high);
  // Upwards until it is over half power, then down to the lowest K that still is: the rising side, not past a peak.
  for (let count = 0; atHigh < 0 && count < 40; count++) {
    high += 0.5;
    atHigh = excess(high);
  }
  let low = high;
  let atLow = atHigh;
  for (let count = 0; atLow >= 0 && count < 80; count++) {
    high = low;
    atHigh = atLow;
    low -= 0.5;
    atLow = excess(low);
  }
  if (!(atHigh >= 0) || !(atLow < 0)) return firstOrder;
  return Math.exp(findRoot(excess, low, atLow, high, atHigh));
}

/** |E_out/V₊|² over NG² in the reference circuit at its bandwidth, for a given K. */
function referencePower(circuit: ReferenceCircuit, k: number): number {
  const { noiseGain, feedbackOhm, invertingInputOhm: rb, outputOhm: ro, openLoopOhm, secondPoleHz } = circuit;
  const omega = 2 * Math.PI * circuit.bandwidthHz;
  const first = (omega * openLoopOhm) / k;
  const second = circuit.bandwidthHz / secondPoleHz;
  const poleRe = 1 - first * second;
  const poleIm = first + second;
  const scale = openLoopOhm / (poleRe * poleRe + poleIm * poleIm);
  const zRe = poleRe * scale;
  const zIm = -poleIm * scale;
  const legS = (noiseGain - 1) / feedbackOhm;
  const dRe = zRe + rb + (feedbackOhm + ro) * (1 + rb * legS);
  const nRe = zRe * noiseGain + ro;
  const nIm = zIm * noiseGain;
  return (nRe * nRe + nIm * nIm) / (dRe * dRe + zIm * zIm) / (noiseGain * noiseGain);
}

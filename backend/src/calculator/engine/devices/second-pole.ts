import type { CurrentFeedbackDevice, VoltageFeedbackDevice } from '../types';

/** The second pole of an amplifier, the same in every GBW case. */
export interface SecondPole {
  /** Infinity: none, or not known. */
  readonly frequencyHz: number;
  /** False: the datasheet gives neither a second pole nor a phase margin. */
  readonly known: boolean;
  readonly assumed: boolean;
  /** How it is known; null when it is not. */
  readonly text: string | null;
}

const NOT_KNOWN: SecondPole = { frequencyHz: Infinity, known: false, assumed: true, text: null };

/**
 * Second pole of a voltage-feedback amplifier, Hz, from `secondPoleHz` or from the phase margin φ at noise gain G:
 * f2 = (GBW/G)·sin φ·tan φ with the typical GBW (quoted margins are typical). From 90° on: none, assumed.
 * Source: crossover of the two-pole gain, exact for A0 → ∞; two-pole loop algebra.
 *
 * @example GBW 100 MHz, φ = 60° at G = 1: 100e6 · 0.8660 · 1.7321 = 150e6
 */
export function secondPoleFor(device: VoltageFeedbackDevice): SecondPole {
  if (device.secondPoleHz !== undefined) return entered(device.secondPoleHz);
  const marginDeg = device.phaseMarginDeg;
  if (marginDeg === undefined) return NOT_KNOWN;
  const gain = phaseMarginGainOf(device);
  const quoted = `phase margin ${marginDeg}° at noise gain ${Number(gain.toPrecision(4))}`;
  if (marginDeg >= 90) return { frequencyHz: Infinity, known: true, assumed: true, text: `none (${quoted})` };
  const { typ, min } = device.gainBandwidthHz;
  const typicalHz = typ ?? min ?? NaN;
  const basis = typ === undefined ? 'minimum GBW, typical not given' : 'typical GBW';
  const phi = (marginDeg * Math.PI) / 180;
  const frequencyHz = (typicalHz / gain) * Math.sin(phi) * Math.tan(phi);
  return { frequencyHz, known: true, assumed: false, text: `from ${quoted} with the ${basis}` };
}

/** Noise gain at which the phase margin is quoted: as entered, else the minimum stable gain, else 1. */
export function phaseMarginGainOf(device: VoltageFeedbackDevice): number {
  return device.phaseMarginGain ?? device.minimumStableGain ?? 1;
}

/** Second pole of a current-feedback amplifier: as entered, else not known. */
export function currentFeedbackSecondPole(device: CurrentFeedbackDevice): SecondPole {
  return device.secondPoleHz === undefined ? NOT_KNOWN : entered(device.secondPoleHz);
}

function entered(frequencyHz: number): SecondPole {
  return { frequencyHz, known: true, assumed: false, text: 'as entered' };
}

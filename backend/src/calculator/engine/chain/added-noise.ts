import type { Maybe } from '../analysis';
import { BOLTZMANN_J_PER_K, REFERENCE_TEMPERATURE_K, TWO_PI } from '../constants';
import type { MutableComplex } from '../complex';
import type { NoiseSource } from '../stages/network-stage';
import type { ChainInput } from '../types';
import { powerToDb } from '../units';
import type { ChainNetwork } from './chain-network';
import { known, notEntered, unknown } from '../maybe';

/** Noise that one stage adds at one frequency. */
export interface StageAddedNoise {
  /** At the open-circuit EMF behind the stage, this stage's own, V²/Hz; sources without data left out. */
  readonly ownV2PerHz: number;
  readonly sources: readonly NoiseSource[];
  /** Added by this stage, referred to the EMF (to I with a current source), V²/Hz (A²/Hz). */
  readonly referred: Maybe;
}

export interface ChainAddedNoise {
  readonly stages: readonly StageAddedNoise[];
  /** V/√Hz referred to the EMF, with a current source A/√Hz referred to I. */
  readonly inputNoise: Maybe;
  readonly noiseFigureDb: Maybe;
}

/**
 * Added noise of every stage and of the chain at one frequency, and the noise figure 1 + added/(4·k·T0·Re Zs).
 * Leaves the network solved at that frequency.
 * Source: superposition of uncorrelated sources; noise figure after the IRE Standards on Methods of Measuring Noise in
 * Linear Twoports (1960), T0 = 290 K (from memory).
 *
 * @example a single follower with 2 nV/√Hz and nothing else that makes noise: inputNoise 2e-9
 */
export function addedNoise(input: ChainInput, network: ChainNetwork, frequencyHz: number): ChainAddedNoise {
  const omega = TWO_PI * frequencyHz;
  const source: MutableComplex = { re: 0, im: 0 };
  network.advance(omega);
  network.sourceImpedance(omega, source);
  const perCurrent = input.specification.source.kind === 'current';
  const sourceSquared = source.re * source.re + source.im * source.im;
  const stages = network.stages.map((stage, k): StageAddedNoise => {
    const { sources, missing } = stage.ownNoise(network.ports[k], omega);
    const ownV2PerHz = sources.reduce((total, next) => total + next.v2PerHzAtOutput, 0);
    const { device } = network.prepared[k];
    if (missing.length > 0 && device) return { ownV2PerHz, sources, referred: notEntered(missing, device) };
    const { emfRe, emfIm } = network.ports[k + 1];
    const gainSquared = (emfRe * emfRe + emfIm * emfIm) * (perCurrent ? sourceSquared : 1);
    return { ownV2PerHz, sources, referred: known(ownV2PerHz / gainSquared) };
  });
  const total = sumOf(stages.map((stage) => stage.referred));
  if (total.value === null) return { stages, inputNoise: total, noiseFigureDb: total };
  const perEmf = total.value * (perCurrent ? sourceSquared : 1);
  const reference = 4 * BOLTZMANN_J_PER_K * REFERENCE_TEMPERATURE_K * source.re;
  return {
    stages,
    inputNoise: known(Math.sqrt(total.value)),
    noiseFigureDb:
      reference > 0 ? known(powerToDb(1 + perEmf / reference)) : unknown('The source has no resistance of its own.'),
  };
}

/** Sum, or all the reasons. */
export function sumOf(parts: readonly Maybe[]): Maybe {
  const reasons = new Set<string>();
  let total = 0;
  for (const part of parts) {
    if (part.value === null) reasons.add(part.reason);
    else total += part.value;
  }
  return reasons.size > 0 ? unknown([...reasons].join(' ')) : known(total);
}

import type { Maybe, UsedValue } from '../analysis';
import { invertingInputResistanceFor } from '../devices/amplifier-values';
import { DeviceCorner, gbwFor } from '../devices/used-values';
import { findRoot } from '../root';
import type { PreparedStage } from '../stages/prepare-stage';
import type { ChainInput } from '../types';
import { known, unknown } from '../maybe';
import type { ChainResponse } from './response';

/** What a stage has and spends of its gain-bandwidth product. */
export interface GbwBudget {
  readonly gbw: UsedValue | null;
  readonly signalGain: number;
  readonly noiseGain: number | null;
  readonly noiseGainOperating: number | null;
  readonly noiseGainTop: number | null;
  readonly headroomOperating: Maybe;
  readonly headroomTop: Maybe;
  readonly targetMetHz: number | null;
  readonly runsOutHz: number | null;
  readonly cornerFirstOrderHz: Maybe;
}

const NO_GBW_PASSIVE = unknown('Has no GBW (passive section or matched block).');
const NO_GBW_CURRENT_FEEDBACK = unknown('Has no GBW (current feedback).');

/**
 * Ideal gain of the topology from its resistors: 1 + Rf/Rg, −Rf/Rg, 1, −Rf (Ω); of a section its divider between open
 * ends, of a block its gain between matched ends.
 *
 * @example inverting, Rf = 1 kΩ, Rg = 100 Ω: −10
 */
export function signalGainOf({ feedback, section, block }: PreparedStage): number {
  if (block) return block.gain;
  if (section) return 1 / (1 + section.seriesOhm * section.shuntS);
  if (!feedback) return 1;
  if (!feedback.inverting) return 1 + feedback.feedbackOhm * feedback.gainS;
  return -feedback.feedbackOhm / (feedback.seriesOhm || 1);
}

/** GBW/NG (not for transimpedance); current feedback K/(2π·(Rf + NG·Rb)). */
function firstOrderCorner(stage: PreparedStage, gbw: UsedValue | null, noiseGain: number | null): Maybe {
  const { feedback, device, transimpedanceBandwidth } = stage;
  if (!feedback || noiseGain === null) return unknown('The first-order figure is for feedback amplifiers.');
  if (device?.kind === 'current-feedback' && transimpedanceBandwidth !== null) {
    const rb = invertingInputResistanceFor(device).value;
    return known(transimpedanceBandwidth / (2 * Math.PI * (feedback.feedbackOhm + noiseGain * rb)));
  }
  if (feedback.inverting && feedback.seriesOhm === 0) {
    return unknown('The first-order figure does not hold for a transimpedance stage.');
  }
  return gbw ? known(gbw.value / noiseGain) : NO_GBW_PASSIVE;
}

/** Frequency where |noise gain|·f comes to a limit in Hz, found outward from a guess; null when out of range. */
function whereSpent(response: ChainResponse, k: number, limitHz: number, guessHz: number): number | null {
  const excess = (log: number): number => {
    const frequencyHz = Math.exp(log);
    return Math.log((response.noiseGain(k, frequencyHz) * frequencyHz) / limitHz);
  };
  let from = Math.log(guessHz);
  let atFrom = excess(from);
  if (Math.abs(atFrom) < 1e-14) return guessHz;
  const step = atFrom > 0 ? -0.25 : 0.25;
  for (let count = 0; count < 200; count++) {
    // The product runs nearly with f: a step of its whole excess mostly lands beside the answer.
    const to = from + Math.sign(step) * Math.max(Math.abs(step), Math.abs(atFrom) * 1.02);
    const atTo = excess(to);
    if (!Number.isFinite(atTo)) return null;
    if (atTo > 0 !== atFrom > 0) return Math.exp(findRoot(excess, from, atFrom, to, atTo, 1e-12));
    from = to;
    atFrom = atTo;
  }
  return null;
}

/** The budget of stage k (1-based) in one corner. Source: definition of the gain-bandwidth product. */
export function gbwBudget(input: ChainInput, response: ChainResponse, k: number, corner: DeviceCorner): GbwBudget {
  const stage = response.network.prepared[k - 1];
  const { band } = input.specification;
  const noiseGain = response.ideal.noiseGain[k];
  const { device, feedback } = stage;
  const gbw = device?.kind === 'voltage-feedback' ? gbwFor(device, input.policy, corner) : null;
  const noiseGainOperating = feedback ? response.noiseGain(k, band.operatingHz) : null;
  const noiseGainTop = feedback ? response.noiseGain(k, band.highHz) : null;
  const reason = device?.kind === 'current-feedback' ? NO_GBW_CURRENT_FEEDBACK : NO_GBW_PASSIVE;
  const headroom = (gain: number | null, frequencyHz: number): Maybe =>
    gbw && gain !== null ? known(gbw.value / (gain * frequencyHz), isAssumed(gbw)) : reason;
  const spent = (limitHz: number): number | null =>
    noiseGainOperating === null ? null : whereSpent(response, k, limitHz, limitHz / noiseGainOperating);
  return {
    gbw,
    signalGain: signalGainOf(stage),
    noiseGain,
    noiseGainOperating,
    noiseGainTop,
    headroomOperating: headroom(noiseGainOperating, band.operatingHz),
    headroomTop: headroom(noiseGainTop, band.highHz),
    targetMetHz: gbw ? spent(gbw.value / input.policy.headroomTarget) : null,
    runsOutHz: gbw ? spent(gbw.value) : null,
    cornerFirstOrderHz: firstOrderCorner(stage, gbw, noiseGain),
  };
}

/** True when the datasheet does not give the value itself. */
export function isAssumed(value: UsedValue): boolean {
  return value.basis === 'typ-derated' || value.basis === 'assumed';
}

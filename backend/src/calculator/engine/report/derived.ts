import type { Maybe } from '../analysis';
import { capitalised } from '../text/phrases';
import type { ChainFacts, StageFacts } from './facts';
import { combine, known, unknown } from '../maybe';
import { ratioToDb } from '../units';

/** A frequency of the band at which the lower headroom is found. */
export interface WorstHeadroom {
  readonly headroom: Maybe;
  readonly atHz: number;
  readonly at: 'operating' | 'top';
}

/** The lower of the headrooms at the operating frequency and at the top of the band; the top when they are equal. */
export function worstHeadroom(facts: ChainFacts, stage: StageFacts): WorstHeadroom {
  const { band } = facts.input.specification;
  const { headroomOperating, headroomTop } = stage.analysis;
  const operatingIsLower =
    headroomOperating.value !== null && headroomTop.value !== null && headroomOperating.value < headroomTop.value;
  return operatingIsLower
    ? { headroom: headroomOperating, atHz: band.operatingHz, at: 'operating' }
    : { headroom: headroomTop, atHz: band.highHz, at: 'top' };
}

/** Noise gain at the frequency of the lower headroom. */
export function worstNoiseGain(facts: ChainFacts, stage: StageFacts): Maybe {
  const { at } = worstHeadroom(facts, stage);
  return noiseGainMaybe(stage, at === 'operating' ? stage.analysis.noiseGainOperating : stage.analysis.noiseGainTop);
}

/** A noise gain as a value that may be missing. */
export function noiseGainMaybe(stage: StageFacts, value: number | null): Maybe {
  return value === null ? unknown(noNoiseGainReason(stage)) : known(value);
}

function noNoiseGainReason(stage: StageFacts): string {
  return stage.device?.kind === 'voltage-feedback' || stage.device?.kind === 'current-feedback'
    ? 'This topology has no noise gain of its own.'
    : 'No feedback, so no noise gain.';
}

/** GBW as a value that may be missing, with the reason of a stage that has none. */
export function gbwMaybe(stage: StageFacts): Maybe {
  const { gbw, headroomTop } = stage.analysis;
  if (gbw) return known(gbw.value, gbw.basis === 'assumed' || gbw.basis === 'typ-derated');
  if (stage.stage.kind === 'current-feedback') return unknown('Has no GBW (current feedback).');
  if (stage.stage.kind !== 'voltage-feedback') return unknown('Has no GBW (no feedback amplifier).');
  return unknown(headroomTop.value === null ? headroomTop.reason : 'The GBW is not entered.');
}

/** Noise gain × frequency: what the stage spends at the operating frequency, at the top edge, or at the worse of them. */
export function gbwUsed(facts: ChainFacts, stage: StageFacts, at: 'operating' | 'top' | 'worst'): Maybe {
  if (stage.stage.kind !== 'voltage-feedback') return gbwMaybe(stage);
  const { band } = facts.input.specification;
  const worst = worstHeadroom(facts, stage).at;
  const where = at === 'worst' ? worst : at;
  const noiseGain = where === 'operating' ? stage.analysis.noiseGainOperating : stage.analysis.noiseGainTop;
  const frequencyHz = where === 'operating' ? band.operatingHz : band.highHz;
  return combine([noiseGainMaybe(stage, noiseGain)], (gain) => gain * frequencyHz);
}

/** Exact −3 dB corner over the top of the band. */
export function bandwidthRatio(facts: ChainFacts, stage: StageFacts): Maybe {
  return combine([stage.analysis.cornerUpperHz], (corner) => corner / facts.input.specification.band.highHz);
}

/** A gain in dB minus the ideal gain. */
export function droop(gain: Maybe, ideal: Maybe): Maybe {
  return combine([gain, ideal], (a, b) => a - b);
}

/** Loop gain in dB. */
export function loopGainDb(stage: StageFacts): Maybe {
  return combine([stage.analysis.loopGain], (ratio) => ratioToDb(ratio));
}

/** What the output can swing over what it has to. */
export function swingHeadroom(stage: StageFacts): Maybe {
  return ratioOf(stage.analysis.swingAvailableV, stage.analysis.outputPeakV, 'No signal: nothing to swing.');
}

/** Slew rate that the device has over the slew rate that the signal needs. */
export function slewHeadroom(stage: StageFacts): Maybe {
  return ratioOf(slewAvailable(stage), stage.analysis.slewNeededVPerS, 'No signal: no slew needed.');
}

/** Slew rate as used, or what is missing. */
export function slewAvailable(stage: StageFacts): Maybe {
  const { slewAvailable: available } = stage.analysis;
  return available ? known(available.value, available.basis !== 'min') : missingData(stage, 'slew rate');
}

/** Output current that the device has over the current that load and feedback take. */
export function outputCurrentHeadroom(stage: StageFacts): Maybe {
  return ratioOf(outputCurrentAvailable(stage), stage.analysis.outputCurrentPeakA, 'No signal: no current.');
}

/** Output current as used, or what is missing. */
export function outputCurrentAvailable(stage: StageFacts): Maybe {
  const { outputCurrentAvailable: available } = stage.analysis;
  return available ? known(available.value, available.basis !== 'min') : missingData(stage, 'output current');
}

/** "Slew rate of QUIL-D618 is not entered.", or that the stage has no amplifier. */
export function missingData(stage: StageFacts, what: string): Maybe {
  const { device } = stage;
  if (!device || device.kind === 'matched-block') return unknown('No operational amplifier in this stage.');
  return unknown(`${capitalised(what)} of ${device.partNumber} is not entered.`);
}

function ratioOf(available: Maybe, needed: Maybe, zeroReason: string): Maybe {
  if (available.value !== null && needed.value === 0) return unknown(zeroReason);
  return combine([available, needed], (have, need) => have / need);
}

/** Share of the chain's added noise power density that this stage adds. */
export function noiseShare(facts: ChainFacts, stage: StageFacts): Maybe {
  const total = facts.stages.map((each) => each.analysis.noiseAdded);
  const missing = total.find((each) => each.value === null);
  if (missing) return missing;
  const sum = total.reduce((all, each) => all + (each.value ?? 0), 0);
  return sum > 0 ? combine([stage.analysis.noiseAdded], (own) => own / sum) : unknown('No stage adds noise.');
}

/** Added noise density of a stage, V/√Hz (A/√Hz). */
export function noiseDensity(stage: StageFacts): Maybe {
  return combine([stage.analysis.noiseAdded], (squared) => Math.sqrt(squared));
}

/** Stage with the smallest headroom, if any stage has a GBW. */
export function worstHeadroomStage(facts: ChainFacts): StageFacts | null {
  let worst: StageFacts | null = null;
  let lowest = Number.POSITIVE_INFINITY;
  for (const stage of facts.stages) {
    const value = stage.stage.kind === 'voltage-feedback' ? worstHeadroom(facts, stage).headroom.value : null;
    if (value !== null && value < lowest) {
      lowest = value;
      worst = stage;
    }
  }
  return worst;
}

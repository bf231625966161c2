import { bandwidthRatio, slewAvailable, swingHeadroom } from '../../report/derived';
import { isFeedbackStage, partName } from '../../report/facts';
import type { StageFacts } from '../../report/facts';
import { ratioToDb } from '../../units';
import { worsePoint } from '../../report/stage-figures';
import { atLeastText, atMostText, noiseGainText, setFrequency, targetText, valueText } from '../../text/phrases';
import { typed } from '../../text/si-format';
import { nearestPreferred } from '../../preferred-values';
import { feedbackCapacitorRemedy } from './feedback-capacitor-remedy';
import { hint, proposal, trialStages, trialVerdict } from './trials';
import type { FoundRemedy, Trial, Trials } from './trials';

const ISOLATION_OHM: readonly number[] = [10, 22, 47, 100];

/** Slew: what the stage needs, the level that this device can follow, and that splitting is no way out. */
export function slewRemedies(trials: Trials, stage: StageFacts): readonly FoundRemedy[] {
  const { facts } = trials.before;
  const needed = stage.analysis.slewNeededVPerS.value;
  const have = slewAvailable(stage).value;
  if (needed === null || have === null || needed <= 0) return [];
  const target = facts.policy.slewTarget;
  const bare = have < needed ? ` (${atLeastText(needed, 'V/s')} for ×1)` : '';
  const peak = (stage.analysis.outputPeakV.value ?? 0) * (have / (needed * target));
  const { highHz } = facts.input.specification.band;
  const least = atLeastText(needed * target, 'V/s');
  const noSplit = 'Splitting the gain cannot help: the output has to swing as far.';
  return [
    hint(
      `It needs at least ${least} for the target ${targetText(target)}${bare}. ${noSplit}`,
      `It needs ${least} for the target ${targetText(target)}. ${noSplit}`,
    ),
    hint(
      `${partName(stage)} follows at most ${atMostText(peak, 'V')} peak at ${setFrequency(highHz)} with ${targetText(target)}.`,
    ),
  ];
}

/** Swing: how much the level has to come down. */
export function swingRemedies(trials: Trials, stage: StageFacts): readonly FoundRemedy[] {
  const headroom = swingHeadroom(stage).value;
  if (headroom === null || headroom <= 0) return [];
  const missing = trials.before.facts.policy.levelMarginDb - ratioToDb(headroom);
  const sentence = `The level here has to come down by ${atLeastText(missing, 'dB')}, or the supply has to go up.`;
  return [hint(sentence)];
}

/** Stability: the noise gain that the device asks for, a capacitor across Rf, or a resistor that separates a capacitive load. */
export function stabilityRemedies(trials: Trials, stage: StageFacts): readonly FoundRemedy[] {
  const least = stage.device?.kind === 'voltage-feedback' ? stage.device.minimumStableGain : undefined;
  if (least !== undefined && (stage.analysis.noiseGain ?? least) < least) {
    const sentence = `${partName(stage)} needs a noise gain of at least ${noiseGainText(least)}; a unity-gain stable device has no such limit.`;
    return [hint(sentence)];
  }
  return [feedbackCapacitorRemedy(trials, stage), isolationRemedy(trials, stage)].filter((remedy) => remedy !== null);
}

function isolationRemedy(trials: Trials, stage: StageFacts): FoundRemedy | null {
  const set = stage.stage;
  if (!isFeedbackStage(set) || stage.stability?.loadCapacitive !== true || (set.isolationOhm ?? 0) > 0) return null;
  for (const isolationOhm of ISOLATION_OHM) {
    const trial = trials.replace(stage.index, [{ ...set, isolationOhm }]);
    const remedy = trial && isolationResult(trial, isolationOhm);
    if (remedy) return remedy;
  }
  return null;
}

function isolationResult(trial: Trial, isolationOhm: number): FoundRemedy | null {
  const margin = worsePoint(trialStages(trial)[0])?.phaseMarginDeg ?? null;
  if (trialVerdict(trial) !== 'clear' || margin === null) return null;
  const value = typed(isolationOhm, 'Ω');
  const brief = `${value} in series with its output would bring the phase margin to ${valueText(margin, 'deg')}.`;
  return proposal(trial, brief, `Add ${value} isolation`);
}

/** A larger coupling capacitor, the next of E6 that meets the target. */
export function couplingRemedies(trials: Trials, stage: StageFacts): readonly FoundRemedy[] {
  const { facts } = trials.before;
  const set = stage.stage;
  const corner = stage.analysis.cornerLowerHz.value;
  if (!isFeedbackStage(set) || typeof set.couplingF !== 'number' || corner === null) return [];
  const least = (set.couplingF * corner * facts.policy.bandwidthTarget) / facts.input.specification.band.lowHz;
  const nearest = nearestPreferred(least, 'E6');
  const couplingF = nearest >= least ? nearest : nearestPreferred(least * 1.5, 'E6');
  const trial = trials.replace(stage.index, [{ ...set, couplingF }]);
  const after = trial && trialStages(trial)[0].analysis.cornerLowerHz.value;
  if (!trial || after === null) return [];
  const brief = `A coupling of ${typed(couplingF, 'F')} would put the corner at ${valueText(after, 'Hz')}.`;
  return [proposal(trial, brief, `Use ${typed(couplingF, 'F')}`)];
}

/** Rf of the reference circuit for a current-feedback stage whose Rf is too small, the gain kept. */
export function feedbackResistorRemedies(trials: Trials, stage: StageFacts): readonly FoundRemedy[] {
  const set = stage.stage;
  const { device } = stage;
  if (set.kind !== 'current-feedback' || device?.kind !== 'current-feedback') return [];
  const scale = device.referenceFeedbackOhm / set.feedbackOhm;
  const gainOhm = typeof set.gainOhm === 'number' ? set.gainOhm * scale : set.gainOhm;
  const trial = trials.replace(stage.index, [{ ...set, feedbackOhm: device.referenceFeedbackOhm, gainOhm }]);
  if (!trial) return [];
  const ratio = bandwidthRatio(trial.after.facts, trialStages(trial)[0]).value;
  const reach = ratio === null ? '' : ` The corner would be ${valueText(ratio, 'ratio')} the top of the band.`;
  const value = typed(device.referenceFeedbackOhm, 'Ω');
  const brief = `With ${value} for Rf, as in the datasheet's reference circuit, it is as its maker measured it.${reach}`;
  return [proposal(trial, brief, `Use ${value}`)];
}

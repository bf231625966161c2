import { gbwUsed, worstHeadroom, worstNoiseGain } from '../../report/derived';
import { partName } from '../../report/facts';
import type { ChainFacts, StageFacts } from '../../report/facts';
import { atLeastText, gainText, ratioText, roundAway, targetText, valueText } from '../../text/phrases';
import { badness } from '../verdict-order';
import { asNonInverting, isRatioStage, resistorGain, splitInTwo, withGain } from './replacement-stages';
import {
  hint,
  isNoWorse,
  priceDifferenceText,
  proposal,
  trialCheckVerdict,
  trialStages,
  turnsPolarity,
} from './trials';
import type { FoundRemedy, Trial, Trials } from './trials';

const MOST_GAIN_STEPS = 4;

/** Remedies for a stage that spends too much GBW, each evaluated by the full model. */
export function gbwRemedies(trials: Trials, stage: StageFacts): readonly FoundRemedy[] {
  return [needRemedy, nonInvertingRemedy, splitRemedy, lessGainRemedy]
    .map((find) => find(trials, stage))
    .filter((remedy) => remedy !== null);
}

/** GBW that this noise gain takes at this frequency for the target, and just to be not over. */
function needRemedy(trials: Trials, stage: StageFacts): FoundRemedy | null {
  const { facts } = trials.before;
  const used = gbwUsed(facts, stage, 'worst').value;
  const headroom = worstHeadroom(facts, stage).headroom.value;
  if (used === null || headroom === null) return null;
  const target = facts.policy.headroomTarget;
  const bare = headroom < 1 ? ` (${atLeastText(used, 'Hz')} for ×1)` : '';
  const sentence = `It needs a GBW of at least ${atLeastText(used * target, 'Hz')} for the headroom target ${targetText(target)}${bare}.`;
  const brief = `It needs ${atLeastText(used * target, 'Hz')} for the target ${targetText(target)}.`;
  return hint(sentence, brief);
}

/** "uses 70.0 MHz (×1.07, tight)" of the replaced stage that is worst off. */
function spendingText(trial: Trial): string {
  const { facts } = trial.after;
  const worst = trialStages(trial).reduce((a, b) => (headroomOf(trial, b) < headroomOf(trial, a) ? b : a));
  const used = gbwUsed(facts, worst, 'worst').value ?? 0;
  const headroom = ratioText(headroomOf(trial, worst), [1, facts.policy.headroomTarget]);
  return `${valueText(used, 'Hz')} (${headroom}, ${trialCheckVerdict(trial, 'gbw')})`;
}

function headroomOf(trial: Trial, stage: StageFacts): number {
  return worstHeadroom(trial.after.facts, stage).headroom.value ?? 0;
}

/** A change that leaves the GBW check as bad as it is, or makes another check fail worse, is no remedy. */
function helps(trial: Trial, stage: StageFacts): boolean {
  const before = trial.before.stageChecks[stage.index].find((check) => check.id === 'gbw');
  return (
    isNoWorse(trial, stage) &&
    before !== undefined &&
    badness(trialCheckVerdict(trial, 'gbw')) < badness(before.verdict)
  );
}

function nonInvertingRemedy(trials: Trials, stage: StageFacts): FoundRemedy | null {
  if (!isRatioStage(stage.stage)) return null;
  const replacement = asNonInverting(stage.stage);
  const trial = replacement && trials.replace(stage.index, [replacement]);
  if (!trial || !helps(trial, stage)) return null;
  const gain = gainText(Math.abs(resistorGain(stage.stage)));
  const polarity = turnsPolarity(trial) ? ' and turn the polarity over' : '';
  const brief = `As non-inverting ${gain} it would use ${spendingText(trial)}${polarity}.`;
  return proposal(trial, brief, `Make it non-inverting ${gain}`);
}

function splitRemedy(trials: Trials, stage: StageFacts): FoundRemedy | null {
  if (!isRatioStage(stage.stage)) return null;
  const pair = splitInTwo(stage.stage, trials.before.facts.input.stages);
  const trial = pair && trials.replace(stage.index, pair);
  if (!trial || !helps(trial, stage)) return null;
  const sign = stage.stage.topology === 'inverting' ? -1 : 1;
  const gain = gainText(sign * Math.sqrt(Math.abs(resistorGain(stage.stage))));
  const brief =
    `Split into two stages of ${gain} with the same device, each would use at most ${spendingText(trial)}` +
    `${priceDifferenceText(trial)}${turnsPolarity(trial) ? '; the polarity turns over' : ''}.`;
  return proposal(trial, brief, 'Split in two');
}

/** The largest gain with which this device still meets the headroom target here: scaled, evaluated, corrected. */
function lessGainRemedy(trials: Trials, stage: StageFacts): FoundRemedy | null {
  if (!isRatioStage(stage.stage)) return null;
  const target = trials.before.facts.policy.headroomTarget;
  let feedbackOhm: number = stage.stage.feedbackOhm;
  let spent: Spent = spentBy(trials.before.facts, stage);
  for (let step = 0; step < MOST_GAIN_STEPS; step += 1) {
    const wanted = (spent.noiseGain * spent.headroom) / target;
    if (wanted <= 1 || spent.noiseGain <= 1) return null;
    feedbackOhm *= (wanted - 1) / (spent.noiseGain - 1);
    const magnitude = roundAway(Math.abs(resistorGain({ ...stage.stage, feedbackOhm })), Math.floor);
    const replacement = withGain(stage.stage, magnitude);
    const trial = replacement && trials.replace(stage.index, [replacement]);
    if (!trial || !replacement) return null;
    feedbackOhm = replacement.feedbackOhm;
    spent = spentBy(trial.after.facts, trialStages(trial)[0]);
    if (spent.headroom >= target) return lessGain(trial, magnitude, stage);
  }
  return null;
}

interface Spent {
  readonly noiseGain: number;
  readonly headroom: number;
}

function spentBy(facts: ChainFacts, stage: StageFacts): Spent {
  return {
    noiseGain: worstNoiseGain(facts, stage).value ?? 0,
    headroom: worstHeadroom(facts, stage).headroom.value ?? 0,
  };
}

function lessGain(trial: Trial, magnitude: number, stage: StageFacts): FoundRemedy | null {
  if (!isRatioStage(stage.stage) || magnitude < 1 || !isNoWorse(trial, stage)) return null;
  const gain = gainText(stage.stage.topology === 'inverting' ? -magnitude : magnitude);
  const missing = Math.abs(resistorGain(stage.stage)) / magnitude;
  const target = targetText(trial.before.facts.policy.headroomTarget);
  const brief =
    `With ${partName(stage)} the gain here can be at most ${gain} for ${target}; ` +
    `the other ${valueText(missing, 'ratio')} has to come from elsewhere.`;
  return proposal(trial, brief, `Set ${gain}`);
}

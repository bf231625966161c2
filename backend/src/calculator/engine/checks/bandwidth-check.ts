import type { Check, Figure, Verdict } from '../report';
import { isFeedbackStage, partName } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import { limitFigure } from '../report/figures';
import { stageFigure } from '../report/stage-figures';
import { cannotBeJudged, capitalised, setFrequency, targetText, valueText } from '../text/phrases';
import { isAbove, isBelow } from '../text/deciding-digits';
import { makeCheck, unknownCheck } from './make-check';

const TITLE = 'closed-loop bandwidth';
const LOWER_TITLE = 'lower corner';

/** Passive sections are filters: a band edge outside their corners is over, and no target applies. */
function targetFactor(facts: ChainFacts, stage: StageFacts): number {
  return stage.stage.kind === 'rc-section' ? 1 : facts.policy.bandwidthTarget;
}

/** The exact, loaded −3 dB corner against the top of the band. */
export function bandwidthCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const corner = stage.analysis.cornerUpperHz;
  const actual = (): Figure => stageFigure(facts, stage, 'cornerUpper');
  if (corner.value === null) {
    return bandwidthWithoutCorner(stage, corner.reason, actual);
  }
  const { highHz } = facts.input.specification.band;
  const factor = targetFactor(facts, stage);
  const verdict: Verdict = isBelow(corner.value, highHz)
    ? 'over'
    : isBelow(corner.value, highHz * factor)
      ? 'tight'
      : 'clear';
  const { value } = corner;
  const sentence = (): string => upperSentence(facts, stage, value, verdict);
  return makeCheck('bandwidth', TITLE, verdict, sentence, () => ({
    actual: actual(),
    limit: limitFigure(verdict === 'over' ? highHz : highHz * factor, 'Hz'),
  }));
}

/** A corner beyond the search range is no limit; a gain that never comes up is over; what cannot be computed is unknown. */
function bandwidthWithoutCorner(stage: StageFacts, reason: string, actual: () => Figure): Check | null {
  const { gainOperatingDb, operatingBeyondCorner, cornerLowerHz } = stage.analysis;
  if (gainOperatingDb.value === null)
    return unknownCheck('bandwidth', TITLE, () => cannotBeJudged('the corner', reason), actual);
  if (!operatingBeyondCorner || cornerLowerHz.value !== null) return null;
  const sentence = (): string =>
    `${capitalised(partName(stage))} never comes to half the power of its ideal gain here.`;
  return makeCheck('bandwidth', TITLE, 'over', sentence, () => ({ actual: actual() }));
}

function upperSentence(facts: ChainFacts, stage: StageFacts, corner: number, verdict: Verdict): string {
  const { highHz, operatingHz } = facts.input.specification.band;
  const factor = targetFactor(facts, stage);
  const is = `${capitalised(partName(stage))} is at −3 dB at ${valueText(corner, 'Hz', [highHz, highHz * factor])} here, loaded`;
  if (isBelow(corner, operatingHz)) {
    return `${is}: the operating frequency of ${setFrequency(operatingHz)} is already beyond the corner.`;
  }
  if (verdict === 'over') return `${is}; the band goes up to ${setFrequency(highHz)}.`;
  const ratio = valueText(corner / highHz, 'ratio', [1, factor]);
  if (verdict === 'tight') return `${is}: ${ratio} the top of the band, target ${targetText(factor)}.`;
  return `${is}: ${ratio} the top of the band.`;
}

/** The lower −3 dB corner against the bottom of the band; a stage that goes down to DC has none. */
export function lowerCornerCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const corner = stage.analysis.cornerLowerHz;
  if (corner.value === null || corner.value <= 0) return null;
  const { lowHz } = facts.input.specification.band;
  const factor = targetFactor(facts, stage);
  const verdict: Verdict = isAbove(corner.value, lowHz)
    ? 'over'
    : isAbove(corner.value * factor, lowHz)
      ? 'tight'
      : 'clear';
  const { value } = corner;
  return makeCheck(
    'lower-corner',
    LOWER_TITLE,
    verdict,
    () => lowerSentence(facts, stage, value, verdict),
    () => ({
      actual: stageFigure(facts, stage, 'cornerLower'),
      limit: limitFigure(verdict === 'over' ? lowHz : lowHz / factor, 'Hz'),
    }),
  );
}

function lowerSentence(facts: ChainFacts, stage: StageFacts, corner: number, verdict: Verdict): string {
  const { lowHz } = facts.input.specification.band;
  const factor = targetFactor(facts, stage);
  const isCoupled = isFeedbackStage(stage.stage) && typeof stage.stage.couplingF === 'number';
  const cause = isCoupled ? 'Its coupling puts the lower −3 dB corner at' : 'Its lower −3 dB corner is at';
  const is = `${cause} ${valueText(corner, 'Hz', [lowHz, lowHz / factor])}`;
  if (verdict === 'over') return `${is}: the band starts at ${setFrequency(lowHz)}.`;
  const ratio = valueText(lowHz / corner, 'ratio', [1, factor]);
  const target = verdict === 'tight' ? `, target ${targetText(factor)}` : '';
  return `${is}: ${ratio} below the bottom of the band${target}.`;
}

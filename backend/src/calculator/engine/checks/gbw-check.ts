import type { Check, Figure } from '../report';
import { gbwUsed, worstHeadroom, worstNoiseGain } from '../report/derived';
import type { ChainFacts, StageFacts } from '../report/facts';
import { partName } from '../report/facts';
import { limitFigure } from '../report/figures';
import { stageFigure } from '../report/stage-figures';
import {
  cannotBeJudged,
  deviceHas,
  noiseGainText,
  ratioText,
  setFrequency,
  targetText,
  valueText,
} from '../text/phrases';
import { makeCheck, unknownCheck, verdictAtLeast } from './make-check';
import type { CheckFigures } from './make-check';

const TITLE = 'GBW limit';

/**
 * Gain-bandwidth that the device has against what the stage spends (noise gain × frequency), at the lower of the
 * headrooms at the operating frequency and the top of the band. Only for voltage feedback.
 */
export function gbwCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  if (stage.stage.kind !== 'voltage-feedback') return null;
  const { headroom, atHz } = worstHeadroom(facts, stage);
  const actual = (): Figure => stageFigure(facts, stage, 'headroom');
  if (headroom.value === null) {
    const { reason } = headroom;
    return unknownCheck('gbw', TITLE, () => cannotBeJudged('the headroom', reason), actual);
  }
  const target = facts.policy.headroomTarget;
  const verdict = verdictAtLeast(headroom.value, 1, target);
  const { value } = headroom;
  const figures = (): CheckFigures => ({
    actual: actual(),
    limit: limitFigure(verdict === 'over' ? 1 : target, 'ratio'),
  });
  return makeCheck('gbw', TITLE, verdict, () => gbwSentence(facts, stage, value, atHz), figures);
}

function gbwSentence(facts: ChainFacts, stage: StageFacts, headroom: number, atHz: number): string {
  const noiseGain = worstNoiseGain(facts, stage).value ?? 0;
  const used = gbwUsed(facts, stage, 'worst').value ?? 0;
  const { gbw } = stage.analysis;
  const target = facts.policy.headroomTarget;
  const has = gbw ? deviceHas(partName(stage), gbw, 'Hz', [used]) : 'the GBW is not known';
  const spends = `At ${setFrequency(atHz)} its noise gain of ${noiseGainText(noiseGain)} uses ${valueText(used, 'Hz', [gbw?.value ?? used])}`;
  const margin = ratioText(headroom, [1, target]);
  if (headroom < 1) return `${spends}; ${has}.`;
  const against = headroom < target ? `headroom ${margin}, target ${targetText(target)}` : `headroom ${margin}`;
  return `${spends}; ${has}: ${against}.`;
}

import type { StageNeed, Unit } from '../report';
import { gbwUsed } from '../report/derived';
import { isFeedbackStage } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import { figure } from '../report/figures';
import { dbToRatio } from '../units';
import { atLeastText, atMostText, noiseGainText, roundAway } from '../text/phrases';
import { decimalAmount, typed } from '../text/si-format';

/**
 * "What passes here": what any device in this place must bring, so that every check of the stage is clear and the chain
 * keeps within its budgets. Only the lines that apply.
 *
 * @param facts the chain as it is, in the project's case
 * @param stage the place
 */
export function stageNeeds(facts: ChainFacts, stage: StageFacts): readonly StageNeed[] {
  return [
    gbwNeed(facts, stage),
    cornerNeed(facts, stage),
    stableGainNeed(stage),
    slewNeed(facts, stage),
    swingNeed(facts, stage),
    outputCurrentNeed(facts, stage),
    supplyVoltageNeed(facts, stage),
    supplyCurrentNeed(facts, stage),
    priceNeed(facts, stage),
  ].filter((need) => need !== null);
}

function need(id: string, text: string, value: number, unit: Unit): StageNeed {
  return { id, text, figure: figure(value, unit), money: null };
}

function gbwNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  if (stage.stage.kind !== 'voltage-feedback') return null;
  const used = gbwUsed(facts, stage, 'worst').value;
  if (used === null) return null;
  const least = roundAway(used * facts.policy.headroomTarget, Math.ceil);
  return need('gbw', `GBW at least ${atLeastText(least, 'Hz')}`, least, 'Hz');
}

/** Where GBW does not apply the corner does. */
function cornerNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  if (stage.stage.kind === 'voltage-feedback' || stage.stage.kind === 'rc-section') return null;
  const least = facts.input.specification.band.highHz * facts.policy.bandwidthTarget;
  return need('corner', `corner here at least ${atLeastText(least, 'Hz')}`, least, 'Hz');
}

function stableGainNeed(stage: StageFacts): StageNeed | null {
  const noiseGain = stage.analysis.noiseGain;
  if (stage.stage.kind !== 'voltage-feedback' || noiseGain === null) return null;
  const { atMinimum, atMaximum } = stage.stability ?? {};
  const atCrossings = [atMinimum?.noiseGainAtCrossing, atMaximum?.noiseGainAtCrossing];
  const most = Math.min(noiseGain, ...atCrossings.filter((gain) => typeof gain === 'number'));
  const rounded = roundAway(most, Math.floor);
  return {
    id: 'minimum-stable-gain',
    text: `minimum stable gain at most ${noiseGainText(rounded)}`,
    figure: figure(rounded, 'number', { plainGain: true }),
    money: null,
  };
}

function slewNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  const needed = stage.analysis.slewNeededVPerS.value;
  if (!isFeedbackStage(stage.stage) || needed === null || needed <= 0) return null;
  const least = roundAway(needed * facts.policy.slewTarget, Math.ceil);
  return need('slew', `slew rate at least ${atLeastText(least, 'V/s')}`, least, 'V/s');
}

function swingNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  const peak = stage.analysis.outputPeakV.value;
  if (!isFeedbackStage(stage.stage) || peak === null || peak <= 0) return null;
  const { supply } = facts.input.specification;
  const least = roundAway(peak * dbToRatio(facts.policy.levelMarginDb), Math.ceil);
  const rails =
    supply.negativeV === -supply.positiveV ? `±${supply.positiveV} V` : `${supply.positiveV - supply.negativeV} V`;
  return need('swing', `swing at least ${atLeastText(least, 'V')} peak on ${rails}`, least, 'V');
}

function outputCurrentNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  const peak = stage.analysis.outputCurrentPeakA.value;
  if (!isFeedbackStage(stage.stage) || peak === null || peak <= 0) return null;
  const least = roundAway(peak * dbToRatio(facts.policy.levelMarginDb), Math.ceil);
  return need('output-current', `output current at least ${atLeastText(least, 'A')}`, least, 'A');
}

function supplyVoltageNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  if (!isFeedbackStage(stage.stage)) return null;
  const { supply } = facts.input.specification;
  const totalV = supply.positiveV - supply.negativeV;
  return need('supply-voltage', `takes a supply of ${typed(totalV, 'V')}`, totalV, 'V');
}

/** What the others leave of the supply current. */
function supplyCurrentNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  const limit = facts.input.specification.requirements.supplyCurrentA;
  if (limit === undefined || stage.device === null) return null;
  const others = facts.stages
    .filter((each) => each.index !== stage.index)
    .map((each) => each.analysis.supplyCurrentA.value);
  if (others.some((value) => value === null)) return null;
  const most = roundAway(limit - others.reduce<number>((sum, value) => sum + (value ?? 0), 0), Math.floor);
  if (most <= 0)
    return { id: 'supply-current', text: 'the others take all of the supply current', figure: null, money: null };
  return need('supply-current', `supply current at most ${atMostText(most, 'A')}`, most, 'A');
}

/** What the others leave of the cost limit. */
function priceNeed(facts: ChainFacts, stage: StageFacts): StageNeed | null {
  const limit = facts.input.specification.requirements.costMicros;
  if (limit === undefined || stage.device === null) return null;
  const others = facts.cost.stages.filter((each) => each.stageId !== stage.stage.id && each.price !== null);
  if (others.some((each) => each.money.amountMicros === null)) return null;
  const left = Number(others.reduce((rest, each) => rest - BigInt(each.money.amountMicros ?? 0), BigInt(limit)));
  const { currency } = facts.input;
  if (left <= 0) return { id: 'price', text: 'the others cost the whole limit', figure: null, money: null };
  return {
    id: 'price',
    text: `price at most ${decimalAmount(left)} ${currency}`,
    figure: null,
    money: { amountMicros: left, currency },
  };
}

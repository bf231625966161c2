import type { Maybe } from '../analysis';
import type { Check, CheckId, Figure, Unit, Verdict } from '../report';
import { chainFigure } from '../report/chain-figures';
import { noiseShare } from '../report/derived';
import type { ChainFacts, StageFacts } from '../report/facts';
import { limitFigure } from '../report/figures';
import { noiseUnit } from '../report/stage-figures';
import { decimalAmount, typed } from '../text/si-format';
import { cannotBeJudged, capitalised, decibelLimitText, decibelText, valueText } from '../text/phrases';
import { isAbove } from '../text/deciding-digits';
import { makeCheck, unknownCheck, verdictAtMost } from './make-check';

/** A quantity that has to stay under a limit and tight within a share of it. */
interface Budget {
  readonly id: CheckId;
  readonly title: string;
  readonly value: Maybe;
  readonly limit: number;
  readonly unit: Unit;
  readonly actual: () => Figure;
  /** Which stage takes most, as a sentence. */
  readonly largest: () => string;
}

function budgetCheck(facts: ChainFacts, budget: Budget): Check {
  const { id, title, value, limit, unit, actual } = budget;
  if (value.value === null) {
    const { reason } = value;
    return unknownCheck(id, title, () => cannotBeJudged(`the ${title}`, reason), actual);
  }
  const size = Math.abs(value.value);
  const verdict = verdictAtMost(size, limit, limit * (1 - facts.policy.budgetMargin));
  const sentence = (): string => {
    const is = `${capitalised(title)} is ${valueText(size, unit, [limit])} of ${typed(limit, unit)}.`;
    return verdict === 'clear' ? is : `${is} ${budget.largest()}`.trim();
  };
  return makeCheck(id, title, verdict, sentence, () => ({ actual: actual(), limit: limitFigure(limit, unit) }));
}

function largestStage(
  facts: ChainFacts,
  of: (stage: StageFacts) => Maybe,
): { stage: StageFacts; value: number } | null {
  let largest: { stage: StageFacts; value: number } | null = null;
  for (const stage of facts.stages) {
    const { value } = of(stage);
    if (value !== null && Math.abs(value) > Math.abs(largest?.value ?? 0)) largest = { stage, value };
  }
  return largest;
}

function largestText(facts: ChainFacts, unit: Unit, of: (stage: StageFacts) => Maybe, verb: string): string {
  const largest = largestStage(facts, of);
  return largest ? `${largest.stage.label} ${verb} ${valueText(Math.abs(largest.value), unit)}.` : '';
}

function noisiest(facts: ChainFacts): string {
  const largest = largestStage(facts, (stage) => noiseShare(facts, stage));
  return largest ? `${largest.stage.label} adds ${valueText(largest.value, 'fraction')} of the noise power.` : '';
}

/** Added noise density referred to the source. */
export function inputNoiseCheck(facts: ChainFacts): Check | null {
  const limit = facts.input.specification.requirements.inputNoise;
  if (limit === undefined) return null;
  return budgetCheck(facts, {
    id: 'input-noise',
    title: 'input noise',
    value: facts.chain.inputNoise,
    limit,
    unit: noiseUnit(facts),
    actual: () => chainFigure(facts, 'inputNoise'),
    largest: () => noisiest(facts),
  });
}

/** Noise figure: margins of decibel quantities are in decibels. */
export function noiseFigureCheck(facts: ChainFacts): Check | null {
  const limit = facts.input.specification.requirements.noiseFigureDb;
  if (limit === undefined) return null;
  const value = facts.chain.noiseFigureDb;
  const actual = (): Figure => chainFigure(facts, 'noiseFigure');
  if (value.value === null) {
    const { reason } = value;
    return unknownCheck('noise-figure', 'noise figure', () => cannotBeJudged('the noise figure', reason), actual);
  }
  const noiseFigure = value.value;
  const verdict = verdictAtMost(noiseFigure, limit, limit - facts.policy.noiseMarginDb);
  const sentence = (): string => {
    const is = `Noise figure is ${decibelText(noiseFigure, [limit])}; the limit is ${decibelLimitText(limit)}.`;
    return verdict === 'clear' ? is : `${is} ${noisiest(facts)}`.trim();
  };
  return makeCheck('noise-figure', 'noise figure', verdict, sentence, () => ({
    actual: actual(),
    limit: limitFigure(limit, 'dB'),
  }));
}

/** Output offset, supply current and supply power. */
export function outputOffsetCheck(facts: ChainFacts): Check | null {
  const limit = facts.input.specification.requirements.outputOffsetV;
  if (limit === undefined) return null;
  return budgetCheck(facts, {
    id: 'output-offset',
    title: 'output offset',
    value: facts.chain.outputOffsetV,
    limit,
    unit: 'V',
    actual: () => chainFigure(facts, 'outputOffset'),
    largest: () => '',
  });
}

/** Quiescent current of the chain in A against its requirement; null without one. */
export function supplyCurrentCheck(facts: ChainFacts): Check | null {
  const limit = facts.input.specification.requirements.supplyCurrentA;
  if (limit === undefined) return null;
  return budgetCheck(facts, {
    id: 'supply-current',
    title: 'supply current',
    value: facts.chain.supplyCurrentA,
    limit,
    unit: 'A',
    actual: () => chainFigure(facts, 'supplyCurrent'),
    largest: () => largestText(facts, 'A', (stage) => stage.analysis.supplyCurrentA, 'takes'),
  });
}

/** Quiescent power of the chain in W against its requirement; null without one. */
export function supplyPowerCheck(facts: ChainFacts): Check | null {
  const limit = facts.input.specification.requirements.supplyPowerW;
  if (limit === undefined) return null;
  return budgetCheck(facts, {
    id: 'supply-power',
    title: 'supply power',
    value: facts.chain.supplyPowerW,
    limit,
    unit: 'W',
    actual: () => chainFigure(facts, 'supplyPower'),
    largest: () => largestText(facts, 'W', (stage) => stage.analysis.supplyPowerW, 'takes'),
  });
}

/** Cost of the devices of one board against the limit, in exact micro-units. */
export function costCheck(facts: ChainFacts): Check | null {
  const limitMicros = facts.input.specification.requirements.costMicros;
  if (limitMicros === undefined) return null;
  const { amountMicros, reason } = facts.cost.total;
  if (amountMicros === null) {
    return unknownCheck('cost', 'cost', () => cannotBeJudged('the cost', reason ?? 'a price is missing'));
  }
  // Whole micro-units are exact: over by one of them is over.
  const isTight = isAbove(amountMicros, limitMicros * (1 - facts.policy.budgetMargin));
  const verdict = amountMicros > limitMicros ? 'over' : isTight ? 'tight' : 'clear';
  return makeCheck('cost', 'cost', verdict, () => costSentence(facts, amountMicros, limitMicros, verdict));
}

function costSentence(facts: ChainFacts, amountMicros: number, limitMicros: number, verdict: Verdict): string {
  const { total, stages } = facts.cost;
  const side = amountMicros > limitMicros ? 'over' : 'under';
  const left = decimalAmount(Math.abs(limitMicros - amountMicros));
  const is = `Cost is ${decimalAmount(amountMicros)} ${total.currency}, ${left} ${side} ${decimalAmount(limitMicros)}.`;
  const dearest = [...stages].sort((a, b) => (b.money.amountMicros ?? 0) - (a.money.amountMicros ?? 0))[0];
  if (verdict === 'clear' || !dearest) return is;
  return `${is} ${dearest.label} takes ${decimalAmount(dearest.money.amountMicros ?? 0)}.`;
}

/** Polarity of the whole chain where one is required. */
export function polarityCheck(facts: ChainFacts): Check | null {
  const required = facts.input.specification.requirements.polarity;
  if (required === undefined) return null;
  const actual = facts.chain.inverted ? 'inverted' : 'in-phase';
  const isMet = actual === required;
  return makeCheck('polarity', 'polarity', isMet ? 'clear' : 'over', () => polaritySentence(facts, actual, required));
}

type Polarity = 'in-phase' | 'inverted';

function polaritySentence(facts: ChainFacts, actual: Polarity, required: Polarity): string {
  const words = { inverted: 'inverted', 'in-phase': 'in phase' };
  if (actual === required) return `The output is ${words[actual]}, as required.`;
  const count = facts.stages.filter((stage) => stage.analysis.signalGain < 0).length;
  const inverting = `${count} inverting ${count === 1 ? 'stage' : 'stages'}`;
  return `The output is ${words[actual]} (${inverting}); required is ${words[required]}.`;
}

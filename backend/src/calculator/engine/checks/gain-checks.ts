import type { Check, CheckId, Figure, Verdict } from '../report';
import { chainFigure, chainGainUnit } from '../report/chain-figures';
import type { ChainFacts } from '../report/facts';
import { limitFigure } from '../report/figures';
import { ratioToDb } from '../units';
import { isAbove, isBelow } from '../text/deciding-digits';
import {
  because,
  cannotBeJudged,
  decibelLimitText,
  decibelText,
  setFrequency,
  setNumber,
  valueText,
} from '../text/phrases';
import { flatnessContributions, gainContributions, largestContributionText } from './contributions';
import { makeCheck, unknownCheck, verdictAtLeast, verdictAtMost } from './make-check';
import type { CheckFigures } from './make-check';

/** Gain at the operating frequency against the window, the least and the most that are required. */
export function gainCheck(facts: ChainFacts): Check | null {
  const { gainDb, minimumGainDb, maximumGainDb } = facts.input.specification.requirements;
  if (gainDb === undefined && minimumGainDb === undefined && maximumGainDb === undefined) return null;
  const gain = facts.chain.gainOperatingDb;
  const actual = (): Figure => chainFigure(facts, 'gainOperating');
  if (gain.value === null) return unknownRequirement('gain', 'chain gain', gain.reason, actual);
  const { value } = gain;
  const { verdict, limit } = judgeBounds(value, gainBounds(facts));
  const sentence = (): string => gainSentence(facts, value, verdict, limit);
  return makeCheck('gain', 'chain gain', verdict, sentence, () => ({
    actual: actual(),
    limit: limitFigure(limit, chainGainUnit(facts)),
  }));
}

function unknownRequirement(id: CheckId, title: string, reason: string, actual: () => Figure): Check {
  return unknownCheck(id, title, () => cannotBeJudged(`the ${title}`, reason), actual);
}

/** A side of the allowed gain and how close to it is tight, in dB. */
interface GainBound {
  readonly side: 'least' | 'most';
  readonly limitDb: number;
  readonly tightDb: number;
}

/**
 * A target ± tolerance is tight within the margin's share of the tolerance. A one-sided limit is tight within the margin's
 * share of the limit's own value: of the gain as a ratio (20 % are 1.58 dB), not of its decibels.
 */
function gainBounds(facts: ChainFacts): readonly GainBound[] {
  const { gainDb, minimumGainDb, maximumGainDb } = facts.input.specification.requirements;
  const { toleranceMargin } = facts.policy;
  const bounds: GainBound[] = [];
  if (gainDb) {
    const tightDb = gainDb.tolerance * toleranceMargin;
    bounds.push({ side: 'least', limitDb: gainDb.target - gainDb.tolerance, tightDb });
    bounds.push({ side: 'most', limitDb: gainDb.target + gainDb.tolerance, tightDb });
  }
  if (minimumGainDb !== undefined) {
    bounds.push({ side: 'least', limitDb: minimumGainDb, tightDb: ratioToDb(1 + toleranceMargin) });
  }
  if (maximumGainDb !== undefined) {
    bounds.push({ side: 'most', limitDb: maximumGainDb, tightDb: -ratioToDb(1 - toleranceMargin) });
  }
  return bounds;
}

function judgeBounds(gain: number, bounds: readonly GainBound[]): { verdict: Verdict; limit: number } {
  const left = (bound: GainBound): number => (bound.side === 'least' ? gain - bound.limitDb : bound.limitDb - gain);
  const nearest = bounds.reduce((a, b) => (left(b) < left(a) ? b : a));
  const isOver = nearest.side === 'least' ? isBelow(gain, nearest.limitDb) : isAbove(gain, nearest.limitDb);
  const isTight = bounds.some((bound) => isBelow(left(bound), bound.tightDb));
  return { verdict: isOver ? 'over' : isTight ? 'tight' : 'clear', limit: nearest.limitDb };
}

function gainSentence(facts: ChainFacts, gain: number, verdict: Verdict, limit: number): string {
  const unit = chainGainUnit(facts) === 'dBΩ' ? 'dBΩ' : 'dB';
  const at = setFrequency(facts.input.specification.band.operatingHz);
  const is = `The gain at ${at} is ${decibelText(gain, [limit], unit)}`;
  if (verdict === 'clear') return `${is}; required is ${requiredGainText(facts)}.`;
  if (verdict === 'tight')
    return `${is}, ${decibelText(Math.abs(gain - limit))} inside the limit of ${decibelLimitText(limit, unit)}.`;
  const side = gain < limit ? 'below' : 'above';
  return `${is}, ${side} ${decibelLimitText(limit, unit)} (${requiredGainText(facts)}).${gainCause(facts, gain, limit)}`;
}

/** Either the gains are set wrong, or stages lose gain: then which one loses most. */
function gainCause(facts: ChainFacts, gain: number, limit: number): string {
  const ideal = facts.chain.idealGainDb.value;
  if (ideal === null) return '';
  if (gain > limit) return '';
  if (isBelow(ideal, limit)) {
    return ` Even with ideal amplifiers it would be ${decibelText(ideal, [limit], chainGainUnit(facts) === 'dBΩ' ? 'dBΩ' : 'dB')}: ${decibelText(limit - ideal)} more gain has to be set.`;
  }
  return largestContributionText(gainContributions(facts), ideal - gain);
}

/** "60 ±1 dB", "at least 20 dB" … */
export function requiredGainText(facts: ChainFacts): string {
  const { gainDb, minimumGainDb, maximumGainDb } = facts.input.specification.requirements;
  const unit = chainGainUnit(facts);
  const parts: string[] = [];
  if (gainDb) parts.push(`${setNumber(gainDb.target)} ±${setNumber(gainDb.tolerance)} ${unit}`);
  if (minimumGainDb !== undefined) parts.push(`at least ${setNumber(minimumGainDb)} ${unit}`);
  if (maximumGainDb !== undefined) parts.push(`at most ${setNumber(maximumGainDb)} ${unit}`);
  return parts.join(', ');
}

/** Largest minus smallest gain over the band. */
export function flatnessCheck(facts: ChainFacts): Check | null {
  const required = facts.input.specification.requirements.flatnessDb;
  if (required === undefined) return null;
  const { flatnessDb } = facts.chain;
  const actual = (): Figure => chainFigure(facts, 'flatness');
  if (flatnessDb.value === null) return unknownRequirement('flatness', 'flatness', flatnessDb.reason, actual);
  const { value } = flatnessDb;
  const verdict = verdictAtMost(value, required, required * (1 - facts.policy.toleranceMargin));
  const sentence = (): string => flatnessSentence(facts, value, required, verdict);
  return makeCheck('flatness', 'flatness', verdict, sentence, () => ({
    actual: actual(),
    limit: limitFigure(required, 'dB'),
  }));
}

function flatnessSentence(facts: ChainFacts, flatness: number, required: number, verdict: Verdict): string {
  const { lowHz, highHz } = facts.input.specification.band;
  const value = decibelText(flatness, [required, required * (1 - facts.policy.toleranceMargin)]);
  const band = `From ${setFrequency(lowHz)} to ${setFrequency(highHz)}`;
  const cause = verdict === 'clear' ? '' : largestContributionText(flatnessContributions(facts), flatness);
  return `${band} the gain changes by ${value}; the limit is ${decibelLimitText(required)}.${cause}`;
}

/** The chain's exact upper −3 dB corner. */
export function upperCornerCheck(facts: ChainFacts): Check | null {
  const required = facts.input.specification.requirements.upperCornerHz;
  if (required === undefined) return null;
  const corner = facts.chain.cornerUpperHz;
  const actual = (): Figure => chainFigure(facts, 'cornerUpper');
  if (corner.value === null) return cornerWithoutValue(facts, 'upper-corner', 'upper corner', corner.reason, actual);
  const { value } = corner;
  const beyond = isBelow(value, facts.input.specification.band.operatingHz)
    ? ' The operating frequency is beyond the corner.'
    : '';
  const sentence = (): string =>
    `The chain is at −3 dB at ${valueText(value, 'Hz', [required])}; required is ${setFrequency(required)}.${beyond}`;
  const verdict = verdictAtLeast(value, required, required * (1 + facts.policy.toleranceMargin));
  return makeCheck('upper-corner', 'upper corner', verdict, sentence, () => ({
    actual: actual(),
    limit: limitFigure(required, 'Hz'),
  }));
}

/** The chain's lower −3 dB corner. */
export function chainLowerCornerCheck(facts: ChainFacts): Check | null {
  const required = facts.input.specification.requirements.lowerCornerHz;
  if (required === undefined) return null;
  const corner = facts.chain.cornerLowerHz;
  const actual = (): Figure => chainFigure(facts, 'cornerLower');
  if (corner.value === null) {
    return cornerWithoutValue(facts, 'chain-lower-corner', 'lower corner', corner.reason, actual);
  }
  const { value } = corner;
  const sentence = (): string =>
    `The chain's lower −3 dB corner is ${valueText(value, 'Hz', [required])}; at most ${setFrequency(required)} is required.`;
  const verdict = verdictAtMost(value, required, required * (1 - facts.policy.toleranceMargin));
  return makeCheck('chain-lower-corner', 'lower corner', verdict, sentence, () => ({
    actual: actual(),
    limit: limitFigure(required, 'Hz'),
  }));
}

/** No corner: flat on that side when the gain is known, else unknown. */
function cornerWithoutValue(
  facts: ChainFacts,
  id: 'upper-corner' | 'chain-lower-corner',
  title: string,
  reason: string,
  actual: () => Figure,
): Check {
  const figures = (): CheckFigures => ({ actual: actual() });
  if (facts.chain.gainOperatingDb.value === null) return unknownRequirement(id, title, reason, actual);
  const { operatingBeyondCorner, cornerLowerHz, cornerUpperHz } = facts.chain;
  if (operatingBeyondCorner && cornerLowerHz.value === null && cornerUpperHz.value === null) {
    return makeCheck(id, title, 'over', () => 'The chain never comes to half the power of its ideal gain.', figures);
  }
  return makeCheck(id, title, 'clear', () => `The ${title} is no limit: ${because(reason)}.`, figures);
}

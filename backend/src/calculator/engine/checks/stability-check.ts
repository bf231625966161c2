import type { StabilityAnalysis, StabilityPoint, UsedValue } from '../analysis';
import type { Check, Figure, Verdict } from '../report';
import { partName } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import { figure, limitFigure } from '../report/figures';
import { stageFigure, worsePoint } from '../report/stage-figures';
import { isBelow } from '../text/deciding-digits';
import { basisText, noiseGainText, setFrequency, setNumber, valueText } from '../text/phrases';
import { makeCheck, unknownCheck } from './make-check';
import type { CheckFigures } from './make-check';
import { feedbackResistorShare, LOWEST_FEEDBACK_SHARE } from './current-feedback-check';

const TITLE = 'stability';

interface Case {
  readonly facts: ChainFacts;
  readonly stage: StageFacts;
  readonly stability: StabilityAnalysis;
  readonly point: StabilityPoint;
}

/**
 * Phase margin and smallest stable noise gain at both ends of the GBW range, whatever the project's case; the worse counts.
 * Where the datasheet is silent the rules of docs/calculator.md apply: a bound is never called clear without a ground.
 */
export function stabilityCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const { stability } = stage;
  const point = worsePoint(stage);
  if (!stability || !point) return null;
  const each: Case = { facts, stage, stability, point };
  return (
    noiseGainTooLow(each) ??
    marginTooSmall(each) ??
    outputResistanceMissing(each) ??
    silentDatasheet(each) ??
    judged(each)
  );
}

/** The end of the GBW range in words: "at the maximum GBW (130 MHz: typical × 1.3, assumed)". */
function whichEnd(each: Case, worse: 'minimum' | 'maximum'): string {
  const used: UsedValue = worse === 'maximum' ? each.stability.maximumGbw : each.stability.minimumGbw;
  const what = each.stage.stage.kind === 'current-feedback' ? 'bandwidth' : 'GBW';
  return `at the ${worse} ${what} (${valueText(used.value, 'Hz')}: ${basisText(used)})`;
}

function minimumStableGain(each: Case): number | null {
  const { device } = each.stage;
  return device?.kind === 'voltage-feedback' ? (device.minimumStableGain ?? null) : null;
}

/** Noise gain that the minimum stable gain is compared with: the smallest at a crossing, else the midband one. */
function lowestNoiseGain(each: Case): number | null {
  const { atMinimum, atMaximum } = each.stability;
  const atCrossings = [atMinimum.noiseGainAtCrossing, atMaximum.noiseGainAtCrossing].filter((gain) => gain !== null);
  return atCrossings.length > 0 ? Math.min(...atCrossings) : each.stage.analysis.noiseGain;
}

function noiseGainTooLow(each: Case): Check | null {
  const least = minimumStableGain(each);
  const noiseGain = lowestNoiseGain(each);
  if (least === null || noiseGain === null || !isBelow(noiseGain, least)) return null;
  const sentence = (): string =>
    `Its noise gain of ${noiseGainText(noiseGain, [least])}${whereLow(each, noiseGain)} is below ` +
    `${noiseGainText(least)}, the smallest at which ${partName(each.stage)} is stable.`;
  return makeCheck('stability', TITLE, 'over', sentence, () => ({
    actual: figure(noiseGain, 'number', { plainGain: true, limits: [least] }),
    limit: limitFigure(least, 'number'),
  }));
}

/** Said only where capacitances make it another noise gain than the one of the resistors. */
function whereLow(each: Case, noiseGain: number): string {
  const { noiseGain: midband } = each.stage.analysis;
  const isMidband = midband !== null && noiseGainText(midband) === noiseGainText(noiseGain);
  return isMidband ? '' : ' where the loop gain crosses 1';
}

function marginTooSmall(each: Case): Check | null {
  const { phaseMarginOverDeg, phaseMarginTightDeg } = each.facts.policy;
  const margin = each.point.phaseMarginDeg;
  if (each.point.noCrossing || margin === null || !isBelow(margin, phaseMarginTightDeg)) return null;
  const isOver = isBelow(margin, phaseMarginOverDeg);
  if (!isOver && isOutputResistanceMissing(each)) return null;
  const verdict: Verdict = isOver ? 'over' : 'tight';
  const limit = isOver ? phaseMarginOverDeg : phaseMarginTightDeg;
  return makeCheck('stability', TITLE, verdict, () => marginSentence(each, margin, limit), figures(each, limit));
}

function marginSentence(each: Case, margin: number, limit: number): string {
  const { phaseMarginOverDeg, phaseMarginTightDeg } = each.facts.policy;
  const isBound = each.stability.secondPoleText === null;
  const value = valueText(margin, 'deg', [0, phaseMarginOverDeg, phaseMarginTightDeg]);
  const size = isBound ? `at most ${value}, because the second pole is not known` : value;
  const where = each.point.crossingHz === null ? '' : ` at ${valueText(each.point.crossingHz, 'Hz')}`;
  const oscillates = margin < 0 ? ' It oscillates.' : '';
  return `Its phase margin${where} is ${size}, ${whichEnd(each, each.stability.worse)}; the limit is ${setNumber(limit)}°.${oscillates}`;
}

function figures(each: Case, limit: number): () => CheckFigures {
  return () => ({ actual: phaseMarginFigure(each)(), limit: limitFigure(limit, 'deg') });
}

function phaseMarginFigure(each: Case): () => Figure {
  return () => stageFigure(each.facts, each.stage, 'phaseMargin');
}

function isOutputResistanceMissing(each: Case): boolean {
  return each.stability.loadCapacitive && !each.stability.outputResistanceKnown;
}

function outputResistanceMissing(each: Case): Check | null {
  if (!isOutputResistanceMissing(each)) return null;
  const sentence = (): string =>
    `The load is capacitive and ${partName(each.stage)} has no output resistance entered: ` +
    'stability cannot be told. Enter it on its device page.';
  return unknownCheck('stability', TITLE, sentence, phaseMarginFigure(each));
}

/** No second pole and no phase margin: the one-pole margin is only an upper bound. */
function silentDatasheet(each: Case): Check | null {
  if (each.stability.secondPoleText !== null || each.point.noCrossing) return null;
  return each.stage.device?.kind === 'current-feedback' ? silentCurrentFeedback(each) : silentVoltageFeedback(each);
}

function silentVoltageFeedback(each: Case): Check {
  const least = minimumStableGain(each);
  const noiseGain = lowestNoiseGain(each);
  if (least === null || noiseGain === null) {
    const sentence = (): string =>
      `${partName(each.stage)} has neither a phase margin, a second pole nor a minimum stable gain entered: ` +
      'stability cannot be told. Enter one on its device page.';
    return unknownCheck('stability', TITLE, sentence, phaseMarginFigure(each));
  }
  const sentence = (): string =>
    `Judged by the minimum stable gain only: its noise gain of ${noiseGainText(noiseGain)} where the loop gain crosses 1 ` +
    `reaches ${noiseGainText(least)}. ${partName(each.stage)} has no phase margin entered.`;
  return makeCheck('stability', TITLE, 'clear', sentence, figures(each, each.facts.policy.phaseMarginTightDeg));
}

/** Current feedback: the maker's reference circuit is stable, so a loop that is no faster is taken to be. */
function silentCurrentFeedback(each: Case): Check {
  const share = feedbackResistorShare(each.stage);
  const { stage } = each.stage;
  const hasCapacitor = stage.kind === 'current-feedback' && (stage.feedbackF ?? 0) > 0;
  if (share === null || isBelow(share, LOWEST_FEEDBACK_SHARE) || hasCapacitor) {
    const why = hasCapacitor ? 'and there is a capacitor across Rf' : 'and Rf is smaller than in the reference circuit';
    const sentence = (): string =>
      `${partName(each.stage)} has no second pole entered ${why}: stability cannot be told. Enter it on its device page.`;
    return unknownCheck('stability', TITLE, sentence, phaseMarginFigure(each));
  }
  const sentence = (): string =>
    "Judged by the datasheet's reference circuit only: the loop here is no faster. " +
    `${partName(each.stage)} has no second pole entered.`;
  return makeCheck('stability', TITLE, 'clear', sentence, figures(each, each.facts.policy.phaseMarginTightDeg));
}

function judged(each: Case): Check {
  const limit = each.facts.policy.phaseMarginTightDeg;
  const margin = each.point.phaseMarginDeg;
  if (each.point.noCrossing) {
    return makeCheck('stability', TITLE, 'clear', () => 'Its loop gain never crosses 1.', figures(each, limit));
  }
  if (margin === null) {
    return unknownCheck('stability', TITLE, () => 'The phase margin cannot be told.', phaseMarginFigure(each));
  }
  const where =
    each.point.crossingHz === null ? '' : ` at ${setFrequency(Number(each.point.crossingHz.toPrecision(3)))}`;
  const sentence = (): string =>
    `Its phase margin${where} is ${valueText(margin, 'deg', [limit])}, ${whichEnd(each, each.stability.worse)}.`;
  return makeCheck('stability', TITLE, 'clear', sentence, figures(each, limit));
}

import type { Check, CheckId, Figure, HeadlineItem, Verdict } from '../report';
import { requiredGainText } from '../checks/gain-checks';
import { badness, worstVerdict } from '../checks/verdict-order';
import { isAbove, isBelow } from '../text/deciding-digits';
import { decibelLimitText, setFrequency, targetText } from '../text/phrases';
import { decimalAmount, typed } from '../text/si-format';
import { chainFigure, gainLimits } from './chain-figures';
import { worstHeadroom, worstHeadroomStage } from './derived';
import type { ChainFacts } from './facts';
import { noiseUnit } from './stage-figures';

const NOTHING_REQUIRED = 'nothing required';

/** Checks of the project's case that the headline takes its verdicts from. */
export interface HeadlineChecks {
  readonly stageChecks: readonly (readonly Check[])[];
  readonly chainChecks: readonly Check[];
}

/**
 * Six figures of one GBW case with the requirement beside each, in the order gain, flatness, bandwidth, headroom, noise,
 * cost. Verdicts stay on the project's case, whichever case is shown.
 *
 * @param facts the case shown
 * @param checks the checks of the project's case
 */
export function headline(facts: ChainFacts, checks: HeadlineChecks): readonly HeadlineItem[] {
  return [
    gainItem(facts, checks),
    flatnessItem(facts, checks),
    bandwidthItem(facts, checks),
    headroomItem(facts, checks),
    noiseItem(facts, checks),
    costItem(facts, checks),
  ];
}

function verdictOf(checks: HeadlineChecks, ids: readonly CheckId[]): Verdict | null {
  const found = checks.chainChecks.filter((check) => ids.includes(check.id));
  return found.length === 0 ? null : worstVerdict(found.map((check) => check.verdict));
}

function gainItem(facts: ChainFacts, checks: HeadlineChecks): HeadlineItem {
  const { band, requirements } = facts.input.specification;
  const figure = chainFigure(facts, 'gainOperating');
  const limits = gainLimits(requirements);
  return {
    key: 'gain',
    label: `Gain at ${setFrequency(band.operatingHz)}`,
    figure,
    money: null,
    verdict: verdictOf(checks, ['gain']),
    requirement: limits.length === 0 ? NOTHING_REQUIRED : gainRequirement(facts, figure),
    chainFigure: 'gainOperating',
  };
}

function gainRequirement(facts: ChainFacts, figure: Figure): string {
  const { gainDb, minimumGainDb, maximumGainDb } = facts.input.specification.requirements;
  const least = gainDb ? gainDb.target - gainDb.tolerance : minimumGainDb;
  const most = gainDb ? gainDb.target + gainDb.tolerance : maximumGainDb;
  const required = requiredGainText(facts);
  const bare = (limit: number): string => decibelLimitText(limit).replace(/ dB$/, '');
  if (figure.value === null) return required;
  if (least !== undefined && isBelow(figure.value, least)) return `below ${bare(least)} (${required})`;
  if (most !== undefined && isAbove(figure.value, most)) return `above ${bare(most)} (${required})`;
  return required;
}

function flatnessItem(facts: ChainFacts, checks: HeadlineChecks): HeadlineItem {
  const { band, requirements } = facts.input.specification;
  const limit = requirements.flatnessDb;
  return {
    key: 'flatness',
    label: `Flatness ${bandText(band.lowHz, band.highHz)}`,
    figure: chainFigure(facts, 'flatness'),
    money: null,
    verdict: verdictOf(checks, ['flatness']),
    requirement: limit === undefined ? NOTHING_REQUIRED : `limit ${decibelLimitText(limit)}`,
    chainFigure: 'flatness',
  };
}

/** "3 – 7 MHz" when both edges share a unit, else "900 kHz – 1.1 MHz". */
function bandText(lowHz: number, highHz: number): string {
  const low = setFrequency(lowHz);
  const high = setFrequency(highHz);
  const [number, unit] = low.split(' ');
  return high.endsWith(` ${unit}`) ? `${number} – ${high}` : `${low} – ${high}`;
}

function bandwidthItem(facts: ChainFacts, checks: HeadlineChecks): HeadlineItem {
  const { band, requirements } = facts.input.specification;
  const required = requirements.upperCornerHz;
  return {
    key: 'bandwidth',
    label: 'Upper corner, −3 dB',
    figure: chainFigure(facts, 'cornerUpper'),
    money: null,
    verdict: verdictOf(checks, ['upper-corner']),
    requirement:
      required === undefined ? `band ends at ${setFrequency(band.highHz)}` : `at least ${setFrequency(required)}`,
    chainFigure: 'cornerUpper',
  };
}

function headroomItem(facts: ChainFacts, checks: HeadlineChecks): HeadlineItem {
  const stage = worstHeadroomStage(facts);
  const gbwChecks = checks.stageChecks.flat().filter((check) => check.id === 'gbw');
  const target = `target ${targetText(facts.policy.headroomTarget)}`;
  const where = stage ? `${stage.label} at ${setFrequency(worstHeadroom(facts, stage).atHz)}; ${target}` : target;
  return {
    key: 'headroom',
    label: 'Worst headroom',
    figure: chainFigure(facts, 'worstHeadroom'),
    money: null,
    verdict: gbwChecks.length === 0 ? null : worstVerdict(gbwChecks.map((check) => check.verdict)),
    requirement: gbwChecks.length === 0 ? 'no stage has a GBW' : where,
    chainFigure: 'worstHeadroom',
  };
}

function noiseItem(facts: ChainFacts, checks: HeadlineChecks): HeadlineItem {
  const { inputNoise, noiseFigureDb } = facts.input.specification.requirements;
  const showsFigure = noiseFigureDb !== undefined && (inputNoise === undefined || figureIsWorse(checks));
  const densityLimit = inputNoise === undefined ? NOTHING_REQUIRED : `limit ${typed(inputNoise, noiseUnit(facts))}`;
  return {
    key: 'noise',
    label: showsFigure ? 'Noise figure' : 'Input noise',
    figure: chainFigure(facts, showsFigure ? 'noiseFigure' : 'inputNoise'),
    money: null,
    verdict: verdictOf(checks, ['input-noise', 'noise-figure']),
    requirement: showsFigure ? `limit ${decibelLimitText(noiseFigureDb)}` : densityLimit,
    chainFigure: showsFigure ? 'noiseFigure' : 'inputNoise',
  };
}

/** Where density and noise figure are both limited, the worse one is shown: the verdict has to be of what stands beside it. */
function figureIsWorse(checks: HeadlineChecks): boolean {
  const of = (id: CheckId): number => badness(verdictOf(checks, [id]) ?? 'clear');
  return of('noise-figure') > of('input-noise');
}

function costItem(facts: ChainFacts, checks: HeadlineChecks): HeadlineItem {
  return {
    key: 'cost',
    label: `Devices, per board at ${facts.input.buildQuantity}`,
    figure: null,
    money: facts.cost.total,
    verdict: verdictOf(checks, ['cost']),
    requirement: costRequirement(facts),
    chainFigure: null,
  };
}

function costRequirement(facts: ChainFacts): string {
  const limit = facts.input.specification.requirements.costMicros;
  if (limit === undefined) return NOTHING_REQUIRED;
  const { amountMicros, currency } = facts.cost.total;
  const limitText = `${decimalAmount(limit)} ${currency}`;
  if (amountMicros === null) return `limit ${limitText}`;
  const side = amountMicros > limit ? 'over' : 'under';
  return `${decimalAmount(Math.abs(limit - amountMicros))} ${side} ${limitText}`;
}

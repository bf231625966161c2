import type { Check, CheckId, Remedy, Verdict } from '../../report';
import { tryEvaluate } from '../../report/evaluate';
import type { StageFacts } from '../../report/facts';
import { decimalAmount, formatFigure } from '../../text/si-format';
import { listText } from '../../text/phrases';
import type { Device, Stage } from '../../types';
import type { Judgement } from '../judge';
import { worstVerdict } from '../verdict-order';

/** Requirements named one by one in a remedy; the rest is counted. */
const MOST_FAILURES_NAMED = 2;

/** A chain with one stage replaced, evaluated by the full model. */
export interface Trial {
  readonly before: Judgement;
  readonly after: Judgement;
  /** Where the replacement stands in the new chain. */
  readonly firstIndex: number;
  readonly stages: readonly Stage[];
}

/** Runs replacements through the full model, up to a number of them for one report. */
export interface Trials {
  readonly before: Judgement;
  /** Devices that may be proposed: those of the input and the alternatives. */
  readonly devices: readonly Device[];
  /** Null: refused by the model, or the budget of evaluations is spent. */
  replace(stageIndex: number, stages: readonly Stage[]): Trial | null;
}

/**
 * @param before the chain as it is
 * @param mostEvaluations how many chains may be evaluated for the remedies of one report
 * @param alternatives devices beside those of the input
 */
export function createTrials(before: Judgement, mostEvaluations: number, alternatives: readonly Device[]): Trials {
  let left = mostEvaluations;
  const given = new Set(before.facts.input.devices.map((device) => device.id));
  const devices = [...before.facts.input.devices, ...alternatives.filter((device) => !given.has(device.id))];
  return {
    before,
    devices,
    replace(stageIndex, stages) {
      if (left <= 0) return null;
      left -= 1;
      const { input } = before.facts;
      const all = [...input.stages.slice(0, stageIndex), ...stages, ...input.stages.slice(stageIndex + 1)];
      const after = tryEvaluate({ ...input, stages: all, devices: devicesOf(all, devices) });
      return after ? { before, after, firstIndex: stageIndex, stages } : null;
    },
  };
}

/** Only the devices that are used: the others need not be validated again for every trial. */
export function devicesOf(stages: readonly Stage[], devices: readonly Device[]): readonly Device[] {
  const used = new Set(stages.flatMap((stage) => ('deviceId' in stage ? [stage.deviceId] : [])));
  return devices.filter((device) => used.has(device.id));
}

/** A remedy, and the part of its sentence that a verdict quotes: without the consequences for the chain. */
export interface FoundRemedy {
  readonly remedy: Remedy;
  readonly brief: string;
}

/** A remedy that only tells what is needed. */
export function hint(sentence: string, brief = sentence): FoundRemedy {
  return { brief, remedy: { sentence, verdict: 'clear' } };
}

/** A remedy that can be applied, with what else it changes. */
export function proposal(trial: Trial, brief: string, action: string): FoundRemedy {
  const sentence = brief + failureText(trial);
  return { brief, remedy: { sentence, verdict: trialVerdict(trial), action, stages: trial.stages } };
}

/** Verdict of one check of the replaced stages: the worst of them. */
export function trialCheckVerdict(trial: Trial, checkId: CheckId): Verdict {
  const own = trial.after.stageChecks.slice(trial.firstIndex, trial.firstIndex + trial.stages.length).flat();
  return worstVerdict(own.filter((check) => check.id === checkId).map((check) => check.verdict));
}

/** The replaced stages as they are afterwards. */
export function trialStages(trial: Trial): readonly StageFacts[] {
  return trial.after.facts.stages.slice(trial.firstIndex, trial.firstIndex + trial.stages.length);
}

/** Worst verdict of the replaced stages. */
export function trialVerdict(trial: Trial): Remedy['verdict'] {
  const own = trial.after.stageVerdicts.slice(trial.firstIndex, trial.firstIndex + trial.stages.length);
  return worstVerdict(own);
}

/** True when no check is over that was not before: less gain can cost a device its stability. */
export function isNoWorse(trial: Trial, stage: StageFacts): boolean {
  const before = trial.before.stageChecks[stage.index];
  const after = trial.after.stageChecks.slice(trial.firstIndex, trial.firstIndex + trial.stages.length).flat();
  return after.every((check) => {
    const same = before.find((each) => each.id === check.id);
    return check.verdict !== 'over' || same?.verdict === 'over';
  });
}

/** True when the chain's polarity is another one afterwards: never left unsaid. */
export function turnsPolarity(trial: Trial): boolean {
  return trial.before.facts.chain.inverted !== trial.after.facts.chain.inverted;
}

/** Requirements of the chain that fail afterwards; empty, or starting with a space. */
function failureText(trial: Trial): string {
  const failing = trial.after.chainChecks.filter((check) => check.verdict === 'over' && check.id !== 'polarity');
  if (failing.length === 0) return '';
  const before = new Set(trial.before.chainChecks.filter((check) => check.verdict === 'over').map((check) => check.id));
  const still = failing.every((check) => before.has(check.id)) ? 'still ' : '';
  return ` The chain would ${still}fail: ${failures(trial, failing)}.`;
}

function failures(trial: Trial, failing: readonly Check[]): string {
  const named = failing.slice(0, MOST_FAILURES_NAMED).map((check) => failureOf(trial, check));
  const others = failing.length - named.length;
  return listText(others > 0 ? [...named, `${others} more`] : named);
}

function failureOf(trial: Trial, check: Check): string {
  if (check.id === 'cost') {
    const { amountMicros, currency } = trial.after.facts.cost.total;
    return `cost ${decimalAmount(amountMicros ?? 0)} ${currency}`;
  }
  const title = check.title.replace(/^chain /, '');
  return check.actual && check.actual.value !== null ? `${title} ${formatFigure(check.actual)}` : title;
}

/** "for 0.83 USD more", "for 0.10 USD less", "at the same cost"; empty when a price is missing. */
export function priceDifferenceText(trial: Trial): string {
  const before = trial.before.facts.cost.total;
  const after = trial.after.facts.cost.total;
  if (before.amountMicros === null || after.amountMicros === null) return '';
  const difference = after.amountMicros - before.amountMicros;
  if (difference === 0) return ' at the same cost';
  return ` for ${decimalAmount(Math.abs(difference))} ${after.currency} ${difference > 0 ? 'more' : 'less'}`;
}

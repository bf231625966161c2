import type { Judgement } from '../checks/judge';
import { badness, worstCheck } from '../checks/verdict-order';
import { withDevice } from '../checks/remedies/device-remedy';
import { devicesOf } from '../checks/remedies/trials';
import { EngineInputError } from '../errors';
import type { CandidateReport, CandidatesReport, Check, Money } from '../report';
import { evaluate } from '../report/evaluate';
import { figureOf } from '../report/figures';
import { unknown } from '../maybe';
import { stageFigure } from '../report/stage-figures';
import { decimalAmount, formatFigure } from '../text/si-format';
import { capitalised, listText } from '../text/phrases';
import type { ChainInput, Device, Stage } from '../types';
import { stageNeeds } from './needs';

/**
 * Tries devices in one very stage: for each the whole chain is evaluated again in the project's case. Cheapest that pass
 * first, then tight, unknown and over, by price within.
 *
 * @param input whole chain
 * @param stageId the stage to try them in
 * @param devices devices to try; those of another kind than the stage are left out
 * @throws EngineInputError when the chain is refused as it is, or has no such stage
 */
export function tryDevicesInStage(input: ChainInput, stageId: string, devices: readonly Device[]): CandidatesReport {
  const index = input.stages.findIndex((stage) => stage.id === stageId);
  if (index < 0) {
    throw new EngineInputError([{ code: 'required', path: 'stageId', message: 'The chain has no such stage.' }]);
  }
  const present = evaluate(input);
  const stage = input.stages[index];
  const candidates = devices
    .map((device) => candidate(input, index, device, withDevice(stage, device)))
    .filter((each) => each !== null)
    .sort(compareCandidates);
  return { stageId, needs: stageNeeds(present.facts, present.facts.stages[index]), candidates };
}

/**
 * Order of tried devices: clear, tight, unknown, over; the cheaper first, without a price last; then by part number.
 *
 * @example [...candidates].sort(compareCandidates)[0] // the cheapest that passes
 */
export function compareCandidates(a: CandidateReport, b: CandidateReport): number {
  const price = (each: CandidateReport): number => each.unitCost.amountMicros ?? Number.POSITIVE_INFINITY;
  const verdicts = badness(a.verdict) - badness(b.verdict);
  if (verdicts !== 0) return verdicts;
  if (price(a) !== price(b)) return price(a) < price(b) ? -1 : 1;
  return a.partNumber.localeCompare(b.partNumber, 'en');
}

function candidate(input: ChainInput, index: number, device: Device, stage: Stage | null): CandidateReport | null {
  if (!stage) return null;
  const stages = input.stages.map((each, position) => (position === index ? stage : each));
  const devices = devicesOf(stages, [...input.devices.filter((each) => each.id !== device.id), device]);
  const current = 'deviceId' in input.stages[index] && input.stages[index].deviceId === device.id;
  try {
    return candidateReport(evaluate({ ...input, stages, devices }), index, device, current);
  } catch (error) {
    if (error instanceof EngineInputError) return refused(input, device, error, current);
    throw error;
  }
}

function candidateReport(judgement: Judgement, index: number, device: Device, current: boolean): CandidateReport {
  const { facts } = judgement;
  const stage = facts.stages[index];
  const worst = worstCheck(judgement.stageChecks[index]);
  return {
    deviceId: device.id,
    partNumber: device.partNumber,
    grade: device.grade,
    current,
    gbwHave: stageFigure(facts, stage, 'gbwHave'),
    headroom: stageFigure(facts, stage, 'headroom'),
    cornerUpper: stageFigure(facts, stage, 'cornerUpper'),
    droopOperating: stageFigure(facts, stage, 'droopOperating'),
    verdict: judgement.stageVerdicts[index],
    reason: worst && worst.verdict !== 'clear' ? worst.sentence : '',
    chainVerdict: judgement.verdict,
    chainText: chainText(judgement, index),
    unitCost: stage.cost.money,
    chainCost: facts.cost.total,
  };
}

/** What the chain becomes: the requirements that fail, else the stage that is worst, else what it passes. */
function chainText(judgement: Judgement, index: number): string {
  const failing = judgement.chainChecks.filter((check) => check.verdict === 'over');
  if (failing.length > 0)
    return `${listText(failing.map((check) => checkText(judgement, check)))} ${failing.length > 1 ? 'fail' : 'fails'}`;
  const others = judgement.facts.stages.filter((stage) => stage.index !== index);
  const over = others.filter((stage) => judgement.stageVerdicts[stage.index] === 'over');
  if (over.length > 0) return `${listText(over.map((stage) => stage.label))} still over`;
  const shown = judgement.chainChecks.find((check) => check.id === 'flatness') ?? judgement.chainChecks[0];
  const unknowns = judgement.chainChecks.filter((check) => check.verdict === 'unknown');
  if (unknowns.length > 0) return `${listText(unknowns.map((check) => check.title))} not known`;
  return shown ? `${checkText(judgement, shown)}, passes` : 'nothing required of the chain';
}

function checkText(judgement: Judgement, check: Check): string {
  const title = check.title.replace(/^chain /, '');
  if (check.id === 'cost') {
    const limit = judgement.facts.input.specification.requirements.costMicros ?? 0;
    return `${title} ${decimalAmount(judgement.facts.cost.total.amountMicros ?? 0)} of ${decimalAmount(limit)}`;
  }
  return check.actual && check.actual.value !== null ? `${title} ${formatFigure(check.actual)}` : title;
}

/** The model refuses the chain with this device: over, with the reason. */
function refused(input: ChainInput, device: Device, error: EngineInputError, current: boolean): CandidateReport {
  const reason = capitalised(error.issues[0]?.message ?? 'The model refuses this device here.');
  const none = figureOf(unknown(reason), 'Hz');
  const money: Money = { amountMicros: null, currency: input.currency, reason };
  return {
    deviceId: device.id,
    partNumber: device.partNumber,
    grade: device.grade,
    current,
    gbwHave: none,
    headroom: figureOf(unknown(reason), 'ratio'),
    cornerUpper: none,
    droopOperating: figureOf(unknown(reason), 'dB'),
    verdict: 'over',
    reason,
    chainVerdict: 'over',
    chainText: 'refused',
    unitCost: money,
    chainCost: money,
  };
}

import type { Maybe } from '../analysis';
import type { Check, CheckId, Figure } from '../report';
import { outputCurrentHeadroom, slewAvailable, slewHeadroom, swingHeadroom } from '../report/derived';
import { isFeedbackStage, partName } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import { figure, limitFigure } from '../report/figures';
import { dbToRatio, ratioToDb } from '../report/maybe';
import { stageFigure } from '../report/stage-figures';
import { decibelText, deviceHas, ratioText, setFrequency, targetText, valueText } from '../text/phrases';
import { typicalValue } from './current-feedback-check';
import { makeCheck, unknownCheck, verdictAtLeast } from './make-check';

const MILLIWATT = 1e-3;

/** Slew rate that the largest signal needs at the top of the band, with ideal gain, against what the device has. */
export function slewCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  if (!isFeedbackStage(stage.stage)) return null;
  const actual = stageFigure(facts, stage, 'slewHeadroom');
  const needed = stage.analysis.slewNeededVPerS;
  const unresolved = unresolvedLevel('slew', 'slew rate', [needed, slewAvailable(stage)], actual);
  if (unresolved) return unresolved;
  const headroom = slewHeadroom(stage);
  if (headroom.value === null) return makeCheck('slew', 'slew rate', 'clear', 'No signal: no slew needed.', { actual });
  const { slewTarget } = facts.policy;
  const verdict = verdictAtLeast(headroom.value, 1, slewTarget);
  const peak = stage.analysis.outputPeakV.value ?? 0;
  const available = stage.analysis.slewAvailable;
  const { highHz } = facts.input.specification.band;
  const need = valueText(needed.value ?? 0, 'V/s', [available?.value ?? 0]);
  const has = available
    ? deviceHas(partName(stage), available, 'V/s', [needed.value ?? 0])
    : 'the slew rate is not known';
  const target = verdict === 'tight' ? `, target ${targetText(slewTarget)}` : '';
  const sentence = `${valueText(peak, 'V')} peak at ${setFrequency(highHz)} needs ${need}; ${has}: ${ratioText(headroom.value, [1, slewTarget])}${target}.`;
  const limit = limitFigure(verdict === 'over' ? 1 : slewTarget, 'ratio');
  return makeCheck('slew', 'slew rate', verdict, sentence, { actual, limit });
}

/** Output swing against what the rails, the device's distance from them and the offset leave. */
export function swingCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  if (!isFeedbackStage(stage.stage)) return null;
  const { swingAvailableV, outputPeakV } = stage.analysis;
  const actual = stageFigure(facts, stage, 'swingHeadroom');
  const unresolved = unresolvedLevel('swing', 'output swing', [outputPeakV, swingAvailableV], actual);
  if (unresolved) return unresolved;
  const available = swingAvailableV.value ?? 0;
  const peak = outputPeakV.value ?? 0;
  if (available <= 0) {
    const sentence = 'Its output sits on a rail: nothing is left to swing.';
    return makeCheck('swing', 'output swing', 'over', sentence, { actual, limit: limitFigure(1, 'ratio') });
  }
  const tightRatio = dbToRatio(facts.policy.levelMarginDb);
  const headroom = swingHeadroom(stage);
  const verdict = headroom.value === null ? 'clear' : verdictAtLeast(headroom.value, 1, tightRatio);
  const margin = headroom.value === null ? '' : `: ${ratioText(headroom.value, [1, tightRatio])}`;
  const close = verdict === 'tight' ? `, within ${facts.policy.levelMarginDb} dB of the limit` : '';
  const sentence =
    `Its output has to swing ${valueText(peak, 'V', [available])} peak; ` +
    `${valueText(available, 'V', [peak])} peak is left between the rails${margin}${close}.`;
  return makeCheck('swing', 'output swing', verdict, sentence, { actual, limit: limitFigure(1, 'ratio') });
}

/** Peak output current into load and feedback against what the device gives. */
export function outputCurrentCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  if (!isFeedbackStage(stage.stage)) return null;
  const actual = stageFigure(facts, stage, 'outputCurrentHeadroom');
  const needed = stage.analysis.outputCurrentPeakA;
  const headroom = outputCurrentHeadroom(stage);
  if (needed.value === 0)
    return makeCheck('output-current', 'output current', 'clear', 'No signal: no current.', { actual });
  if (needed.value === null || headroom.value === null) {
    const reason = needed.value === null ? needed.reason : headroom.value === null ? headroom.reason : '';
    return unknownCheck('output-current', 'output current', `The output current cannot be judged: ${reason}.`, actual);
  }
  const tightRatio = dbToRatio(facts.policy.levelMarginDb);
  const verdict = verdictAtLeast(headroom.value, 1, tightRatio);
  const available = stage.analysis.outputCurrentAvailable;
  const has = available
    ? deviceHas(partName(stage), available, 'A', [needed.value])
    : 'the output current is not known';
  const close = verdict === 'tight' ? `, within ${facts.policy.levelMarginDb} dB of the limit` : '';
  const need = valueText(needed.value, 'A', [available?.value ?? 0]);
  const sentence = `Load and feedback take ${need} peak; ${has}: ${ratioText(headroom.value, [1, tightRatio])}${close}.`;
  return makeCheck('output-current', 'output current', verdict, sentence, { actual, limit: limitFigure(1, 'ratio') });
}

/** Output power of a block against its 1 dB compression point; only for blocks that state one. */
export function compressionCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const { device } = stage;
  if (device?.kind !== 'matched-block') return null;
  const p1dB = device.outputP1dbDbm?.min ?? typicalValue(device.outputP1dbDbm);
  if (p1dB === null) return null;
  const peak = stage.analysis.outputPeakV;
  if (peak.value === null) {
    return unknownCheck('compression', 'compression', `The output level cannot be told: ${peak.reason}.`);
  }
  if (peak.value === 0) return makeCheck('compression', 'compression', 'clear', 'No signal: no compression.');
  const powerDbm = 10 * Math.log10(peak.value ** 2 / (2 * device.impedanceOhm) / MILLIWATT);
  const marginDb = p1dB - powerDbm;
  const { levelMarginDb } = facts.policy;
  const verdict = marginDb < 0 ? 'over' : marginDb < levelMarginDb ? 'tight' : 'clear';
  const actual = figure(marginDb, 'dB', { limits: [0, levelMarginDb] });
  const column = device.outputP1dbDbm?.min === undefined ? 'typical' : 'minimum';
  const sentence =
    `At the largest input it gives ${figureText(powerDbm)} dBm; ${partName(stage)} compresses by 1 dB at ` +
    `${figureText(p1dB)} dBm (${column}): ${figureText(marginDb)} dB left.`;
  return makeCheck('compression', 'compression', verdict, sentence, {
    actual,
    limit: limitFigure(levelMarginDb, 'dB'),
  });
}

function figureText(value: number): string {
  return decibelText(value).replace(/ dB$/, '');
}

/** Level or device value missing: unknown, naming what. */
function unresolvedLevel(id: CheckId, title: string, inputs: readonly Maybe[], actual: Figure): Check | null {
  const missing = inputs.find((input) => input.value === null);
  return missing && missing.value === null
    ? unknownCheck(id, title, `The ${title} cannot be judged: ${missing.reason}.`, actual)
    : null;
}

/** Total supply against the device's range. */
export function supplyVoltageCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const { device } = stage;
  if (!device || (device.kind === 'matched-block' && !device.supplyVoltageV)) return null;
  const { supply } = facts.input.specification;
  const totalV = supply.positiveV - supply.negativeV;
  const least = device.supplyVoltageV?.min;
  const most = device.supplyVoltageV?.max;
  if (least === undefined && most === undefined) {
    const sentence = `${device.partNumber} has no supply range entered: enter it on its device page.`;
    return unknownCheck('supply-voltage', 'supply voltage', sentence, figure(totalV, 'V'));
  }
  const isOver = (least !== undefined && totalV < least) || (most !== undefined && totalV > most);
  const limit = isOver && most !== undefined && totalV > most ? most : (least ?? most ?? 0);
  const sentence = `The supply is ${valueText(totalV, 'V', [limit])} in all; ${device.partNumber} takes ${rangeText(least, most)}.`;
  return makeCheck('supply-voltage', 'supply voltage', isOver ? 'over' : 'clear', sentence, {
    actual: figure(totalV, 'V', { limits: [least, most] }),
    limit: limitFigure(limit, 'V'),
  });
}

function rangeText(least: number | undefined, most: number | undefined): string {
  if (least === undefined) return `at most ${most} V`;
  return most === undefined ? `at least ${least} V` : `${least} to ${most} V`;
}

/** Loop gain at the operating frequency (accuracy, distortion): only where the team requires one. */
export function loopGainCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const required = facts.input.specification.requirements.loopGainDb;
  if (required === undefined || !isFeedbackStage(stage.stage)) return null;
  const { loopGain } = stage.analysis;
  const actual = stageFigure(facts, stage, 'loopGain');
  if (loopGain.value === null) {
    return unknownCheck('loop-gain', 'loop gain', `The loop gain cannot be told: ${loopGain.reason}.`, actual);
  }
  const decibels = ratioToDb(loopGain.value);
  const at = setFrequency(facts.input.specification.band.operatingHz);
  const sentence = `Its loop gain at ${at} is ${decibelText(decibels, [required])}; required is ${required} dB.`;
  return makeCheck('loop-gain', 'loop gain', verdictAtLeast(decibels, required, required), sentence, {
    actual,
    limit: limitFigure(required, 'dB'),
  });
}

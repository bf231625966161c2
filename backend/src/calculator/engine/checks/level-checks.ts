import type { Maybe, UsedValue } from '../analysis';
import type { Check, CheckId, Figure, Unit } from '../report';
import { outputCurrentHeadroom, slewAvailable, slewHeadroom, swingHeadroom } from '../report/derived';
import { isFeedbackStage, partName } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import { limitFigure } from '../report/figures';
import { dbToRatio, ratioToDb } from '../units';
import { stageFigure } from '../report/stage-figures';
import {
  cannotBeJudged,
  decibelText,
  deviceHas,
  ratioText,
  setFrequency,
  setNumber,
  targetText,
  valueText,
} from '../text/phrases';
import { makeCheck, unknownCheck, verdictAtLeast } from './make-check';

/** Level or device value missing: unknown, naming what. */
function missingInput(id: CheckId, title: string, inputs: readonly Maybe[], actual: () => Figure): Check | null {
  const missing = inputs.find((input) => input.value === null);
  if (!missing || missing.value !== null) return null;
  const { reason } = missing;
  return unknownCheck(id, title, () => cannotBeJudged(`the ${title}`, reason), actual);
}

/** "MRWG-G072 guarantees 40.0 V/µs (minimum, p. 4)", or that it is not known. */
function availableText(stage: StageFacts, available: UsedValue | null, unit: Unit, needed: number): string {
  return available ? deviceHas(partName(stage), available, unit, [needed]) : 'what the device has is not known';
}

/** Slew rate that the largest signal needs at the top of the band, with ideal gain, against what the device has. */
export function slewCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  if (!isFeedbackStage(stage.stage)) return null;
  const actual = (): Figure => stageFigure(facts, stage, 'slewHeadroom');
  const needed = stage.analysis.slewNeededVPerS;
  const missing = missingInput('slew', 'slew rate', [needed, slewAvailable(stage)], actual);
  if (missing) return missing;
  const headroom = slewHeadroom(stage).value;
  if (headroom === null)
    return makeCheck(
      'slew',
      'slew rate',
      'clear',
      () => 'No signal: no slew needed.',
      () => ({ actual: actual() }),
    );
  const { slewTarget } = facts.policy;
  const verdict = verdictAtLeast(headroom, 1, slewTarget);
  const target = verdict === 'tight' ? `, target ${targetText(slewTarget)}` : '';
  const sentence = (): string => `${slewSentence(facts, stage)}: ${ratioText(headroom, [1, slewTarget])}${target}.`;
  return makeCheck('slew', 'slew rate', verdict, sentence, () => ({
    actual: actual(),
    limit: limitFigure(verdict === 'over' ? 1 : slewTarget, 'ratio'),
  }));
}

function slewSentence(facts: ChainFacts, stage: StageFacts): string {
  const needed = stage.analysis.slewNeededVPerS.value ?? 0;
  const available = stage.analysis.slewAvailable;
  const peak = valueText(stage.analysis.outputPeakV.value ?? 0, 'V');
  const need = valueText(needed, 'V/s', [available?.value ?? 0]);
  const at = setFrequency(facts.input.specification.band.highHz);
  return `${peak} peak at ${at} needs ${need}; ${availableText(stage, available, 'V/s', needed)}`;
}

/** Output swing against what the rails, the device's distance from them and the offset leave. */
export function swingCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  if (!isFeedbackStage(stage.stage)) return null;
  const { swingAvailableV, outputPeakV } = stage.analysis;
  const actual = (): Figure => stageFigure(facts, stage, 'swingHeadroom');
  const missing = missingInput('swing', 'output swing', [outputPeakV, swingAvailableV], actual);
  if (missing) return missing;
  const available = swingAvailableV.value ?? 0;
  if (available <= 0) {
    const sentence = (): string => 'Its output sits on a rail: nothing is left to swing.';
    return makeCheck('swing', 'output swing', 'over', sentence, () => ({
      actual: actual(),
      limit: limitFigure(1, 'ratio'),
    }));
  }
  const headroom = swingHeadroom(stage).value;
  if (headroom === null) {
    return makeCheck(
      'swing',
      'output swing',
      'clear',
      () => 'No signal: nothing to swing.',
      () => ({ actual: actual() }),
    );
  }
  const peak = outputPeakV.value ?? 0;
  const sides = (): string =>
    `Its output has to swing ${valueText(peak, 'V', [available])} peak; ` +
    `${valueText(available, 'V', [peak])} peak is left between the rails${offsetRemark(stage)}`;
  return levelCheck(facts, { id: 'swing', title: 'output swing', headroom, sides, actual });
}

/** An offset that is not known is not in the swing: never left unsaid. */
function offsetRemark(stage: StageFacts): string {
  return stage.analysis.outputOffsetV.value === null ? ' (offset not known, taken as 0)' : '';
}

/** Peak output current into load and feedback against what the device gives. */
export function outputCurrentCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  if (!isFeedbackStage(stage.stage)) return null;
  const actual = (): Figure => stageFigure(facts, stage, 'outputCurrentHeadroom');
  const needed = stage.analysis.outputCurrentPeakA;
  if (needed.value === 0) {
    return makeCheck(
      'output-current',
      'output current',
      'clear',
      () => 'No signal: no current.',
      () => ({ actual: actual() }),
    );
  }
  const all = outputCurrentHeadroom(stage);
  const missing = missingInput('output-current', 'output current', [needed, all], actual);
  if (missing) return missing;
  const available = stage.analysis.outputCurrentAvailable;
  const need = needed.value ?? 0;
  const sides = (): string =>
    `Load and feedback take ${valueText(need, 'A', [available?.value ?? 0])} peak; ` +
    availableText(stage, available, 'A', need);
  return levelCheck(facts, {
    id: 'output-current',
    title: 'output current',
    headroom: all.value ?? 0,
    sides,
    actual,
  });
}

interface LevelJudgement {
  readonly id: CheckId;
  readonly title: string;
  readonly headroom: number;
  /** Need and have, without the full stop. */
  readonly sides: () => string;
  readonly actual: () => Figure;
}

/** A level that must not exceed its limit and is tight within the policy's margin in dB. */
function levelCheck(facts: ChainFacts, level: LevelJudgement): Check {
  const tightRatio = dbToRatio(facts.policy.levelMarginDb);
  const verdict = verdictAtLeast(level.headroom, 1, tightRatio);
  const close = verdict === 'tight' ? `, within ${setNumber(facts.policy.levelMarginDb)} dB of the limit` : '';
  const sentence = (): string => `${level.sides()}: ${ratioText(level.headroom, [1, tightRatio])}${close}.`;
  return makeCheck(level.id, level.title, verdict, sentence, () => ({
    actual: level.actual(),
    limit: limitFigure(1, 'ratio'),
  }));
}

/** Loop gain at the operating frequency (accuracy, distortion): only where the team requires one. */
export function loopGainCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const required = facts.input.specification.requirements.loopGainDb;
  if (required === undefined || !isFeedbackStage(stage.stage)) return null;
  const { loopGain } = stage.analysis;
  const actual = (): Figure => stageFigure(facts, stage, 'loopGain');
  if (loopGain.value === null) {
    const { reason } = loopGain;
    return unknownCheck('loop-gain', 'loop gain', () => cannotBeJudged('the loop gain', reason), actual);
  }
  const decibels = ratioToDb(loopGain.value);
  const at = setFrequency(facts.input.specification.band.operatingHz);
  const sentence = (): string =>
    `Its loop gain at ${at} is ${decibelText(decibels, [required])}; required is ${setNumber(required)} dB.`;
  return makeCheck('loop-gain', 'loop gain', verdictAtLeast(decibels, required, required), sentence, () => ({
    actual: actual(),
    limit: limitFigure(required, 'dB'),
  }));
}

import type { Check, Verdict } from '../report';
import { partName } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import { figure, limitFigure } from '../report/figures';
import { columnOf } from '../devices/used-values';
import type { UsedValue } from '../analysis';
import type { MatchedBlockDevice } from '../types';
import { isAbove, isBelow } from '../text/deciding-digits';
import { cannotBeJudged, decibelLimitText, decibelText, valueText } from '../text/phrases';
import { makeCheck, unknownCheck } from './make-check';

const MILLIWATT = 1e-3;

/** Power of a sine of this peak value in a resistance, dBm. */
function dbmOf(peakV: number, resistanceOhm: number): number {
  return 10 * Math.log10(peakV ** 2 / (2 * resistanceOhm) / MILLIWATT);
}

/** Output power of a block against its 1 dB compression point; only for blocks that state one. */
export function compressionCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const { device } = stage;
  if (device?.kind !== 'matched-block') return null;
  const limit = columnOf(device.outputP1dbDbm, ['min', 'typ', 'max']);
  if (!limit) return null;
  // The datasheet's point is measured into the block's own impedance, whatever it drives here.
  const peak = stage.analysis.matchedPeakV ?? stage.analysis.outputPeakV;
  if (peak.value === null) {
    const { reason } = peak;
    return unknownCheck('compression', 'compression', () => cannotBeJudged('the output level', reason));
  }
  if (peak.value === 0) return makeCheck('compression', 'compression', 'clear', () => 'No signal: no compression.');
  const { value } = peak;
  const marginDb = limit.value - dbmOf(value, device.impedanceOhm);
  const { levelMarginDb } = facts.policy;
  const verdict = compressionVerdict(marginDb, levelMarginDb);
  return makeCheck(
    'compression',
    'compression',
    verdict,
    () => compressionSentence(stage, device, value, limit),
    () => ({
      actual: figure(marginDb, 'dB', { limits: [0, levelMarginDb] }),
      limit: limitFigure(levelMarginDb, 'dB'),
    }),
  );
}

/** Levels that differ by rounding noise only are equal: a block driven just to its limit is not beyond it. */
const EQUAL_DB = 1e-9;

function compressionVerdict(marginDb: number, levelMarginDb: number): Verdict {
  if (marginDb < -EQUAL_DB) return 'over';
  return marginDb < levelMarginDb - EQUAL_DB ? 'tight' : 'clear';
}

function compressionSentence(stage: StageFacts, device: MatchedBlockDevice, peakV: number, limit: UsedValue): string {
  const limitDbm = limit.value;
  const powerDbm = dbmOf(peakV, device.impedanceOhm);
  return (
    `At the largest input it has ${decibelText(powerDbm, [limitDbm])}m available; ${partName(stage)} compresses by 1 dB at ` +
    `${decibelLimitText(limitDbm)}m (${limit.text}): ${decibelText(limitDbm - powerDbm, [0])} left.`
  );
}

/** Total supply against the device's range. A passive block needs none. */
export function supplyVoltageCheck(facts: ChainFacts, stage: StageFacts): Check | null {
  const { device } = stage;
  if (!device) return null;
  const { min, max } = device.supplyVoltageV ?? {};
  const { supply } = facts.input.specification;
  const totalV = supply.positiveV - supply.negativeV;
  if (min === undefined && max === undefined) {
    if (device.kind === 'matched-block') return null;
    const sentence = (): string =>
      cannotBeJudged('the supply voltage', `Supply range of ${device.partNumber} is not entered.`);
    return unknownCheck('supply-voltage', 'supply voltage', sentence, () => figure(totalV, 'V'));
  }
  const bounds = [min, max].filter((bound) => bound !== undefined);
  const broken = brokenBound(totalV, min, max);
  const sentence = (): string =>
    `The supply is ${valueText(totalV, 'V', bounds)} in all; ${device.partNumber} takes ${rangeText(min, max)}.`;
  return makeCheck('supply-voltage', 'supply voltage', broken === null ? 'clear' : 'over', sentence, () => ({
    actual: figure(totalV, 'V', { limits: [min, max] }),
    limit: limitFigure([broken, max, min].find((bound) => typeof bound === 'number') ?? totalV, 'V'),
  }));
}

function brokenBound(totalV: number, least: number | undefined, most: number | undefined): number | null {
  if (least !== undefined && isBelow(totalV, least)) return least;
  return most !== undefined && isAbove(totalV, most) ? most : null;
}

function rangeText(least: number | undefined, most: number | undefined): string {
  if (least === undefined) return `at most ${most} V`;
  return most === undefined ? `at least ${least} V` : `${least} to ${most} V`;
}

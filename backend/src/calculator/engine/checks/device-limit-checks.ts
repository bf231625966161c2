import type { Check, Verdict } from '../report';
import { partName } from '../report/facts';
import type { ChainFacts, StageFacts } from '../report/facts';
import { figure, limitFigure } from '../report/figures';
import type { MatchedBlockDevice } from '../types';
import { cannotBeJudged, decibelText, valueText } from '../text/phrases';
import { typicalValue } from './current-feedback-check';
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
  const limitDbm = device.outputP1dbDbm?.min ?? typicalValue(device.outputP1dbDbm);
  if (limitDbm === null) return null;
  const peak = stage.analysis.outputPeakV;
  if (peak.value === null) {
    const { reason } = peak;
    return unknownCheck('compression', 'compression', () => cannotBeJudged('the output level', reason));
  }
  if (peak.value === 0) return makeCheck('compression', 'compression', 'clear', () => 'No signal: no compression.');
  const { value } = peak;
  const marginDb = limitDbm - dbmOf(value, device.impedanceOhm);
  const { levelMarginDb } = facts.policy;
  const verdict: Verdict = marginDb < 0 ? 'over' : marginDb < levelMarginDb ? 'tight' : 'clear';
  return makeCheck(
    'compression',
    'compression',
    verdict,
    () => compressionSentence(stage, device, value, limitDbm),
    () => ({
      actual: figure(marginDb, 'dB', { limits: [0, levelMarginDb] }),
      limit: limitFigure(levelMarginDb, 'dB'),
    }),
  );
}

function compressionSentence(stage: StageFacts, device: MatchedBlockDevice, peakV: number, limitDbm: number): string {
  const powerDbm = dbmOf(peakV, device.impedanceOhm);
  const column = device.outputP1dbDbm?.min === undefined ? 'typical' : 'minimum';
  return (
    `At the largest input it gives ${decibelText(powerDbm, [limitDbm])}m; ${partName(stage)} compresses by 1 dB at ` +
    `${decibelText(limitDbm)}m (${column}): ${decibelText(limitDbm - powerDbm, [0])} left.`
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
  const broken = brokenBound(totalV, min, max);
  const sentence = (): string =>
    `The supply is ${valueText(totalV, 'V')} in all; ${device.partNumber} takes ${rangeText(min, max)}.`;
  return makeCheck('supply-voltage', 'supply voltage', broken === null ? 'clear' : 'over', sentence, () => ({
    actual: figure(totalV, 'V', { limits: [min, max] }),
    limit: limitFigure([broken, max, min].find((bound) => typeof bound === 'number') ?? totalV, 'V'),
  }));
}

function brokenBound(totalV: number, least: number | undefined, most: number | undefined): number | null {
  if (least !== undefined && totalV < least) return least;
  return most !== undefined && totalV > most ? most : null;
}

function rangeText(least: number | undefined, most: number | undefined): string {
  if (least === undefined) return `at most ${most} V`;
  return most === undefined ? `at least ${least} V` : `${least} to ${most} V`;
}

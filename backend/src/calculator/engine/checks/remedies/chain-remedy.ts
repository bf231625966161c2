import type { CheckId, Remedy } from '../../report';
import type { StageFacts } from '../../report/facts';
import { formatFigure } from '../../text/si-format';
import { badness } from '../verdict-order';
import { priceInPlace, withDevice } from './device-remedy';
import { consequenceText, priceDifferenceText } from './trials';
import type { Trials } from './trials';

/** Devices tried for a requirement of the chain. */
const MOST_DEVICES = 4;

/** The cheapest device for the stage that loses most with which the chain meets this requirement. */
export function chainDeviceRemedy(trials: Trials, stage: StageFacts, checkId: CheckId): Remedy | null {
  const { input } = trials.before.facts;
  const before = trials.before.chainChecks.find((check) => check.id === checkId);
  const priced = input.devices
    .filter((device) => device.id !== stage.device?.id && withDevice(stage.stage, device) !== null)
    .map((device) => ({ device, price: priceInPlace(input, stage.stage, device) ?? Number.POSITIVE_INFINITY }))
    .sort((a, b) => a.price - b.price || a.device.partNumber.localeCompare(b.device.partNumber, 'en'));
  for (const { device } of priced.slice(0, MOST_DEVICES)) {
    const replacement = withDevice(stage.stage, device);
    const trial = replacement && trials.replace(stage.index, [replacement]);
    const check = trial?.after.chainChecks.find((each) => each.id === checkId);
    const isBetter = check && before && badness(check.verdict) < badness(before.verdict);
    if (!trial || !check || !isBetter || trial.after.stageVerdicts[stage.index] === 'over') continue;
    const figure = check.actual ? ` ${formatFigure(check.actual)}` : '';
    const sentence = `${device.partNumber} as ${stage.label} would give ${check.title}${figure}${priceDifferenceText(trial)}.${consequenceText(trial)}`;
    return {
      sentence,
      verdict: check.verdict,
      action: `Use ${device.partNumber} as ${stage.label}`,
      stages: trial.stages,
    };
  }
  return null;
}

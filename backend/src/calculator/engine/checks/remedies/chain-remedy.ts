import type { CheckId } from '../../report';
import type { StageFacts } from '../../report/facts';
import { formatFigure } from '../../text/si-format';
import { badness } from '../verdict-order';
import { devicesByPrice, withDevice } from './device-remedy';
import { priceDifferenceText, proposal } from './trials';
import type { FoundRemedy, Trial, Trials } from './trials';
import type { Device } from '../../types';

/** Devices tried for a requirement of the chain. */
const MOST_DEVICES = 4;

/** The cheapest device for the stage that loses most with which the chain meets this requirement. */
export function chainDeviceRemedy(trials: Trials, stage: StageFacts, checkId: CheckId): FoundRemedy | null {
  for (const device of devicesByPrice(trials, stage).slice(0, MOST_DEVICES)) {
    const replacement = withDevice(stage.stage, device);
    const trial = replacement && trials.replace(stage.index, [replacement]);
    const remedy = trial && remedyOf(trial, stage, device, checkId);
    if (remedy) return remedy;
  }
  return null;
}

function remedyOf(trial: Trial, stage: StageFacts, device: Device, checkId: CheckId): FoundRemedy | null {
  const before = trial.before.chainChecks.find((check) => check.id === checkId);
  const after = trial.after.chainChecks.find((check) => check.id === checkId);
  if (!before || !after || badness(after.verdict) >= badness(before.verdict)) return null;
  if (trial.after.stageVerdicts[stage.index] === 'over') return null;
  const figure = after.actual ? ` ${formatFigure(after.actual)}` : '';
  const brief = `${device.partNumber} as ${stage.label} would give ${after.title}${figure}${priceDifferenceText(trial)}.`;
  const proposed = proposal(trial, brief, `Use ${device.partNumber} as ${stage.label}`);
  return { ...proposed, remedy: { ...proposed.remedy, verdict: after.verdict } };
}

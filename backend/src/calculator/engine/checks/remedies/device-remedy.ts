import { unitPrice } from '../../cost/unit-price';
import type { CheckId } from '../../report';
import { bandwidthRatio, gbwUsed, slewHeadroom, worstHeadroom } from '../../report/derived';
import type { StageFacts } from '../../report/facts';
import { gainText, ratioText } from '../../text/phrases';
import type { ChainInput, Device, Policy, Stage } from '../../types';
import { priceDifferenceText, proposal, trialCheckVerdict, trialStages, trialVerdict } from './trials';
import type { FoundRemedy, Trial, Trials } from './trials';

/** Devices tried in a stage before the search for a cheaper one is given up. */
const MOST_DEVICES = 6;

/** Rough enough never to leave out a device that the full model would pass. */
const PREFILTER_SHARE = 0.9;

/** The same stage with another device in it; null when the device does not fit the kind of stage. */
export function withDevice(stage: Stage, device: Device): Stage | null {
  return 'deviceId' in stage && stage.kind === device.kind ? { ...stage, deviceId: device.id } : null;
}

/** Price of one piece when this stage alone would use it beside those that use it already. */
export function priceInPlace(input: ChainInput, stage: Stage, device: Device): number | null {
  const others = input.stages.filter(
    (each) => each.id !== stage.id && 'deviceId' in each && each.deviceId === device.id,
  );
  const needed = input.buildQuantity * (others.length + 1);
  return unitPrice(device, { currency: input.currency, needed, today: input.today }).money.amountMicros;
}

function workingGbwHz(device: Device, policy: Policy): number | null {
  if (device.kind !== 'voltage-feedback') return null;
  const { min, typ } = device.gainBandwidthHz;
  const minimum = min ?? (typ === undefined ? null : typ * policy.gbwDerating);
  if (policy.gbwCase === 'typical') return typ ?? minimum;
  if (minimum === null) return null;
  return policy.gbwCase === 'minimumHot' ? minimum * policy.temperatureFactor : minimum;
}

function mayPass(trials: Trials, stage: StageFacts, device: Device): boolean {
  if (device.kind !== 'voltage-feedback') return true;
  const { facts } = trials.before;
  const have = workingGbwHz(device, facts.policy);
  const used = gbwUsed(facts, stage, 'worst').value;
  if (have === null || used === null) return have !== null;
  const tooUnstable = (device.minimumStableGain ?? 1) * PREFILTER_SHARE > (stage.analysis.noiseGain ?? 1);
  return have >= used * facts.policy.headroomTarget * PREFILTER_SHARE && !tooUnstable;
}

/** Active devices of the kind that fits, without the present one, cheapest first; those without a price last. */
export function devicesByPrice(trials: Trials, stage: StageFacts): readonly Device[] {
  const { input } = trials.before.facts;
  return trials.devices
    .filter((device) => device.id !== stage.device?.id && withDevice(stage.stage, device) !== null)
    .filter((device) => (device.lifecycle ?? 'active') === 'active')
    .map((device) => ({ device, price: priceInPlace(input, stage.stage, device) ?? Number.POSITIVE_INFINITY }))
    .sort(
      (a, b) =>
        (a.price === b.price ? 0 : a.price - b.price) || a.device.partNumber.localeCompare(b.device.partNumber, 'en'),
    )
    .map(({ device }) => device);
}

/**
 * The cheapest of the given devices with which this very stage is clear, the whole chain evaluated again. Where data of the
 * devices is missing, the cheapest that is clear in the check that decides now and over in none.
 */
export function deviceRemedy(trials: Trials, stage: StageFacts, checkId: CheckId): FoundRemedy | null {
  const promising = devicesByPrice(trials, stage).filter((device) => mayPass(trials, stage, device));
  let second: FoundRemedy | null = null;
  for (const device of promising.slice(0, MOST_DEVICES)) {
    const replacement = withDevice(stage.stage, device);
    const trial = replacement && trials.replace(stage.index, [replacement]);
    if (!trial) continue;
    const verdict = trialVerdict(trial);
    if (verdict === 'clear') return found(trial, device, checkId);
    if (isSecondBest(trial, stage, checkId)) second ??= found(trial, device, checkId);
  }
  return second;
}

/** Clear in the check that decides now and over in none; with data missing it is no remedy for what is only tight. */
function isSecondBest(trial: Trial, stage: StageFacts, checkId: CheckId): boolean {
  const isOverNow = trial.before.stageVerdicts[stage.index] === 'over';
  return isOverNow && trialVerdict(trial) === 'unknown' && trialCheckVerdict(trial, checkId) === 'clear';
}

function found(trial: Trial, device: Device, checkId: CheckId): FoundRemedy {
  const { signalGain } = trialStages(trial)[0].analysis;
  const at = device.kind === 'matched-block' ? 'in its place' : `at ${gainText(signalGain)}`;
  const missing = trialVerdict(trial) === 'unknown' ? '; it cannot be judged fully, data of it is missing' : '';
  const brief = `${device.partNumber} ${at} would ${benefit(trial, checkId)}${priceDifferenceText(trial)}${missing}.`;
  return proposal(trial, brief, `Use ${device.partNumber}`);
}

/** What the device gives there, in the figure of the check that fails now. */
function benefit(trial: Trial, checkId: CheckId): string {
  const { facts } = trial.after;
  const stage = trialStages(trial)[0];
  const headroom = worstHeadroom(facts, stage).headroom.value;
  const slew = slewHeadroom(stage).value;
  if (checkId === 'slew' && slew !== null)
    return `leave a slew rate of ${ratioText(slew, [1, facts.policy.slewTarget])}`;
  if (checkId === 'gbw' && headroom !== null) return `leave ${ratioText(headroom, [1, facts.policy.headroomTarget])}`;
  const ratio = bandwidthRatio(facts, stage).value;
  if (checkId === 'bandwidth' && ratio !== null)
    return `reach ${ratioText(ratio, [1, facts.policy.bandwidthTarget])} the top of the band`;
  return trialVerdict(trial) === 'clear' ? 'pass every check here' : 'pass this check';
}

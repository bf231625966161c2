import type { Device, DeviceKind, FeedbackStage, Stage, StageKind } from '../../../api/types';
import { pairHoldingFeedback } from './resistors';

interface StageKindText {
  readonly label: string;
  readonly note: string;
}

const STAGE_KIND_TEXTS: Readonly<Record<StageKind, StageKindText>> = {
  'voltage-feedback': { label: 'Voltage-feedback amplifier', note: 'spends gain-bandwidth' },
  'current-feedback': { label: 'Current-feedback amplifier', note: 'has no gain-bandwidth; Rf sets its corner' },
  'rc-section': { label: 'RC section', note: 'passive: series and shunt parts' },
  'matched-block': { label: 'Matched block', note: 'gain block, attenuator or filter in a 50 Ω system' },
};

/** In the order in which they are offered. */
export const STAGE_KINDS = (Object.keys(STAGE_KIND_TEXTS) as StageKind[]).map((kind) => ({
  kind,
  ...STAGE_KIND_TEXTS[kind],
}));

const NAMES: Readonly<Record<StageKind, string>> = {
  'voltage-feedback': 'Gain',
  'current-feedback': 'Driver',
  'rc-section': 'RC section',
  'matched-block': 'Block',
};

const FIRST_TRANSIMPEDANCE_OHM = 10e3;

function amplifierStage(id: string, device: Device, atCurrentSource: boolean): FeedbackStage {
  const name = NAMES[device.kind];
  if (device.kind === 'current-feedback') {
    const pair = pairHoldingFeedback(1, device.referenceFeedbackOhm, 'exact');
    return {
      id,
      name,
      kind: 'current-feedback',
      topology: 'non-inverting',
      deviceId: device.id,
      wantedGain: 2,
      ...pair,
    };
  }
  if (atCurrentSource) {
    const feedbackOhm = FIRST_TRANSIMPEDANCE_OHM;
    const fixed = { kind: 'voltage-feedback', topology: 'transimpedance', deviceId: device.id, gainOhm: null } as const;
    return { id, name: 'Transimpedance', ...fixed, wantedGain: -feedbackOhm, feedbackOhm };
  }
  // A part that is not stable at low gain starts at one where it is.
  const stable = device.kind === 'voltage-feedback' ? (device.minimumStableGain ?? 1) : 1;
  const wantedGain = Math.max(10, Math.ceil(stable));
  const gainOhm = 100;
  return {
    id,
    name,
    kind: 'voltage-feedback',
    topology: 'non-inverting',
    deviceId: device.id,
    wantedGain,
    gainOhm,
    feedbackOhm: gainOhm * (wantedGain - 1),
  };
}

export function needsDevice(kind: StageKind): kind is DeviceKind {
  return kind !== 'rc-section';
}

/**
 * A stage to begin with. Kinds with a device need one: there is no amplifier without it. What a current source feeds
 * first is a transimpedance stage.
 */
export function newStage(id: string, kind: StageKind, device: Device | null, atCurrentSource = false): Stage | null {
  if (kind === 'rc-section') return { id, name: NAMES[kind], kind, seriesOhm: 50, shuntF: 100e-12 };
  if (!device || device.kind !== kind) return null;
  return kind === 'matched-block'
    ? { id, name: NAMES[kind], kind, deviceId: device.id }
    : amplifierStage(id, device, atCurrentSource);
}

const WITHOUT_TOPOLOGY: Readonly<Record<Exclude<Stage, FeedbackStage>['kind'], string>> = {
  'rc-section': 'passive',
  'matched-block': 'matched',
};

export function topologyText(stage: Stage): string {
  return 'topology' in stage ? stage.topology : WITHOUT_TOPOLOGY[stage.kind];
}

export function deviceIdOf(stage: Stage): string | null {
  return stage.kind === 'rc-section' ? null : stage.deviceId;
}

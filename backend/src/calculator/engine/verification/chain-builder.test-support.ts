import { DEFAULT_POLICY } from '../policy';
import type {
  ChainInput,
  CurrentFeedbackDevice,
  CurrentFeedbackStage,
  Device,
  MatchedBlockDevice,
  Policy,
  RcSectionStage,
  Specification,
  Stage,
  VoltageFeedbackDevice,
  VoltageFeedbackStage,
} from '../types';

/** The defaults, with a temperature factor under which the minimum and the hot case differ. */
export const POLICY: Policy = { ...DEFAULT_POLICY, temperatureFactor: 0.8 };

export const SPECIFICATION: Specification = {
  source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', nominalLevel: 1e-3, largestLevel: 1e-3 },
  load: { resistanceOhm: 1000 },
  gainBasis: 'voltage',
  band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
  supply: { positiveV: 5, negativeV: -5 },
  requirements: {},
};

export function chainInput(
  stages: readonly Stage[],
  devices: readonly Device[],
  specification: Partial<Specification> = {},
  policy: Partial<Policy> = {},
): ChainInput {
  return {
    specification: { ...SPECIFICATION, ...specification },
    policy: { ...POLICY, ...policy },
    stages,
    devices,
    currency: 'USD',
    buildQuantity: 250,
  };
}

const part = (id: string) => ({ id, partNumber: id.toUpperCase(), grade: 'general-purpose', channels: 1 }) as const;

export function voltageFeedbackDevice(
  id: string,
  gainBandwidthHz: number,
  more: Partial<VoltageFeedbackDevice> = {},
): VoltageFeedbackDevice {
  const gbw = { min: gainBandwidthHz, typ: gainBandwidthHz };
  return { ...part(id), kind: 'voltage-feedback', gainBandwidthHz: gbw, ...more };
}

export function currentFeedbackDevice(
  id: string,
  bandwidthHz: number,
  referenceNoiseGain: number,
  referenceFeedbackOhm: number,
  more: Partial<CurrentFeedbackDevice> = {},
): CurrentFeedbackDevice {
  const reference = { min: bandwidthHz, typ: bandwidthHz };
  const kind = 'current-feedback';
  return { ...part(id), kind, referenceBandwidthHz: reference, referenceNoiseGain, referenceFeedbackOhm, ...more };
}

export function matchedBlockDevice(
  id: string,
  impedanceOhm: number,
  gainDb: number,
  more: Partial<MatchedBlockDevice> = {},
): MatchedBlockDevice {
  return { ...part(id), kind: 'matched-block', impedanceOhm, gainDb: { typ: gainDb }, ...more };
}

export function voltageFeedbackStage(
  id: string,
  deviceId: string,
  topology: VoltageFeedbackStage['topology'],
  feedbackOhm: number,
  gainOhm: number | null,
  more: Partial<VoltageFeedbackStage> = {},
): VoltageFeedbackStage {
  return { id, name: id, kind: 'voltage-feedback', deviceId, topology, feedbackOhm, gainOhm, ...more };
}

export function currentFeedbackStage(
  id: string,
  deviceId: string,
  topology: CurrentFeedbackStage['topology'],
  feedbackOhm: number,
  gainOhm: number | null,
  more: Partial<CurrentFeedbackStage> = {},
): CurrentFeedbackStage {
  return { id, name: id, kind: 'current-feedback', deviceId, topology, feedbackOhm, gainOhm, ...more };
}

export function rcSection(id: string, more: Partial<RcSectionStage>): RcSectionStage {
  return { id, name: id, kind: 'rc-section', ...more };
}

export function matchedBlockStage(id: string, deviceId: string): Stage {
  return { id, name: id, kind: 'matched-block', deviceId };
}

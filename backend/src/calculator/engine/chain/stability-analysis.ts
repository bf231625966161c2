import type { StabilityAnalysis, StabilityPoint, UsedValue } from '../analysis';
import { SecondPole, currentFeedbackSecondPole, secondPoleFor } from '../devices/second-pole';
import { DeviceCorner, gbwFor, referenceBandwidthFor } from '../devices/used-values';
import type { PreparedStage } from '../stages/prepare-stage';
import type { AmplifierDevice, ChainInput, Policy } from '../types';
import { loadIsCapacitive } from './capacitive-load';
import { ChainNetwork } from './chain-network';
import { amplifierOf } from './levels';
import { ChainResponse } from './response';
import { stabilityPoints } from './stability';

function bandwidthOf(device: AmplifierDevice, policy: Policy, corner: DeviceCorner): UsedValue {
  return device.kind === 'voltage-feedback'
    ? gbwFor(device, policy, corner)
    : referenceBandwidthFor(device, policy, corner);
}

function poleOf(device: AmplifierDevice): SecondPole {
  return device.kind === 'voltage-feedback' ? secondPoleFor(device) : currentFeedbackSecondPole(device);
}

/** The end with the smaller margin; no crossing counts as better than any; on a tie the higher peak. */
export function worseEnd(atMinimum: StabilityPoint, atMaximum: StabilityPoint): 'minimum' | 'maximum' {
  const low = atMinimum.phaseMarginDeg ?? Infinity;
  const high = atMaximum.phaseMarginDeg ?? Infinity;
  if (low === high) return atMinimum.peakingDb > atMaximum.peakingDb ? 'minimum' : 'maximum';
  return low < high ? 'minimum' : 'maximum';
}

function stageStability(
  input: ChainInput,
  stages: readonly PreparedStage[],
  index: number,
  device: AmplifierDevice,
  atMinimum: StabilityPoint,
  atMaximum: StabilityPoint,
): StabilityAnalysis {
  const pole = poleOf(device);
  return {
    stageId: stages[index].stage.id,
    atMinimum,
    atMaximum,
    worse: worseEnd(atMinimum, atMaximum),
    minimumGbw: bandwidthOf(device, input.policy, 'minimum'),
    maximumGbw: bandwidthOf(device, input.policy, 'maximum'),
    secondPoleHz: Number.isFinite(pole.frequencyHz) ? pole.frequencyHz : null,
    secondPoleText: pole.text,
    outputResistanceKnown: device.outputResistanceOhm !== undefined,
    loadCapacitive: loadIsCapacitive(input, stages, index),
  };
}

/**
 * Stability of every feedback stage, with every amplifier of the chain at its minimum and at its maximum GBW, the second
 * poles held. `minimum` is a response of the minimum corner where the caller has one already.
 *
 * @example stabilityOfChain(input).get('s2')?.worse // 'maximum' for a voltage-feedback stage with a second pole
 */
export function stabilityOfChain(input: ChainInput, minimum?: ChainResponse): Map<string, StabilityAnalysis> {
  const atMinimum = minimum ?? new ChainResponse(input, new ChainNetwork(input, 'minimum'));
  const atMaximum = new ChainResponse(input, new ChainNetwork(input, 'maximum'));
  const minimumPoints = stabilityPoints(atMinimum);
  const maximumPoints = stabilityPoints(atMaximum);
  const found = new Map<string, StabilityAnalysis>();
  atMinimum.network.prepared.forEach((stage, index, stages) => {
    const device = amplifierOf(stage);
    const low = minimumPoints.get(index + 1);
    const high = maximumPoints.get(index + 1);
    if (device && low && high) found.set(stage.stage.id, stageStability(input, stages, index, device, low, high));
  });
  return found;
}

import type { ChainAnalysis, ChainCaseAnalysis, StabilityAnalysis, StageAnalysis } from '../analysis';
import { chainCost } from '../cost/chain-cost';
import type { ChainCost, StageCost } from '../cost/chain-cost';
import type { ChainInput, Device, FeedbackStage, GbwCase, Policy, Stage } from '../types';

/** One stage with everything that is known of it in one GBW case. */
export interface StageFacts {
  readonly index: number;
  /** S1, S2 … */
  readonly label: string;
  readonly stage: Stage;
  readonly device: Device | null;
  readonly analysis: StageAnalysis;
  readonly stability: StabilityAnalysis | null;
  readonly cost: StageCost;
}

/** A chain with everything that is known of it in one GBW case. */
export interface ChainFacts {
  readonly input: ChainInput;
  readonly policy: Policy;
  readonly gbwCase: GbwCase;
  readonly chain: ChainCaseAnalysis;
  readonly stages: readonly StageFacts[];
  readonly cost: ChainCost;
}

/**
 * Brings stages, devices, analysis and prices of one GBW case together.
 *
 * @param input whole chain
 * @param analysis its network analysis, holding at least this case
 * @param gbwCase case to speak of
 */
export function factsOf(input: ChainInput, analysis: ChainAnalysis, gbwCase: GbwCase): ChainFacts {
  const chain = analysis.cases[gbwCase];
  const devices = new Map(input.devices.map((device) => [device.id, device]));
  const cost = chainCost(input);
  const stages = input.stages.map((stage, index) => ({
    index,
    label: `S${index + 1}`,
    stage,
    device: 'deviceId' in stage ? (devices.get(stage.deviceId) ?? null) : null,
    analysis: chain.stages[index],
    stability: analysis.stability.get(stage.id) ?? null,
    cost: cost.stages[index],
  }));
  return { input, policy: input.policy, gbwCase, chain, stages, cost };
}

/** True for a stage with an operational amplifier in it. */
export function isFeedbackStage(stage: Stage): stage is FeedbackStage {
  return stage.kind === 'voltage-feedback' || stage.kind === 'current-feedback';
}

/** "S2 Gain", or "S2" for a stage without a name. */
export function fullLabel(facts: StageFacts): string {
  return facts.stage.name.trim() === '' ? facts.label : `${facts.label} ${facts.stage.name.trim()}`;
}

/** Part number, or what the stage is. */
export function partName(facts: StageFacts): string {
  return facts.device?.partNumber ?? 'the passive section';
}

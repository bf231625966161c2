import type { ChainCaseAnalysis, Maybe, StabilityAnalysis, StageAnalysis } from '../analysis';
import { analyzeChain } from '../chain/analyze-chain';
import { probeChain } from '../chain/probe';
import type { ChainInput, DatasheetValue, GbwCase, VoltageFeedbackDevice } from '../types';
import { chainInput, voltageFeedbackDevice, voltageFeedbackStage } from './chain-builder.test-support';
import { Complex, magnitude } from './complex-matrix.test-support';

/** The value of a figure that must be there. */
export function known(figure: Maybe): number {
  if (figure.value === null) throw new Error(`no value: ${figure.reason}`);
  return figure.value;
}

export const analysed = (input: ChainInput, gbwCase: GbwCase = 'minimum'): ChainCaseAnalysis =>
  analyzeChain(input).cases[gbwCase];

export const firstStage = (input: ChainInput, gbwCase: GbwCase = 'minimum'): StageAnalysis =>
  analysed(input, gbwCase).stages[0];

export function stabilityOf(input: ChainInput, stageId: string): StabilityAnalysis {
  const stability = analyzeChain(input).stability.get(stageId);
  if (!stability) throw new Error(`no stability of ${stageId}`);
  return stability;
}

/** |V_load/EMF| */
export const gainAt = (input: ChainInput, frequencyHz: number): number =>
  magnitude(probeChain(input, 'minimum', frequencyHz).gain);

/** Open-loop gain as the product of loop gain and noise gain; with no output resistance it is exactly that. */
export function openLoopGainAt(input: ChainInput, frequencyHz: number): number {
  const [stage] = probeChain(input, 'minimum', frequencyHz).stages;
  return magnitude(stage.loopGain as Complex) * magnitude(stage.noiseGain as Complex);
}

/** A0 → ∞ */
export const HUGE_DB: DatasheetValue = { typ: 180 };

/** One band around a frequency, so that figures "at the operating frequency" are at it. */
export const bandAt = (frequencyHz: number) => ({
  band: { lowHz: frequencyHz / 2, operatingHz: frequencyHz, highHz: frequencyHz * 2 },
});

/** One stage of a given signal gain: + gains non-inverting (1: follower), − gains inverting from a 50 Ω source. */
export function gainStage(
  gain: number,
  gainBandwidthHz: number,
  frequencyHz: number,
  more: Partial<VoltageFeedbackDevice> = {},
): ChainInput {
  const device = voltageFeedbackDevice('a', gainBandwidthHz, { openLoopGainDb: HUGE_DB, ...more });
  return chainInput([stageOfGain('s', 'a', gain)], [device], bandAt(frequencyHz));
}

export function stageOfGain(id: string, deviceId: string, gain: number) {
  if (gain === 1) return voltageFeedbackStage(id, deviceId, 'follower', 0, null);
  if (gain > 0) return voltageFeedbackStage(id, deviceId, 'non-inverting', (gain - 1) * 1000, 1000);
  // The 50 Ω of the source are part of the resistor that the inverting node is fed through.
  return voltageFeedbackStage(id, deviceId, 'inverting', -gain * 1000, 950);
}

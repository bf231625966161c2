import type { PreparedStage } from '../stages/prepare-stage';

/** The range in which the loop of a stage matters. */
export interface StageSpan {
  /** Rough closed-loop corner: where a fine grid is worth while. */
  readonly cornerHz: number;
  /** 100 × max(GBW, second pole): crossings count up to here. */
  readonly limitHz: number;
}

/** 100 times the higher of a stage's bandwidth and second pole (where it has one). */
const limitOf = (bandwidthHz: number, secondPoleHz: number): number =>
  100 * Math.max(bandwidthHz, Number.isFinite(secondPoleHz) ? secondPoleHz : 0);

/** The span of a feedback stage; null for stages without a loop. */
export function stageSpan({ feedback, loopBandwidthHz, secondPoleHz }: PreparedStage): StageSpan | null {
  if (!feedback || loopBandwidthHz === null || secondPoleHz === null) return null;
  const legOhm = feedback.inverting ? feedback.seriesOhm : 1 / feedback.gainS;
  const noiseGain = 1 + feedback.feedbackOhm / Math.max(legOhm, 1);
  return { cornerHz: loopBandwidthHz / noiseGain, limitHz: limitOf(loopBandwidthHz, secondPoleHz) };
}

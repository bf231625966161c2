import type { Check } from '../report';
import type { ChainFacts, StageFacts } from '../report/facts';
import { invertingInputResistanceFor } from '../devices/amplifier-values';
import { figure, limitFigure } from '../report/figures';
import type { CurrentFeedbackDevice, CurrentFeedbackStage } from '../types';
import { isBelow } from '../text/deciding-digits';
import { atLeastText, valueText } from '../text/phrases';
import { typed } from '../text/si-format';
import { makeCheck } from './make-check';

/** Below this share of the reference circuit's Rf + NG·Rb the response peaks. Common practice. */
export const LOWEST_FEEDBACK_SHARE = 0.95;

function referenceOhm(device: CurrentFeedbackDevice): number {
  const buffer = invertingInputResistanceFor(device).value;
  return device.referenceFeedbackOhm + device.referenceNoiseGain * buffer;
}

/** (Rf + NG·Rb) over that of the device's reference circuit; null for other stages. */
export function feedbackResistorShare(stage: StageFacts): number | null {
  const { device } = stage;
  if (stage.stage.kind !== 'current-feedback' || device?.kind !== 'current-feedback') return null;
  if (stage.analysis.noiseGain === null) return null;
  const buffer = invertingInputResistanceFor(device).value;
  return (stage.stage.feedbackOhm + stage.analysis.noiseGain * buffer) / referenceOhm(device);
}

/**
 * Current feedback: Rf + NG·Rb below 0.95 of the reference circuit's makes the loop faster than its maker measured it.
 * A smaller Rf at a higher gain is right, because NG·Rb grows.
 */
export function feedbackResistorCheck(_facts: ChainFacts, stage: StageFacts): Check | null {
  const share = feedbackResistorShare(stage);
  const { device } = stage;
  const set = stage.stage;
  if (share === null || device?.kind !== 'current-feedback' || set.kind !== 'current-feedback') return null;
  const isLow = isBelow(share, LOWEST_FEEDBACK_SHARE);
  const sentence = (): string =>
    isLow
      ? smallResistorSentence(stage, set, device)
      : `Rf + NG·Rb is ${valueText(share, 'fraction', [LOWEST_FEEDBACK_SHARE])} of the reference circuit's.`;
  return makeCheck('feedback-resistor', 'feedback resistor', isLow ? 'tight' : 'clear', sentence, () => ({
    actual: figure(share, 'fraction', { limits: [LOWEST_FEEDBACK_SHARE] }),
    limit: limitFigure(LOWEST_FEEDBACK_SHARE, 'fraction'),
  }));
}

function smallResistorSentence(stage: StageFacts, set: CurrentFeedbackStage, device: CurrentFeedbackDevice): string {
  const buffer = invertingInputResistanceFor(device).value;
  const least = LOWEST_FEEDBACK_SHARE * referenceOhm(device) - (stage.analysis.noiseGain ?? 1) * buffer;
  return (
    `Its feedback resistor of ${typed(set.feedbackOhm, 'Ω')} is small for ${device.partNumber}: the response peaks. ` +
    `At least ${atLeastText(Math.max(least, 1), 'Ω')} here.`
  );
}

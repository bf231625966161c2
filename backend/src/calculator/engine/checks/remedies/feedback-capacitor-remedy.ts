import type { StageFacts } from '../../report/facts';
import { worsePoint } from '../../report/stage-figures';
import { nearestPreferred } from '../../preferred-values';
import { valueText } from '../../text/phrases';
import { typed } from '../../text/si-format';
import type { Source, VoltageFeedbackDevice, VoltageFeedbackStage } from '../../types';
import { isNoWorse, proposal, trialCheckVerdict, trialStages } from './trials';
import type { FoundRemedy, Trial, Trials } from './trials';

const typical = (sheet?: { readonly typ?: number; readonly max?: number; readonly min?: number }): number =>
  sheet?.typ ?? sheet?.max ?? sheet?.min ?? 0;

/** Everything from the inverting node to ground, F: the pins, the stray and a source that drives the node itself. */
function nodeCapacitanceF(stage: StageFacts, set: VoltageFeedbackStage, device: VoltageFeedbackDevice, source: Source) {
  const own = typical(device.commonModeCapacitanceF) + typical(device.differentialCapacitanceF) + (set.strayF ?? 0);
  const isDriven = set.topology === 'transimpedance' && stage.index === 0 && source.kind === 'current';
  return own + (isDriven ? source.capacitanceF : 0);
}

/**
 * A capacitor across Rf for a loop that the capacitance at its inverting node has cost its phase: the E12 value next to
 * √(C/(2π·Rf·GBW)) (about 45°) or, where that is too small, to √(C/(π·Rf·GBW)) (Butterworth). The figures named are those of
 * the full model.
 * Source: transimpedance compensation; the two rules as compared in the reference case on transimpedance compensation.
 */
export function feedbackCapacitorRemedy(trials: Trials, stage: StageFacts): FoundRemedy | null {
  const { stage: set, device } = stage;
  if (set.kind !== 'voltage-feedback' || device?.kind !== 'voltage-feedback') return null;
  const { source } = trials.before.facts.input.specification;
  for (const feedbackF of capacitorsToTry(stage, set, nodeCapacitanceF(stage, set, device, source))) {
    const trial = trials.replace(stage.index, [{ ...set, feedbackF }]);
    if (trial && trialCheckVerdict(trial, 'stability') === 'clear' && isNoWorse(trial, stage)) {
      return capacitorProposal(trial, feedbackF);
    }
  }
  return null;
}

/** E12 values next to the two rules, ascending, as far as they are larger than what is there. */
function capacitorsToTry(stage: StageFacts, set: VoltageFeedbackStage, nodeF: number): number[] {
  const { gbw } = stage.analysis;
  if (!gbw || nodeF <= 0 || set.feedbackOhm <= 0) return [];
  const about45F = Math.sqrt(nodeF / (2 * Math.PI * set.feedbackOhm * gbw.value));
  const values = [about45F, about45F * Math.SQRT2].map((ruleF) => nearestPreferred(ruleF, 'E12'));
  return values.filter((feedbackF) => feedbackF > (set.feedbackF ?? 0));
}

function capacitorProposal(trial: Trial, feedbackF: number): FoundRemedy {
  const after = trialStages(trial)[0];
  const margin = worsePoint(after)?.phaseMarginDeg ?? null;
  const corner = after.analysis.cornerUpperHz.value;
  const gives = [
    ...(margin === null ? [] : [`bring the phase margin to ${valueText(margin, 'deg')}`]),
    ...(corner === null ? [] : [`put the corner at ${valueText(corner, 'Hz')}`]),
  ];
  const value = typed(feedbackF, 'F');
  return proposal(trial, `${value} across Rf would ${gives.join(' and ')}.`, `Add ${value} across Rf`);
}

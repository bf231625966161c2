import { MAXIMUM_STAGES } from '../../types';
import type { Stage, VoltageFeedbackStage } from '../../types';
import { derivedStageId } from './stage-id';

/** Gains that are set by two resistors; a follower and a transimpedance stage have none to scale. */
export function isRatioStage(stage: Stage): stage is VoltageFeedbackStage & { gainOhm: number } {
  if (stage.kind !== 'voltage-feedback' || typeof stage.gainOhm !== 'number') return false;
  return stage.topology === 'inverting' || stage.topology === 'non-inverting';
}

/** Signed gain of the resistors. */
export function resistorGain(stage: VoltageFeedbackStage & { gainOhm: number }): number {
  return stage.topology === 'inverting' ? -stage.feedbackOhm / stage.gainOhm : 1 + stage.feedbackOhm / stage.gainOhm;
}

/** The same stage with another size of gain: Rg stays (it loads the stage in front of an inverting one), Rf moves. */
export function withGain(
  stage: VoltageFeedbackStage & { gainOhm: number },
  magnitude: number,
): VoltageFeedbackStage | null {
  if (stage.topology === 'inverting') {
    return { ...stage, feedbackOhm: stage.gainOhm * magnitude, wantedGain: -magnitude };
  }
  if (magnitude <= 1) return null;
  return { ...stage, feedbackOhm: stage.gainOhm * (magnitude - 1), wantedGain: magnitude };
}

/**
 * An inverting stage as a non-inverting one of the same size of gain: Rf stays, the bias resistor takes over the value of
 * the old Rg where a capacitor couples the input, so that its corner stays.
 */
export function asNonInverting(stage: VoltageFeedbackStage & { gainOhm: number }): Stage | null {
  const magnitude = stage.feedbackOhm / stage.gainOhm;
  if (stage.topology !== 'inverting' || magnitude <= 1) return null;
  const isCoupled = typeof stage.couplingF === 'number';
  return {
    ...stage,
    topology: 'non-inverting',
    gainOhm: stage.feedbackOhm / (magnitude - 1),
    wantedGain: magnitude,
    biasOhm: isCoupled ? (stage.biasOhm ?? stage.gainOhm) : (stage.biasOhm ?? null),
  };
}

/**
 * Two equal stages with the same device in place of one. Input parts stay in front of the first, the isolation resistor
 * behind the second; Rf stays in both. The first keeps the id.
 */
export function splitInTwo(
  stage: VoltageFeedbackStage & { gainOhm: number },
  all: readonly Stage[],
): readonly [Stage, Stage] | null {
  const magnitude = Math.sqrt(Math.abs(resistorGain(stage)));
  if (magnitude <= 1 || all.length >= MAXIMUM_STAGES) return null;
  const gainOhm = stage.topology === 'inverting' ? stage.feedbackOhm / magnitude : stage.feedbackOhm / (magnitude - 1);
  const wantedGain = stage.topology === 'inverting' ? -magnitude : magnitude;
  const id = derivedStageId(stage.id, new Set(all.map((each) => each.id)));
  const name = stage.name.trim() === '' ? 'Stage' : stage.name.trim();
  const first: Stage = { ...stage, name: `${name} a`, gainOhm, wantedGain, isolationOhm: 0 };
  const second: Stage = {
    ...stage,
    id,
    name: `${name} b`,
    gainOhm,
    wantedGain,
    terminationOhm: null,
    couplingF: null,
    biasOhm: null,
  };
  return [first, second];
}

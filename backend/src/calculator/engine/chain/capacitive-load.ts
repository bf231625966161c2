import { parasitic } from '../devices/amplifier-values';
import type { PreparedStage } from '../stages/prepare-stage';
import type { ChainInput } from '../types';

/** Capacitance between the + and the − pin. */
function bridgingF({ device }: PreparedStage): number {
  if (device?.kind !== 'voltage-feedback') return 0;
  return parasitic(device.differentialCapacitanceF)?.value ?? 0;
}

/** Whether the input of a stage is capacitive; null: what follows it decides. */
function inputIsCapacitive(stage: PreparedStage): boolean | null {
  const { section, feedback } = stage;
  if (section) return section.shuntF > 0 ? true : null;
  if (!feedback) return false;
  const pinF = feedback.inverting ? feedback.nodeF : feedback.inputF;
  const keptAway = feedback.inverting && feedback.seriesOhm > 0;
  return !keptAway && pinF + bridgingF(stage) > 0;
}

/**
 * True when capacitance loads the output of a stage: the load's own, that of the next + pin or of a following section,
 * a transimpedance input, looked for through passive sections. A gain resistor into a virtual ground keeps it away.
 *
 * @param index of the stage, 0-based
 * @example the last stage with 100 pF at the load: true
 */
export function loadIsCapacitive(input: ChainInput, stages: readonly PreparedStage[], index: number): boolean {
  for (const stage of stages.slice(index + 1)) {
    const capacitive = inputIsCapacitive(stage);
    if (capacitive !== null) return capacitive;
  }
  return (input.specification.load.capacitanceF ?? 0) > 0;
}

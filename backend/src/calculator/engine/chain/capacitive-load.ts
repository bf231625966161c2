import { parasitic } from '../devices/amplifier-values';
import type { PreparedStage } from '../stages/prepare-stage';
import type { ChainInput } from '../types';

/**
 * True when capacitance loads the output of a stage: the load's own, that of the next + pin or of a following section,
 * a transimpedance input, looked for through passive sections. A gain resistor into a virtual ground keeps it away.
 *
 * @param index of the stage, 0-based
 * @example the last stage with 100 pF at the load: true
 */
export function loadIsCapacitive(input: ChainInput, stages: readonly PreparedStage[], index: number): boolean {
  for (const { section, block, feedback, device } of stages.slice(index + 1)) {
    if (block) return false;
    if (section) {
      if (section.shuntF > 0) return true;
      continue;
    }
    if (!feedback) return false;
    const bridging = device?.kind === 'voltage-feedback' ? parasitic(device.differentialCapacitanceF)?.value : 0;
    if (feedback.inverting) return feedback.seriesOhm === 0 && feedback.nodeF + (bridging ?? 0) > 0;
    return feedback.inputF + (bridging ?? 0) > 0;
  }
  return (input.specification.load.capacitanceF ?? 0) > 0;
}

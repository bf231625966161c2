import { GBW_CASES, type Curves } from '../../../../api/types';
import { formatSignificant, formatValue } from '../../../../lib/format-figure';
import { requiredGain } from '../../lib/requirement-windows';
import { CASE_NAMES } from '../frame/section-bar';
import { useWorkspace } from '../workspace-context';
import styles from './response.module.css';

interface ReadoutProps {
  curves: Curves;
  shownStages: readonly string[];
  index: number | null;
}

const gainText = (gain: number | null | undefined): string =>
  typeof gain === 'number' ? `${formatSignificant(gain, 4)} dB` : '–';

/** What the brackets in the plot stand for. */
function RequirementLegend() {
  const { control } = useWorkspace();
  const { requirements } = control.draft.specification;
  return (
    <>
      {requiredGain(requirements) && <span>Short brackets: gain required at the operating frequency.</span>}
      {requirements.flatnessDb !== undefined && (
        <span>
          Dashed over the band: {formatValue(requirements.flatnessDb, 'dB')} of flatness under the highest gain.
        </span>
      )}
    </>
  );
}

/** The figures under the pointer. */
export function Readout({ curves, shownStages, index }: ReadoutProps) {
  const { gbwCase } = useWorkspace();
  if (index === null) {
    return (
      <p className={styles.readout}>
        <span>Band between the three GBW cases; line: {CASE_NAMES[gbwCase]}.</span>
        <RequirementLegend />
        <span>Point at the plot to read it.</span>
      </p>
    );
  }
  const phase = curves.chain[gbwCase].phaseDeg[index];
  return (
    <p className={styles.readout} aria-live="off">
      <strong>{formatValue(curves.frequenciesHz[index] ?? 0, 'Hz', 4)}</strong>
      {GBW_CASES.map((each) => (
        <span key={each}>
          {CASE_NAMES[each]} {gainText(curves.chain[each].gainDb[index])}
        </span>
      ))}
      {typeof phase === 'number' && <span>phase {formatSignificant(phase, 4)}°</span>}
      {curves.stages
        .filter((stage) => shownStages.includes(stage.stageId))
        .map((stage) => (
          <span key={stage.stageId}>
            {stage.label} {gainText(stage.cases[gbwCase].gainDb[index])}
          </span>
        ))}
    </p>
  );
}

import type { FeedbackStage } from '../../../../api/types';
import { formatFigure } from '../../../../lib/format-figure';
import { useWorkspace } from '../workspace-context';
import styles from './set-up.module.css';

/** What the resistors really give. */
export function ResultLine({ stage }: { stage: FeedbackStage }) {
  const { preview, gbwCase } = useWorkspace();
  const report = preview.report?.stages.find((each) => each.stageId === stage.id);
  if (!report) return null;
  const { signalGain, noiseGain } = report.cases[gbwCase].figures;
  return (
    <p className={styles.result}>
      Resistors give {formatFigure(signalGain).text}
      {noiseGain.value !== null && `; noise gain ${formatFigure(noiseGain).text}`}.
    </p>
  );
}

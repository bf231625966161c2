import type { ChainReport, Remedy } from '../../../../api/types';
import { VerdictSentence } from '../../../../components/verdict-sentence';
import { useReport, useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

/** The remedies of the check that the sentence is about. */
function remediesOf({ verdict, checks, stages }: ChainReport): readonly Remedy[] {
  const own =
    verdict.stageId === null ? checks : (stages.find((each) => each.stageId === verdict.stageId)?.checks ?? []);
  return own.find((check) => check.id === verdict.checkId)?.remedies ?? [];
}

/** What breaks first, and what would help: a remedy with stages can be taken at once, and undone. */
export function VerdictBanner() {
  const { edits, editable } = useWorkspace();
  const report = useReport();
  const { verdict } = report;
  const lead = verdict.lead || (verdict.verdict === 'clear' ? 'Every check is clear.' : '');
  return (
    <VerdictSentence verdict={verdict.verdict} lead={lead} text={verdict.text}>
      {editable &&
        remediesOf(report).map(({ action, stages, sentence }) =>
          action && stages ? (
            <button
              key={action}
              type="button"
              className={styles.remedy}
              title={sentence}
              onClick={() => edits.applyRemedy(verdict.stageId, stages, action)}
            >
              {action}
            </button>
          ) : null,
        )}
    </VerdictSentence>
  );
}

import { describeQuantity } from '../../../../lib/quantity-units';
import { stageIndex } from '../../lib/draft';
import { useWorkspace } from '../workspace-context';
import styles from './set-up.module.css';

/** What the stage drives: the next stage, or the chain's load. */
export function LoadText({ stageId }: { stageId: string }) {
  const { control, openSpecification } = useWorkspace();
  const { draft } = control;
  const index = stageIndex(draft, stageId);
  const next = draft.stages[index + 1];
  const { resistanceOhm, capacitanceF } = draft.specification.load;
  const parts = [
    resistanceOhm === null ? 'open' : describeQuantity(resistanceOhm, 'Ω'),
    capacitanceF ? describeQuantity(capacitanceF, 'pF') : null,
  ].filter((part) => part !== null);
  return (
    <div>
      <div className={styles.label}>Load</div>
      <div className={styles.load}>
        {next ? (
          <span>
            S{index + 2} {next.name}, input
          </span>
        ) : (
          <button
            type="button"
            className={styles.textButton}
            onClick={openSpecification}
            title="Open the specification"
          >
            {parts.join(' ∥ ')}
          </button>
        )}
      </div>
    </div>
  );
}

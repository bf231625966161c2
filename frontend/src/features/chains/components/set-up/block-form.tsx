import type { MatchedBlockStage } from '../../../../api/types';
import { LoadText } from './load-text';
import styles from './set-up.module.css';

/** Everything else of a matched block is in its device. */
export function BlockForm({ stage }: { stage: MatchedBlockStage }) {
  return (
    <div className={styles.fields}>
      <LoadText stageId={stage.id} />
    </div>
  );
}

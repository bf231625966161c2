import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

/** Says what was done last to those who cannot see it; a removal is shown to everybody, with its way back. */
export function LastStep() {
  const { control } = useWorkspace();
  const { undoLabel, undo } = control;
  const removed = undoLabel?.startsWith('remove ') ? undoLabel.slice('remove '.length) : null;
  return (
    <>
      <div className="visually-hidden" role="status">
        {undoLabel && `Done: ${undoLabel}.`}
      </div>
      {removed !== null && (
        <span className={styles.removed}>
          {removed} is removed.{' '}
          <button type="button" className={styles.linkButton} onClick={undo}>
            Put it back
          </button>
        </span>
      )}
    </>
  );
}

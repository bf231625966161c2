import { ConflictDialog } from '../../../../components/conflict-dialog';
import { draftDifferences } from '../../lib/draft-difference';
import type { SaveControl } from '../use-save';
import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

/** Somebody else saved in between: both versions, and what differs. */
export function Conflict({ save }: { save: SaveControl }) {
  const { control } = useWorkspace();
  const { conflict } = save;
  const lines = conflict ? draftDifferences(control.draft, conflict.draft) : [];
  return (
    <ConflictDialog
      open
      what={`The option ${control.draft.name}`}
      saving={save.saving}
      onKeepMine={() => void save.keepMine()}
      onTakeTheirs={save.takeTheirs}
      onClose={save.decideLater}
    >
      {lines.length === 0 ? (
        <p>Both versions say the same.</p>
      ) : (
        <ul className={styles.differences} aria-label="Differences">
          {lines.map((line) => (
            <li key={line}>{line}</li>
          ))}
        </ul>
      )}
    </ConflictDialog>
  );
}

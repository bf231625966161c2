import Button from 'antd/es/button';

import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

function whenText(instant: string): string {
  return new Date(instant).toLocaleString('en-GB', {
    day: 'numeric',
    month: 'short',
    hour: '2-digit',
    minute: '2-digit',
  });
}

/** Tells of a draft that this browser kept, and lets the person choose. */
export function KeptNotice() {
  const { control } = useWorkspace();
  const { kept } = control;
  if (!kept) return null;
  const when = whenText(kept.stored.savedAt);
  if (kept.kind === 'restored') {
    return (
      <div className={styles.notice} role="status">
        <span>Your unsaved changes of {when} are back.</span>
        <Button size="small" onClick={control.dismissKept}>
          Keep them
        </Button>
        <Button size="small" onClick={control.discardKept}>
          Discard
        </Button>
      </div>
    );
  }
  return (
    <div className={styles.notice} role="status">
      <span>Unsaved changes of {when} were made to an older version of this option.</span>
      <Button size="small" onClick={control.restoreKept}>
        Restore
      </Button>
      <Button size="small" onClick={control.discardKept}>
        Discard
      </Button>
    </div>
  );
}

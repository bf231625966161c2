import RedoOutlined from '@ant-design/icons/es/icons/RedoOutlined';
import UndoOutlined from '@ant-design/icons/es/icons/UndoOutlined';
import Button from 'antd/es/button';

import type { SaveControl } from '../use-save';
import { useWorkspace } from '../workspace-context';
import styles from './frame.module.css';

/** "14:02" today, "12 Nov, 14:02" else. */
function timeText(instant: Date): string {
  const today = instant.toDateString() === new Date().toDateString();
  const time = instant.toLocaleTimeString('en-GB', { hour: '2-digit', minute: '2-digit' });
  return today ? time : `${instant.toLocaleDateString('en-GB', { day: 'numeric', month: 'short' })}, ${time}`;
}

export function SaveBar({ save }: { save: SaveControl }) {
  const { control, option, editable } = useWorkspace();
  const savedAt = save.savedAt ?? new Date(option.updatedAt);
  if (!editable) return <span className="soft">read only · saved {timeText(savedAt)}</span>;
  const state = save.saving ? 'saving…' : control.dirty ? 'unsaved changes' : `saved ${timeText(savedAt)}`;
  return (
    <div className={styles.saveBar}>
      <span className="soft" role="status">
        {state}
      </span>
      <Button
        size="small"
        type="text"
        icon={<UndoOutlined />}
        disabled={control.undoLabel === null}
        title={control.undoLabel ? `Undo: ${control.undoLabel} (Ctrl + Z)` : 'Nothing to undo'}
        aria-label={control.undoLabel ? `Undo: ${control.undoLabel}` : 'Undo'}
        onClick={control.undo}
      />
      <Button
        size="small"
        type="text"
        icon={<RedoOutlined />}
        disabled={control.redoLabel === null}
        title={control.redoLabel ? `Redo: ${control.redoLabel} (Ctrl + Shift + Z)` : 'Nothing to redo'}
        aria-label={control.redoLabel ? `Redo: ${control.redoLabel}` : 'Redo'}
        onClick={control.redo}
      />
      <Button
        size="small"
        type={control.dirty ? 'primary' : 'default'}
        disabled={!control.dirty}
        loading={save.saving}
        onClick={() => void save.save()}
        title="Save (Ctrl + S)"
      >
        Save
      </Button>
    </div>
  );
}

import Input from 'antd/es/input';

import type { Stage } from '../../../../api/types';
import { NAME_MAXIMUM } from '../frame/name-dialog';
import styles from './set-up.module.css';
import { useStageForm } from './use-stage-form';

/** The stage's name, editable where it stands as the panel's title. */
export function NameField({ stage, index }: { stage: Stage; index: number }) {
  const { error, set, disabled } = useStageForm(stage);
  const message = error('name') ?? (stage.name.trim() === '' ? 'Give a name.' : null);
  return (
    <h2 className={styles.name}>
      <span>S{index + 1}</span>
      <Input
        variant="borderless"
        className={styles.nameInput}
        aria-label="Name of the stage"
        value={stage.name}
        disabled={disabled}
        maxLength={NAME_MAXIMUM}
        onChange={(event) => set('name', 'name', { name: event.target.value })}
        status={message ? 'error' : undefined}
        title={message ?? 'Name of the stage'}
      />
      {message && <span className={styles.nameError}>{message}</span>}
    </h2>
  );
}

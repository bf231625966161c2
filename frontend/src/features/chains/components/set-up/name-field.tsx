import Input from 'antd/es/input';
import { useId } from 'react';

import type { Stage } from '../../../../api/types';
import { describedBy, Field } from '../../../../components/field';
import { useStageForm } from './use-stage-form';

export function NameField({ stage }: { stage: Stage }) {
  const id = useId();
  const { error, set, disabled } = useStageForm(stage);
  const message = error('name') ?? (stage.name.trim() === '' ? 'Give a name.' : null);
  return (
    <Field id={id} label="Name" error={message}>
      <Input
        id={id}
        value={stage.name}
        disabled={disabled}
        maxLength={200}
        onChange={(event) => set('name', 'name', { name: event.target.value })}
        status={message ? 'error' : undefined}
        aria-describedby={describedBy(id, message, null)}
      />
    </Field>
  );
}

import Input from 'antd/es/input';
import Modal from 'antd/es/modal';
import { useId, useState } from 'react';

import { fieldMessages } from '../../../../api/api-error';
import { ErrorNotice } from '../../../../components/error-notice';
import { Field, describedBy } from '../../../../components/field';

export const NAME_MAXIMUM = 120;

interface NameDialogProps {
  title: string;
  label: string;
  initial: string;
  okText: string;
  busy?: boolean;
  error?: unknown;
  onSubmit: (name: string) => void | Promise<void>;
  onClose: () => void;
}

export function nameProblem(name: string): string | null {
  if (name.trim() === '') return 'Give a name.';
  return name.trim().length > NAME_MAXIMUM ? `At most ${NAME_MAXIMUM} characters.` : null;
}

export function NameDialog({ title, label, initial, okText, busy, error, onSubmit, onClose }: NameDialogProps) {
  const id = useId();
  const [name, setName] = useState(initial);
  const [tried, setTried] = useState(false);
  const refused = fieldMessages(error)['name'];
  const message = (tried ? nameProblem(name) : null) ?? refused ?? null;
  const submit = () => {
    setTried(true);
    // A refusal shows up in `error`; the dialog stays open with what was typed.
    if (nameProblem(name) === null) void Promise.resolve(onSubmit(name.trim())).catch(() => undefined);
  };
  return (
    <Modal open title={title} okText={okText} confirmLoading={busy} onOk={submit} onCancel={onClose} destroyOnHidden>
      <Field id={id} label={label} error={message}>
        <Input
          id={id}
          autoFocus
          value={name}
          onChange={(event) => setName(event.target.value)}
          onPressEnter={submit}
          onFocus={(event) => event.target.select()}
          status={message ? 'error' : undefined}
          aria-describedby={describedBy(id, message, null)}
        />
      </Field>
      {!refused && <ErrorNotice error={error} />}
    </Modal>
  );
}

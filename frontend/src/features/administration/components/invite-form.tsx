import { Button } from 'antd';
import { useState, type FormEvent } from 'react';

import { fieldMessages } from '../../../api/api-error';
import type { CreatedUser, Role } from '../../../api/types';
import { ErrorNotice } from '../../../components/error-notice';
import { focusFirstProblem } from '../../../components/form-problems';
import { TextField } from '../../../components/text-field';
import { useCreatePerson } from '../mutations';
import styles from './people.module.css';
import { RoleChoice } from './role-choice';

interface InviteFormProps {
  onCreated: (created: CreatedUser) => void;
  onClose: () => void;
}

interface PersonDraft {
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}

function personProblems({ name, email, roles }: PersonDraft): Record<string, string> {
  const problems: Record<string, string> = {};
  if (name.trim() === '') problems['name'] = 'A name is needed.';
  if (!/^\S+@\S+$/.test(email.trim()))
    problems['email'] = 'An e-mail address is needed; it is the name of the account.';
  if (roles.length === 0) problems['roles'] = 'Choose at least one role.';
  return problems;
}

export function InviteForm({ onCreated, onClose }: InviteFormProps) {
  const [draft, setDraft] = useState<PersonDraft>({ name: '', email: '', roles: ['designer'] });
  const [tried, setTried] = useState(false);
  const create = useCreatePerson();
  const own = personProblems(draft);
  const problems = { ...fieldMessages(create.error), ...(tried ? own : {}) };
  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    setTried(true);
    if (focusFirstProblem(event.currentTarget, Object.keys(own).length > 0)) return;
    const person = { ...draft, name: draft.name.trim(), email: draft.email.trim() };
    create.mutate(person, { onSuccess: onCreated });
  };
  return (
    <form className={styles.form} onSubmit={submit} noValidate aria-label="New person">
      <div className={styles.fields}>
        <TextField
          label="Name"
          required
          autoFocus
          maxLength={120}
          value={draft.name}
          error={problems['name']}
          onChange={(name) => setDraft({ ...draft, name })}
        />
        <TextField
          label="E-mail address"
          required
          type="email"
          maxLength={254}
          value={draft.email}
          error={problems['email']}
          onChange={(email) => setDraft({ ...draft, email })}
        />
      </div>
      <RoleChoice roles={draft.roles} onChange={(roles) => setDraft({ ...draft, roles })} error={problems['roles']} />
      <ErrorNotice error={create.error} title="The person was not created." />
      <div className={styles.buttons}>
        <Button type="primary" htmlType="submit" loading={create.isPending}>
          Create and show the one-time link
        </Button>
        <Button onClick={onClose}>Cancel</Button>
      </div>
    </form>
  );
}

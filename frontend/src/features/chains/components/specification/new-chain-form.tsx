import Button from 'antd/es/button';
import { useState, type FormEvent } from 'react';
import { useNavigate } from 'react-router-dom';

import { fieldMessages } from '../../../../api/api-error';
import type { Specification } from '../../../../api/types';
import { ErrorNotice } from '../../../../components/error-notice';
import { focusFirstProblem } from '../../../../components/form-problems';
import { LeaveGuard } from '../../../../components/leave-guard';
import { LinkButton } from '../../../../components/link-button';
import { TextField } from '../../../../components/text-field';
import { EMPTY_SPECIFICATION } from '../../lib/specification-defaults';
import { useCreateChain } from '../../mutations';
import { nameProblem } from '../frame/name-dialog';
import { SpecificationForm, specificationMessages } from './specification-form';
import styles from './new-chain-form.module.css';

export function NewChainForm({ projectId, currency }: { projectId: string; currency: string }) {
  const navigate = useNavigate();
  const create = useCreateChain(projectId);
  const [name, setName] = useState('');
  const [specification, setSpecification] = useState<Specification>(EMPTY_SPECIFICATION);
  const [tried, setTried] = useState(false);
  const messages = fieldMessages(create.error);
  // What was refused may be right by now: the server is asked again, not quoted.
  const edit = (next: Specification): void => {
    setSpecification(next);
    if (create.error) create.reset();
  };
  const typed = name !== '' || specification !== EMPTY_SPECIFICATION;

  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    setTried(true);
    if (focusFirstProblem(event.currentTarget, nameProblem(name) !== null)) return;
    create.mutate(
      { name: name.trim(), specification },
      { onSuccess: (chain) => void navigate(`/projects/${projectId}/chains/${chain.id}`) },
    );
  };

  return (
    <form onSubmit={submit} noValidate className={styles.form}>
      <LeaveGuard when={typed && !create.isPending && !create.isSuccess} />
      <TextField
        className={styles.name}
        label="Name of the chain"
        value={name}
        required
        autoFocus
        error={(tried ? nameProblem(name) : null) ?? messages['name']}
        onChange={setName}
      />
      <SpecificationForm
        specification={specification}
        onChange={edit}
        messages={specificationMessages(messages)}
        currency={currency}
      />
      <ErrorNotice error={create.error} title="The chain was not created." />
      <div className={styles.actions}>
        <Button type="primary" htmlType="submit" loading={create.isPending}>
          Create the chain
        </Button>
        <LinkButton to={`/projects/${projectId}`}>Cancel</LinkButton>
      </div>
    </form>
  );
}

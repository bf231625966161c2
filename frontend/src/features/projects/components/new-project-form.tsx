import { Button } from 'antd';
import { useState, type FormEvent } from 'react';
import { useNavigate } from 'react-router-dom';

import { fieldMessages } from '../../../api/api-error';
import { ErrorNotice } from '../../../components/error-notice';
import { focusFirstProblem } from '../../../components/form-problems';
import { AFTER_SAVING, LeaveGuard } from '../../../components/leave-guard';
import { LinkButton } from '../../../components/link-button';
import { Section } from '../../../components/section';
import { useSessionUser } from '../../../components/session-context';
import { newProjectDraft, projectProblems } from '../lib/project-draft';
import { useCreateProject } from '../mutations';
import { AccessFields, IdentityFields } from './project-fields';
import styles from './project-form.module.css';

export function NewProjectForm() {
  const user = useSessionUser();
  const navigate = useNavigate();
  const [initial] = useState(() => newProjectDraft(user.id));
  const [draft, setDraft] = useState(initial);
  const [tried, setTried] = useState(false);
  const create = useCreateProject();
  const problems = { ...fieldMessages(create.error), ...(tried ? projectProblems(draft) : {}) };
  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    setTried(true);
    if (focusFirstProblem(event.currentTarget, Object.keys(projectProblems(draft)).length > 0)) return;
    create.mutate(draft, { onSuccess: (project) => void navigate(`/projects/${project.id}`, AFTER_SAVING) });
  };
  return (
    <form onSubmit={submit} noValidate>
      <LeaveGuard when={draft !== initial && !create.isPending && !create.isSuccess} />
      <IdentityFields draft={draft} onChange={setDraft} problems={problems} />
      <Section title="Access">
        <AccessFields draft={draft} onChange={setDraft} problems={problems} />
      </Section>
      <div className={styles.actions}>
        <Button type="primary" htmlType="submit" loading={create.isPending}>
          Create the project
        </Button>
        <LinkButton to="/projects">Cancel</LinkButton>
      </div>
      <ErrorNotice error={create.error} title="The project was not saved." />
    </form>
  );
}

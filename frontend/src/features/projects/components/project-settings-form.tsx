import { App, Button, ConfigProvider } from 'antd';
import { useState, type FormEvent } from 'react';
import { useNavigate } from 'react-router-dom';

import { fieldMessages, isApiError } from '../../../api/api-error';
import type { Project } from '../../../api/types';
import { ConflictDialog } from '../../../components/conflict-dialog';
import { ErrorNotice } from '../../../components/error-notice';
import { focusFirstProblem } from '../../../components/form-problems';
import { AFTER_SAVING, LeaveGuard } from '../../../components/leave-guard';
import { LinkButton } from '../../../components/link-button';
import { Section } from '../../../components/section';
import { draftOf, projectProblems } from '../lib/project-draft';
import { useDeleteProject, useUpdateProject } from '../mutations';
import { PolicyFields } from './policy-fields';
import { AccessFields, IdentityFields } from './project-fields';
import styles from './project-form.module.css';

/** What the server sent along with a refused, stale save. */
function newerProject(error: unknown): Project | null {
  return isApiError(error) && error.isStale ? ((error.details.current as Project | undefined) ?? null) : null;
}

function useProjectForm(project: Project) {
  const [base, setBase] = useState(project);
  const [initial, setInitial] = useState(() => draftOf(project));
  const [draft, setDraft] = useState(initial);
  const update = useUpdateProject(project.id);
  const restart = (from: Project): void => {
    const fresh = draftOf(from);
    setBase(from);
    setInitial(fresh);
    setDraft(fresh);
    update.reset();
  };
  const save = (version: number, onSaved: () => void): void =>
    update.mutate({ draft, version, withPolicy: base.can.setPolicy }, { onSuccess: onSaved });
  return { base, draft, setDraft, dirty: draft !== initial && !update.isSuccess, update, restart, save };
}

export function ProjectSettingsForm({ project }: { project: Project }) {
  const navigate = useNavigate();
  const { base, draft, setDraft, dirty, update, restart, save } = useProjectForm(project);
  const [tried, setTried] = useState(false);
  const newer = newerProject(update.error);
  const problems = { ...fieldMessages(update.error), ...(tried ? projectProblems(draft) : {}) };
  const leave = (): void => void navigate(`/projects/${project.id}`, AFTER_SAVING);
  const submit = (event: FormEvent<HTMLFormElement>): void => {
    event.preventDefault();
    setTried(true);
    if (focusFirstProblem(event.currentTarget, Object.keys(projectProblems(draft)).length > 0)) return;
    save(base.version, leave);
  };
  return (
    <form onSubmit={submit} noValidate>
      <LeaveGuard when={dirty && !update.isPending} />
      <ConflictDialog
        open={newer !== null}
        what="This project"
        saving={update.isPending}
        onKeepMine={() => newer && save(newer.version, leave)}
        onTakeTheirs={() => newer && restart(newer)}
        onClose={() => update.reset()}
      />
      {!base.can.edit && <p className="soft">Shown for information: designers and leads change it.</p>}
      <ConfigProvider componentDisabled={!base.can.edit}>
        <IdentityFields draft={draft} onChange={setDraft} problems={problems} />
        <Section title="Access">
          <fieldset className={styles.plain} disabled={!base.can.edit}>
            <AccessFields draft={draft} onChange={setDraft} problems={problems} />
          </fieldset>
        </Section>
      </ConfigProvider>
      <Section
        title="Margins"
        extra={base.can.setPolicy ? null : <span className="soft">Set by leads; shown for information.</span>}
      >
        {draft.policy && (
          <PolicyFields
            policy={draft.policy}
            problems={problems}
            disabled={!base.can.setPolicy}
            onChange={(policy) => setDraft({ ...draft, policy })}
          />
        )}
      </Section>
      <div className={styles.actions}>
        <Button type="primary" htmlType="submit" loading={update.isPending} disabled={!base.can.edit}>
          Save
        </Button>
        <LinkButton to={`/projects/${project.id}`}>Cancel</LinkButton>
        <DeleteProject project={base} />
      </div>
      {!newer && <ErrorNotice error={update.error} title="The project was not saved." />}
    </form>
  );
}

function DeleteProject({ project }: { project: Project }) {
  const { modal } = App.useApp();
  const navigate = useNavigate();
  const remove = useDeleteProject(project.id);
  if (!project.can.delete) return null;
  const ask = (): void =>
    void modal.confirm({
      title: `Delete ${project.code}?`,
      content: 'It has no chains. This cannot be undone.',
      okText: 'Delete',
      okButtonProps: { danger: true },
      onOk: () => remove.mutate(undefined, { onSuccess: () => void navigate('/projects') }),
    });
  return (
    <div className={styles.danger}>
      <Button danger onClick={ask} loading={remove.isPending}>
        Delete the project
      </Button>
      <ErrorNotice error={remove.error} />
    </div>
  );
}

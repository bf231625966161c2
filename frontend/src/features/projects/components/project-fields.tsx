import { useQuery } from '@tanstack/react-query';

import { usersQuery } from '../../../api/users-query';
import { ErrorNotice } from '../../../components/error-notice';
import { QuantityInput } from '../../../components/quantity-input';
import { SkeletonRows } from '../../../components/skeleton-rows';
import { TextField } from '../../../components/text-field';
import { useSessionUser } from '../../../components/session-context';
import type { ProjectDraft, ProjectProblems } from '../lib/project-draft';
import styles from './project-form.module.css';

export interface ProjectFieldsProps {
  draft: ProjectDraft;
  onChange: (draft: ProjectDraft) => void;
  problems: ProjectProblems;
}

const CURRENCIES = ['USD', 'EUR', 'GBP', 'CHF', 'JPY', 'CNY', 'INR', 'KRW', 'SEK', 'CAD', 'AUD'];

export function IdentityFields({ draft, onChange, problems }: ProjectFieldsProps) {
  return (
    <div className={styles.grid}>
      <TextField
        label="Code"
        required
        value={draft.code}
        maxLength={24}
        placeholder="PW-5"
        error={problems['code']}
        onChange={(code) => onChange({ ...draft, code })}
      />
      <TextField
        label="Name"
        required
        value={draft.name}
        maxLength={120}
        className={styles.wide}
        error={problems['name']}
        onChange={(name) => onChange({ ...draft, name })}
      />
      <TextField
        label="Description"
        multiline
        value={draft.description}
        maxLength={4000}
        className={styles.full}
        error={problems['description']}
        onChange={(description) => onChange({ ...draft, description })}
      />
      <TextField
        label="Currency"
        required
        value={draft.currency}
        maxLength={3}
        suggestions={CURRENCIES}
        error={problems['currency']}
        hint="One per project. A quote in another currency counts as no price."
        onChange={(currency) => onChange({ ...draft, currency: currency.toUpperCase() })}
      />
      <QuantityInput
        label="Boards per build"
        required
        unit="pieces"
        minimum={1}
        maximum={1e9}
        value={draft.buildQuantity}
        error={problems['buildQuantity']}
        hint="Prices are taken from the break for this quantity."
        onChange={(buildQuantity) => onChange({ ...draft, buildQuantity })}
      />
    </div>
  );
}

export function AccessFields({ draft, onChange, problems }: ProjectFieldsProps) {
  const { data: users, error, refetch } = useQuery(usersQuery());
  const own = useSessionUser();
  const members = new Set(draft.memberIds);
  const toggle = (id: string): void => {
    const next = members.has(id) ? draft.memberIds.filter((member) => member !== id) : [...draft.memberIds, id];
    onChange({ ...draft, memberIds: next });
  };
  return (
    <>
      <fieldset className={styles.choices}>
        <legend>Who sees it</legend>
        <label>
          <input type="radio" name="open" checked={draft.open} onChange={() => onChange({ ...draft, open: true })} />{' '}
          Everybody in the team
        </label>
        <label>
          <input type="radio" name="open" checked={!draft.open} onChange={() => onChange({ ...draft, open: false })} />{' '}
          Only its members; to others it does not exist
        </label>
      </fieldset>
      <fieldset className={styles.choices}>
        <legend>Members</legend>
        <ErrorNotice error={error} title="The people could not be loaded." onRetry={() => void refetch()} />
        {!users && !error && <SkeletonRows rows={3} />}
        <div className={styles.people}>
          {users
            ?.filter((user) => user.active || members.has(user.id))
            .map((user) => (
              <label key={user.id}>
                <input type="checkbox" checked={members.has(user.id)} onChange={() => toggle(user.id)} /> {user.name}{' '}
                <span className="soft">{user.active ? user.roles.join(', ') : 'deactivated'}</span>
              </label>
            ))}
        </div>
        {!draft.open && !members.has(own.id) && (
          <p role="alert" className={styles.warning}>
            You are not among the members: after saving you no longer see this project.
          </p>
        )}
        {problems['memberIds'] && (
          <p role="alert" className={styles.warning}>
            {problems['memberIds']}
          </p>
        )}
      </fieldset>
    </>
  );
}

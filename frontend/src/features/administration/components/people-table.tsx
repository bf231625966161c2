import { App, Button } from 'antd';

import { isApiError } from '../../../api/api-error';
import type { UserRow } from '../../../api/types';
import { useSessionUser } from '../../../components/session-context';
import { useUpdatePerson } from '../mutations';
import styles from './people.module.css';

interface PeopleTableProps {
  people: readonly UserRow[];
  onEdit: (person: UserRow) => void;
  onLink: (person: UserRow) => void;
}

export function PeopleTable({ people, onEdit, onLink }: PeopleTableProps) {
  return (
    <div className="table-scroll">
      <table className={`data-table ${styles.table}`}>
        <caption className="visually-hidden">People</caption>
        <thead>
          <tr>
            <th scope="col">Name</th>
            <th scope="col">E-mail address</th>
            <th scope="col">Roles</th>
            <th scope="col">Account</th>
            <th scope="col">
              <span className="visually-hidden">Actions</span>
            </th>
          </tr>
        </thead>
        <tbody>
          {people.map((person) => (
            <PersonRow key={person.id} person={person} onEdit={onEdit} onLink={onLink} />
          ))}
        </tbody>
      </table>
    </div>
  );
}

function stateOf({ active, hasPassword, demo }: UserRow): string {
  if (!active) return 'deactivated';
  if (demo) return 'active, invented for the demo';
  return hasPassword === false ? 'invited, no password yet' : 'active';
}

interface PersonRowProps extends Omit<PeopleTableProps, 'people'> {
  person: UserRow;
}

function PersonRow({ person, onEdit, onLink }: PersonRowProps) {
  const own = useSessionUser();
  return (
    <tr className={person.active ? undefined : styles.inactive}>
      <th scope="row">
        {person.name}
        {person.id === own.id && <span className="soft"> (you)</span>}
      </th>
      <td className={styles.email}>{person.email}</td>
      <td>{person.roles.join(', ')}</td>
      <td>{stateOf(person)}</td>
      <td>
        {person.can.edit && (
          <div className={styles.rowButtons}>
            <Button size="small" aria-label={`Edit ${person.name}`} onClick={() => onEdit(person)}>
              Edit
            </Button>
            {person.active && (
              <Button size="small" aria-label={`New one-time link for ${person.name}`} onClick={() => onLink(person)}>
                One-time link
              </Button>
            )}
            <ActiveButton person={person} />
          </div>
        )}
      </td>
    </tr>
  );
}

function ActiveButton({ person }: { person: UserRow }) {
  const { modal, message } = App.useApp();
  const update = useUpdatePerson();
  const set = (active: boolean): void =>
    update.mutate(
      { id: person.id, version: person.version, active },
      { onError: (error) => void message.error(isApiError(error) ? error.message : 'It did not work. Try again.') },
    );
  const ask = (): void =>
    void modal.confirm({
      title: `Deactivate ${person.name}?`,
      content: 'Signing in is refused from now on, and open sessions end. What this person made stays.',
      okText: 'Deactivate',
      okButtonProps: { danger: true },
      onOk: () => set(false),
    });
  return (
    <Button
      size="small"
      danger={person.active}
      loading={update.isPending}
      aria-label={`${person.active ? 'Deactivate' : 'Activate'} ${person.name}`}
      onClick={person.active ? ask : () => set(true)}
    >
      {person.active ? 'Deactivate' : 'Activate'}
    </Button>
  );
}

import { useQuery } from '@tanstack/react-query';
import { App, Button } from 'antd';
import { useState } from 'react';

import { isApiError } from '../../../api/api-error';
import type { PasswordLink, UserRow } from '../../../api/types';
import { usersQuery } from '../../../api/users-query';
import { ErrorNotice } from '../../../components/error-notice';
import { PageHeader } from '../../../components/page-header';
import { SkeletonRows } from '../../../components/skeleton-rows';
import { usePasswordLink } from '../mutations';
import { EditPerson } from './edit-person';
import { InviteForm } from './invite-form';
import { OneTimeLink } from './one-time-link';
import { PeopleTable } from './people-table';

interface ShownLink {
  readonly name: string;
  readonly link: PasswordLink;
}

export function PeoplePage() {
  const [inviting, setInviting] = useState(false);
  const [shown, setShown] = useState<ShownLink | null>(null);
  return (
    <>
      <PageHeader
        title="People"
        trail={[{ label: 'Administration' }]}
        extra={
          !inviting && (
            <Button type="primary" onClick={() => setInviting(true)}>
              Invite a person
            </Button>
          )
        }
      />
      {inviting && (
        <InviteForm
          onClose={() => setInviting(false)}
          onCreated={({ user, link }) => {
            setInviting(false);
            setShown({ name: user.name, link });
          }}
        />
      )}
      <PeopleList onLink={setShown} />
      <OneTimeLink name={shown?.name ?? ''} link={shown?.link ?? null} onClose={() => setShown(null)} />
    </>
  );
}

function PeopleList({ onLink }: { onLink: (shown: ShownLink) => void }) {
  const { data: people, error, refetch } = useQuery(usersQuery());
  const [editingId, setEditingId] = useState<string | null>(null);
  const makeLink = useLinkFor(onLink);
  const editing = people?.find((person) => person.id === editingId);
  return (
    <>
      <ErrorNotice error={error} title="The people could not be loaded." onRetry={() => void refetch()} />
      {!people && !error && <SkeletonRows />}
      {people && <PeopleTable people={people} onEdit={({ id }) => setEditingId(id)} onLink={makeLink} />}
      {editing && <EditPerson key={editing.id} person={editing} onClose={() => setEditingId(null)} />}
    </>
  );
}

/** A new link makes the old one void: ask first. */
function useLinkFor(show: (shown: ShownLink) => void): (person: UserRow) => void {
  const { modal, message } = App.useApp();
  const create = usePasswordLink();
  return (person) =>
    void modal.confirm({
      title: `New one-time link for ${person.name}?`,
      content: 'With it a new password can be chosen. Links given out before stop working.',
      okText: 'Make the link',
      onOk: () =>
        create.mutate(person.id, {
          onSuccess: (link) => show({ name: person.name, link }),
          onError: (error) => void message.error(isApiError(error) ? error.message : 'It did not work. Try again.'),
        }),
    });
}

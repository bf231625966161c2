import { Modal } from 'antd';
import { useState } from 'react';

import { fieldMessages } from '../../../api/api-error';
import type { UserRow } from '../../../api/types';
import { ErrorNotice } from '../../../components/error-notice';
import { TextField } from '../../../components/text-field';
import { useUpdatePerson } from '../mutations';
import { RoleChoice } from './role-choice';

/** Name and roles of a person; changed roles end that person's sessions. */
export function EditPerson({ person, onClose }: { person: UserRow; onClose: () => void }) {
  const [name, setName] = useState(person.name);
  const [roles, setRoles] = useState(person.roles);
  const update = useUpdatePerson();
  const problems = fieldMessages(update.error);
  const rolesProblem = roles.length === 0 ? 'Choose at least one role.' : problems['roles'];
  const nameProblem = name.trim() === '' ? 'A name is needed.' : problems['name'];
  const save = (): void => {
    if (roles.length === 0 || name.trim() === '') return;
    // The latest version: the list behind is refreshed after a refusal.
    update.mutate({ id: person.id, version: person.version, name: name.trim(), roles }, { onSuccess: onClose });
  };
  return (
    <Modal open title={person.name} okText="Save" onOk={save} confirmLoading={update.isPending} onCancel={onClose}>
      <TextField label="Name" value={name} maxLength={120} error={nameProblem} onChange={setName} />
      <div style={{ marginTop: 12 }}>
        <RoleChoice roles={roles} onChange={setRoles} error={rolesProblem} />
      </div>
      <p className="soft">When roles change, this person has to sign in again.</p>
      <ErrorNotice error={update.error} title="Not saved." />
    </Modal>
  );
}

import EllipsisOutlined from '@ant-design/icons/es/icons/EllipsisOutlined';
import Button from 'antd/es/button';
import Dropdown from 'antd/es/dropdown';
import { useState } from 'react';
import { flushSync } from 'react-dom';
import { useNavigate } from 'react-router-dom';

import { newId } from '../../lib/new-id';
import { useCreateOption, useDeleteOption, useRenameChain } from '../../mutations';
import { useWorkspace, type Workspace } from '../workspace-context';
import { ConfirmDialog } from './confirm-dialog';
import { NameDialog } from './name-dialog';

type Task = 'add' | 'duplicate' | 'rename' | 'rename-chain' | 'delete';

/** A name that is not taken: the first free letter. */
function freeName(taken: readonly string[]): string {
  const letters = Array.from('ABCDEFGHIJKLMNOPQRSTUVWXYZ');
  return letters.find((letter) => !taken.includes(letter)) ?? `Option ${taken.length + 1}`;
}

function menuItems({ chain, control, option }: Workspace) {
  return [
    { key: 'duplicate', label: control.dirty ? 'Save the changes as a new option…' : 'Duplicate this option…' },
    { key: 'add', label: 'Add an empty option…' },
    { key: 'rename', label: 'Rename this option…' },
    { key: 'rename-chain', label: 'Rename the chain…' },
    { type: 'divider' as const },
    {
      key: 'delete',
      label: 'Delete this option…',
      danger: true,
      disabled: chain.options.length < 2 || !option.can.delete,
    },
  ];
}

export function OptionMenu() {
  const workspace = useWorkspace();
  const [task, setTask] = useState<Task | null>(null);
  return (
    <>
      <Dropdown trigger={['click']} menu={{ items: menuItems(workspace), onClick: ({ key }) => setTask(key as Task) }}>
        <Button
          size="small"
          type="text"
          icon={<EllipsisOutlined />}
          aria-label="Options: add, duplicate, rename, delete"
        />
      </Dropdown>
      {(task === 'add' || task === 'duplicate') && (
        <NewOption copy={task === 'duplicate'} onClose={() => setTask(null)} />
      )}
      {task === 'rename' && <RenameOption onClose={() => setTask(null)} />}
      {task === 'rename-chain' && <RenameChain onClose={() => setTask(null)} />}
      {task === 'delete' && <DeleteOption onClose={() => setTask(null)} />}
    </>
  );
}

/** The changes have gone elsewhere: what is left here is what was saved, and nobody is asked about it. */
function useGoToOption(): (optionId: string) => void {
  const { control } = useWorkspace();
  const navigate = useNavigate();
  return (optionId) => {
    flushSync(() => control.revert());
    void navigate({ search: `?option=${optionId}` });
  };
}

function NewOption({ copy, onClose }: { copy: boolean; onClose: () => void }) {
  const { chain, option, control } = useWorkspace();
  const create = useCreateOption(chain.id);
  const goTo = useGoToOption();
  const submit = async (name: string) => {
    const stages = copy && control.dirty ? control.draft.stages.map((stage) => ({ ...stage, id: newId() })) : undefined;
    const created = await create.mutateAsync({ name, fromOptionId: copy ? option.id : undefined, stages });
    onClose();
    goTo(created.id);
  };
  return (
    <NameDialog
      title={copy ? 'New option from this one' : 'New empty option'}
      label="Name of the option"
      initial={freeName(chain.options.map((each) => each.name))}
      okText="Create"
      error={create.error}
      busy={create.isPending}
      onSubmit={submit}
      onClose={onClose}
    />
  );
}

function RenameOption({ onClose }: { onClose: () => void }) {
  const { control, edits } = useWorkspace();
  return (
    <NameDialog
      title="Rename this option"
      label="Name of the option"
      initial={control.draft.name}
      okText="Rename"
      onSubmit={(name) => {
        edits.rename(name);
        control.settle();
        onClose();
      }}
      onClose={onClose}
    />
  );
}

function RenameChain({ onClose }: { onClose: () => void }) {
  const { chain, control } = useWorkspace();
  const rename = useRenameChain(chain);
  return (
    <NameDialog
      title="Rename the chain"
      label="Name of the chain"
      initial={chain.name}
      okText="Rename"
      error={rename.error}
      busy={rename.isPending}
      onSubmit={async (name) => {
        const saved = await rename.mutateAsync(name);
        // The draft is not out of date because of a new name.
        control.rebase({ ...control.base, chainVersion: saved.version });
        onClose();
      }}
      onClose={onClose}
    />
  );
}

function DeleteOption({ onClose }: { onClose: () => void }) {
  const { chain, option, control } = useWorkspace();
  const remove = useDeleteOption(chain.id);
  const goTo = useGoToOption();
  const submit = async () => {
    const next = chain.options.find((each) => each.id !== option.id);
    await remove.mutateAsync({ id: option.id, version: control.base.optionVersion });
    onClose();
    if (next) goTo(next.id);
  };
  return (
    <ConfirmDialog
      title={`Delete the option ${control.draft.name}?`}
      okText="Delete"
      error={remove.error}
      busy={remove.isPending}
      onConfirm={submit}
      onClose={onClose}
    >
      Its {control.draft.stages.length} stages are deleted with it. This cannot be undone.
    </ConfirmDialog>
  );
}

import { useLayoutEffect, useRef, useState, type KeyboardEvent, type RefObject } from 'react';

import { neighbourOf, stageIndex } from '../../lib/draft';
import { useWorkspace, type Workspace } from '../workspace-context';
import { rowOf } from './row-of';

export interface RowKeys {
  /** The row that Tab reaches. */
  readonly currentId: string | null;
  readonly setCurrentId: (stageId: string) => void;
  readonly onKeyDown: (event: KeyboardEvent, stageId: string) => void;
}

type RowAction = (stageId: string) => void;

function keyName(event: KeyboardEvent): string {
  return `${event.altKey ? 'Alt+' : ''}${event.key}`;
}

/** What each key does in a row; keys that are not here keep their usual meaning. */
function rowActions(
  { control, edits, address, editable }: Workspace,
  go: RowAction,
): Readonly<Record<string, RowAction>> {
  const { draft } = control;
  const goBy = (step: number) => (stageId: string) => {
    const next = draft.stages[stageIndex(draft, stageId) + step];
    if (next) go(next.id);
  };
  const moveBy = (step: number) => (stageId: string) => {
    edits.move(stageId, stageIndex(draft, stageId) + step);
    go(stageId);
  };
  const reading = {
    ArrowDown: goBy(1),
    ArrowUp: goBy(-1),
    Home: () => draft.stages[0] && go(draft.stages[0].id),
    End: () => draft.stages.at(-1) && go(draft.stages.at(-1)?.id ?? ''),
    Enter: (stageId: string) => address.change({ stageId }),
    Escape: () => address.change({ stageId: null }),
  };
  if (!editable) return reading;
  return {
    ...reading,
    'Alt+ArrowDown': moveBy(1),
    'Alt+ArrowUp': moveBy(-1),
    Delete: (stageId) => {
      const neighbour = neighbourOf(draft, stageId);
      edits.remove(stageId);
      if (address.stageId === stageId) address.change({ stageId: neighbour });
      if (neighbour) go(neighbour);
    },
  };
}

/** Walking through the rows by keyboard: the set-up panel follows when it is open. */
export function useRowKeys(table: RefObject<HTMLElement | null>): RowKeys {
  const workspace = useWorkspace();
  const { control, address } = workspace;
  const [chosenId, setCurrentId] = useState<string | null>(null);
  const wanted = useRef<string | null>(null);
  const wantedId = address.stageId ?? chosenId;
  const known = control.draft.stages.some((stage) => stage.id === wantedId);
  const currentId = known ? wantedId : (control.draft.stages[0]?.id ?? null);

  // After the rows have been drawn in their new order; React may have taken the focused row out for a moment.
  useLayoutEffect(() => {
    if (wanted.current === null) return;
    const row = rowOf(table.current, wanted.current);
    wanted.current = null;
    row?.focus();
    row?.scrollIntoView({ block: 'nearest' });
  });

  const go = (stageId: string) => {
    wanted.current = stageId;
    setCurrentId(stageId);
    if (address.stageId !== null) address.change({ stageId });
  };
  const onKeyDown = (event: KeyboardEvent, stageId: string) => {
    const name = keyName(event);
    const onControl = event.target !== event.currentTarget;
    if (onControl && (name === 'Enter' || name === 'Delete')) return;
    const action = rowActions(workspace, go)[name];
    if (!action || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    action(stageId);
  };
  return { currentId, setCurrentId, onKeyDown };
}

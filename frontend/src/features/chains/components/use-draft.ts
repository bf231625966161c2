import { useEffect, useMemo, useReducer, useState } from 'react';

import type { Chain, OptionDto } from '../../../api/types';
import type { Draft } from '../lib/draft';
import {
  discardDraft,
  discardOutdatedDrafts,
  findDraft,
  findOutdatedDraft,
  storeDraft,
  type DraftPlace,
  type StoredDraft,
} from '../lib/draft-storage';
import {
  historyReducer,
  isDirty,
  redoLabel,
  startHistory,
  undoLabel,
  type DraftBase,
  type History,
} from '../lib/history';

export function baseOf(chain: Chain, option: OptionDto): DraftBase {
  return {
    draft: { name: option.name, stages: option.stages, specification: chain.specification },
    optionVersion: option.version,
    chainVersion: chain.version,
  };
}

function placeOf(userId: string, optionId: string, base: DraftBase): DraftPlace {
  return { userId, optionId, optionVersion: base.optionVersion, chainVersion: base.chainVersion };
}

export interface DraftEdit {
  (label: string, draft: Draft, mergeKey?: string): void;
}

/** A draft that this browser kept: either taken up again already, or from an older version and only offered. */
export type KeptDraft = { readonly kind: 'restored' | 'outdated'; readonly stored: StoredDraft };

export interface DraftControl {
  readonly optionId: string;
  readonly draft: Draft;
  readonly base: DraftBase;
  readonly dirty: boolean;
  readonly undoLabel: string | null;
  readonly redoLabel: string | null;
  readonly edit: DraftEdit;
  readonly settle: () => void;
  readonly undo: () => void;
  readonly redo: () => void;
  readonly saved: (base: DraftBase) => void;
  readonly rebase: (base: DraftBase) => void;
  readonly load: (base: DraftBase) => void;
  readonly kept: KeptDraft | null;
  readonly discardKept: () => void;
  readonly restoreKept: () => void;
  readonly dismissKept: () => void;
  /** Forgets the draft and returns to what is saved. */
  readonly revert: () => void;
}

function begin(userId: string, optionId: string, base: DraftBase): History {
  const stored = findDraft(localStorage, placeOf(userId, optionId, base));
  const history = startHistory(base);
  if (!stored) return history;
  return historyReducer(history, { type: 'edit', draft: stored.draft, label: 'changes kept in this browser' });
}

function firstKept(userId: string, optionId: string, history: History): KeptDraft | null {
  const place = placeOf(userId, optionId, history.base);
  const stored = findDraft(localStorage, place);
  if (stored && isDirty(history)) return { kind: 'restored', stored };
  const outdated = findOutdatedDraft(localStorage, place);
  return outdated ? { kind: 'outdated', stored: outdated } : null;
}

/** Every change of the draft is kept in this browser, so that a reload loses nothing. */
function useKeepDraft(place: DraftPlace, draft: Draft, dirty: boolean): void {
  const { userId, optionId, optionVersion, chainVersion } = place;
  useEffect(() => {
    const here = { userId, optionId, optionVersion, chainVersion };
    if (dirty) storeDraft(localStorage, here, draft, new Date().toISOString());
    else discardDraft(localStorage, here);
  }, [userId, optionId, optionVersion, chainVersion, draft, dirty]);
}

/** The draft of one option: give the component that uses it `key={optionId}`. */
export function useDraft(userId: string, chain: Chain, option: OptionDto): DraftControl {
  const optionId = option.id;
  const [history, dispatch] = useReducer(historyReducer, undefined, () =>
    begin(userId, optionId, baseOf(chain, option)),
  );
  const [kept, setKept] = useState(() => firstKept(userId, optionId, history));
  const dirty = useMemo(() => isDirty(history), [history]);
  const { base, present } = history;
  useKeepDraft(placeOf(userId, optionId, base), present, dirty);

  // Somebody else saved, and nothing is being edited here: show theirs.
  const newer = option.version > base.optionVersion || chain.version > base.chainVersion;
  useEffect(() => {
    if (newer && !dirty) dispatch({ type: 'load', base: baseOf(chain, option) });
  }, [newer, dirty, chain, option]);

  const actions = useMemo(
    () => ({
      edit: (label: string, draft: Draft, mergeKey?: string) => dispatch({ type: 'edit', label, draft, mergeKey }),
      settle: () => dispatch({ type: 'settle' }),
      undo: () => dispatch({ type: 'undo' }),
      redo: () => dispatch({ type: 'redo' }),
      saved: (next: DraftBase) => dispatch({ type: 'saved', base: next }),
      rebase: (next: DraftBase) => dispatch({ type: 'rebase', base: next }),
      load: (next: DraftBase) => dispatch({ type: 'load', base: next }),
      dismissKept: () => setKept(null),
    }),
    [],
  );

  const revert = () => {
    setKept(null);
    actions.edit('discard changes', base.draft);
  };
  const forgetOutdated = () => {
    discardOutdatedDrafts(localStorage, placeOf(userId, optionId, base));
    setKept(null);
  };
  return {
    optionId,
    draft: present,
    base,
    dirty,
    undoLabel: undoLabel(history),
    redoLabel: redoLabel(history),
    ...actions,
    kept,
    revert,
    discardKept: kept?.kind === 'outdated' ? forgetOutdated : revert,
    restoreKept: () => {
      if (kept) actions.edit('restore kept changes', kept.stored.draft);
      forgetOutdated();
    },
  };
}

import { draftKey } from './draft-key';
import type { Draft } from './draft';

/** The versions of the rows that the draft was begun from. */
export interface DraftBase {
  readonly draft: Draft;
  readonly optionVersion: number;
  readonly chainVersion: number;
}

interface Step {
  readonly draft: Draft;
  /** What was done to leave this draft, e.g. "move S2". */
  readonly label: string;
}

export interface History {
  readonly base: DraftBase;
  readonly present: Draft;
  readonly past: readonly Step[];
  readonly future: readonly Step[];
  /** Edits in a row with the same key are one step: a number typed digit by digit is undone at once. */
  readonly openKey: string | null;
}

export type HistoryAction =
  | { readonly type: 'edit'; readonly draft: Draft; readonly label: string; readonly mergeKey?: string }
  /** Ends a run of merged edits, e.g. when a field loses the focus. */
  | { readonly type: 'settle' }
  | { readonly type: 'undo' }
  | { readonly type: 'redo' }
  /** The server has taken this draft; what was typed in the meantime stays. */
  | { readonly type: 'saved'; readonly base: DraftBase }
  /** Another option, or their version: a new beginning. */
  | { readonly type: 'load'; readonly base: DraftBase; readonly draft?: Draft }
  /** Keep what is here, but count it as made from this newer base. */
  | { readonly type: 'rebase'; readonly base: DraftBase };

const STEPS_KEPT = 200;

export function startHistory(base: DraftBase, draft: Draft = base.draft): History {
  return { base, present: draft, past: [], future: [], openKey: null };
}

export function isDirty(history: History): boolean {
  return draftKey(history.present) !== draftKey(history.base.draft);
}

export function undoLabel(history: History): string | null {
  return history.past.at(-1)?.label ?? null;
}

export function redoLabel(history: History): string | null {
  return history.future[0]?.label ?? null;
}

function edit(history: History, action: Extract<HistoryAction, { type: 'edit' }>): History {
  if (action.draft === history.present) return history;
  const openKey = action.mergeKey ?? null;
  if (openKey !== null && openKey === history.openKey) return { ...history, present: action.draft, future: [] };
  const past = [...history.past, { draft: history.present, label: action.label }].slice(-STEPS_KEPT);
  return { ...history, present: action.draft, past, future: [], openKey };
}

function undo(history: History): History {
  const step = history.past.at(-1);
  if (!step) return history;
  return {
    ...history,
    present: step.draft,
    past: history.past.slice(0, -1),
    future: [{ draft: history.present, label: step.label }, ...history.future],
    openKey: null,
  };
}

function redo(history: History): History {
  const step = history.future[0];
  if (!step) return history;
  return {
    ...history,
    present: step.draft,
    past: [...history.past, { draft: history.present, label: step.label }],
    future: history.future.slice(1),
    openKey: null,
  };
}

export function historyReducer(history: History, action: HistoryAction): History {
  switch (action.type) {
    case 'edit':
      return edit(history, action);
    case 'settle':
      return history.openKey === null ? history : { ...history, openKey: null };
    case 'undo':
      return undo(history);
    case 'redo':
      return redo(history);
    case 'saved':
    case 'rebase':
      return { ...history, base: action.base, openKey: null };
    case 'load':
      return startHistory(action.base, action.draft);
  }
}

import { useState } from 'react';

import { isApiError } from '../../../api/api-error';
import type { Chain, OptionDto } from '../../../api/types';
import { useSaveDraft } from '../mutations';
import type { DraftBase } from '../lib/history';
import type { DraftControl } from './use-draft';

export interface SaveControl {
  readonly save: () => Promise<boolean>;
  readonly saving: boolean;
  readonly savedAt: Date | null;
  /** Anything but a conflict. */
  readonly error: unknown;
  /** What is saved now, when somebody else saved in between. */
  readonly conflict: DraftBase | null;
  readonly keepMine: () => Promise<boolean>;
  readonly takeTheirs: () => void;
  readonly decideLater: () => void;
}

/** The row as it is now comes with the refusal; it is either the option or the chain. */
function theirBase(current: unknown, base: DraftBase): DraftBase | null {
  if (typeof current !== 'object' || current === null) return null;
  if ('stages' in current) {
    const option = current as OptionDto;
    const draft = { ...base.draft, name: option.name, stages: option.stages };
    return { ...base, draft, optionVersion: option.version };
  }
  if ('specification' in current) {
    const chain = current as Chain;
    return { ...base, draft: { ...base.draft, specification: chain.specification }, chainVersion: chain.version };
  }
  return null;
}

export function useSave(chainId: string, control: DraftControl): SaveControl {
  const mutation = useSaveDraft();
  const [savedAt, setSavedAt] = useState<Date | null>(null);
  const [conflict, setConflict] = useState<DraftBase | null>(null);
  const { draft, optionId } = control;

  const saveFrom = async (base: DraftBase): Promise<boolean> => {
    let reached = base;
    const onProgress = (next: DraftBase) => {
      reached = next;
      control.saved(next);
    };
    try {
      await mutation.mutateAsync({ chainId, optionId, base, draft, onProgress });
      setSavedAt(new Date());
      setConflict(null);
      control.dismissKept();
      return true;
    } catch (error) {
      const theirs = isApiError(error) && error.isStale ? theirBase(error.details.current, reached) : null;
      setConflict(theirs);
      return false;
    }
  };

  return {
    save: () => (control.dirty ? saveFrom(control.base) : Promise.resolve(true)),
    saving: mutation.isPending,
    savedAt,
    error: conflict ? null : mutation.error,
    conflict,
    keepMine: () => {
      if (!conflict) return Promise.resolve(false);
      control.rebase(conflict);
      return saveFrom(conflict);
    },
    takeTheirs: () => {
      if (!conflict) return;
      control.rebase(conflict);
      // An edit like any other, so that one's own version can be had back by undo.
      control.edit('take the saved version', conflict.draft);
      setConflict(null);
    },
    decideLater: () => setConflict(null),
  };
}

import { useMemo } from 'react';

import type { Specification, Stage } from '../../../api/types';
import {
  addStage,
  applyRemedy,
  duplicateStage,
  moveStage,
  removeStage,
  replaceStage,
  stageIndex,
  type Draft,
} from '../lib/draft';
import { newId } from '../lib/new-id';
import type { DraftEdit } from './use-draft';

export interface StageEdits {
  /** Edits of one field merge into one step of undo. */
  readonly update: (stage: Stage, label: string, field?: string) => void;
  readonly add: (stage: Stage, afterId: string | null) => void;
  /** Returns the id of the copy. */
  readonly duplicate: (stageId: string) => string;
  readonly remove: (stageId: string) => void;
  readonly move: (stageId: string, toIndex: number) => void;
  readonly applyRemedy: (stageId: string | null, stages: readonly Stage[], action: string) => void;
  readonly specify: (specification: Specification, field?: string) => void;
  readonly rename: (name: string) => void;
}

export function stageTitle(draft: Draft, stageId: string): string {
  const index = stageIndex(draft, stageId);
  return `S${index + 1} ${draft.stages[index]?.name ?? ''}`.trim();
}

export function useStageEdits(draft: Draft, edit: DraftEdit): StageEdits {
  return useMemo(() => {
    const titled = (stageId: string) => stageTitle(draft, stageId);
    return {
      update: (stage, label, field) => {
        const mergeKey = field === undefined ? undefined : `${stage.id}.${field}`;
        edit(`${label} of ${titled(stage.id)}`, replaceStage(draft, stage), mergeKey);
      },
      add: (stage, afterId) => edit(`add ${stage.name}`, addStage(draft, stage, afterId)),
      duplicate: (stageId) => {
        const copyId = newId();
        edit(`duplicate ${titled(stageId)}`, duplicateStage(draft, stageId, copyId));
        return copyId;
      },
      remove: (stageId) => edit(`remove ${titled(stageId)}`, removeStage(draft, stageId)),
      move: (stageId, toIndex) => edit(`move ${titled(stageId)}`, moveStage(draft, stageId, toIndex)),
      applyRemedy: (stageId, stages, action) => edit(action, applyRemedy(draft, stageId, stages)),
      specify: (specification, field) =>
        edit(
          'edit the specification',
          { ...draft, specification },
          field === undefined ? undefined : `specification.${field}`,
        ),
      rename: (name) => edit('rename the option', { ...draft, name }, 'name'),
    };
  }, [draft, edit]);
}

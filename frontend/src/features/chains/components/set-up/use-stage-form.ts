import type { Stage } from '../../../../api/types';
import { stageIndex } from '../../lib/draft';
import { useWorkspace } from '../workspace-context';

export interface StageForm<S extends Stage> {
  readonly stage: S;
  readonly disabled: boolean;
  /** Message of the server for a field of this stage. */
  readonly error: (field: string) => string | null;
  /** Changes one field: what is typed in a row is one step of undo. */
  readonly set: (field: keyof S & string, label: string, change: Partial<S>) => void;
  readonly replace: (next: Stage, label: string, field?: string) => void;
}

export function useStageForm<S extends Stage>(stage: S): StageForm<S> {
  const { control, edits, preview, editable } = useWorkspace();
  const index = stageIndex(control.draft, stage.id);
  return {
    stage,
    disabled: !editable,
    error: (field) => preview.messages[`stages.${index}.${field}`] ?? null,
    set: (field, label, change) => edits.update({ ...stage, ...change }, label, field),
    replace: (next, label, field) => edits.update(next, label, field),
  };
}

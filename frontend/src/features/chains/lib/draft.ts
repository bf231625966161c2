import type { Specification, Stage } from '../../../api/types';

/** What a person edits in the workspace before it is saved: the option's stages and name, and the chain's specification. */
export interface Draft {
  readonly name: string;
  readonly stages: readonly Stage[];
  readonly specification: Specification;
}

export function stageIndex(draft: Draft, stageId: string): number {
  return draft.stages.findIndex((stage) => stage.id === stageId);
}

/** Puts a stage behind the one named, or at the end. */
export function addStage(draft: Draft, stage: Stage, afterId: string | null): Draft {
  const at = afterId === null ? -1 : stageIndex(draft, afterId);
  const position = at < 0 ? draft.stages.length : at + 1;
  return { ...draft, stages: draft.stages.toSpliced(position, 0, stage) };
}

export function duplicateStage(draft: Draft, stageId: string, newId: string): Draft {
  const original = draft.stages.find((stage) => stage.id === stageId);
  if (!original) return draft;
  return addStage(draft, { ...original, id: newId }, stageId);
}

export function removeStage(draft: Draft, stageId: string): Draft {
  return { ...draft, stages: draft.stages.filter((stage) => stage.id !== stageId) };
}

/** Moves a stage to a position; positions outside the chain are held at its ends. */
export function moveStage(draft: Draft, stageId: string, toIndex: number): Draft {
  const from = stageIndex(draft, stageId);
  const to = Math.max(0, Math.min(draft.stages.length - 1, toIndex));
  const stage = draft.stages[from];
  if (!stage || from === to) return draft;
  return { ...draft, stages: draft.stages.toSpliced(from, 1).toSpliced(to, 0, stage) };
}

export function replaceStage(draft: Draft, stage: Stage): Draft {
  return { ...draft, stages: draft.stages.map((each) => (each.id === stage.id ? stage : each)) };
}

/**
 * A remedy replaces one stage by the stages that it brings. One with the same id keeps its place; the others follow it.
 * When the remedy brings the whole chain (every present id is in it), it is taken as it is.
 */
export function applyRemedy(draft: Draft, stageId: string | null, stages: readonly Stage[]): Draft {
  const brought = new Set(stages.map((stage) => stage.id));
  if (stageId === null || draft.stages.every((stage) => brought.has(stage.id))) return { ...draft, stages };
  const at = stageIndex(draft, stageId);
  if (at < 0) return draft;
  const kept = draft.stages.filter((stage) => stage.id === stageId || !brought.has(stage.id));
  const position = kept.findIndex((stage) => stage.id === stageId);
  return { ...draft, stages: kept.toSpliced(position, 1, ...stages) };
}

/** The stage to select when this one goes: the one behind it, else the one before. */
export function neighbourOf(draft: Draft, stageId: string): string | null {
  const at = stageIndex(draft, stageId);
  return (draft.stages[at + 1] ?? draft.stages[at - 1])?.id ?? null;
}

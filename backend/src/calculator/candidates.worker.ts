import { EngineInputError, tryDevices } from './engine';
import type { CandidatesReport, ChainInput, Device, EngineIssue } from './engine';

export interface CandidatesTask {
  readonly input: ChainInput;
  readonly stageId: string;
  readonly candidates: readonly Device[];
}

/** Class instances do not survive the way between threads, so a refusal travels as data. */
export type CandidatesAnswer = { readonly report: CandidatesReport } | { readonly issues: readonly EngineIssue[] };

/** Runs in a thread of its own: hundreds of whole-chain calculations would hold up everybody's typing. */
export default function runCandidates({ input, stageId, candidates }: CandidatesTask): CandidatesAnswer {
  try {
    return { report: tryDevices(input, stageId, candidates) };
  } catch (error) {
    if (error instanceof EngineInputError) return { issues: error.issues };
    throw error;
  }
}

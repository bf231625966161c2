import { refusable } from './calculation.worker';
import type { Refusal } from './calculation.worker';
import { tryDevices } from './engine';
import type { ChainInput, Device } from './engine';
import { warmUp } from './warm-up';

export interface CandidatesTask {
  readonly input: ChainInput;
  readonly stageId: string;
  readonly candidates: readonly Device[];
}

export type CandidatesAnswer = { readonly json: string } | Refusal;

/** Runs in a thread of its own: hundreds of whole-chain calculations would hold up everybody's typing. */
export default function runCandidates({ input, stageId, candidates }: CandidatesTask): CandidatesAnswer {
  return refusable(() => ({ json: JSON.stringify(tryDevices(input, stageId, candidates)) }));
}

warmUp((input) => runCandidates({ input, stageId: '2', candidates: input.devices }));

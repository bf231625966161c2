import { analyzeChain } from '../chain/analyze-chain';
import { judge } from '../checks/judge';
import type { Judgement } from '../checks/judge';
import type { ChainInput } from '../types';
import { EngineInputError } from '../errors';
import { factsOf } from './facts';

/**
 * The whole chain in the project's GBW case only: facts and checks, no remedies. What lists, remedies and tried devices use.
 *
 * @param input whole chain
 * @throws EngineInputError when the input is refused
 */
export function evaluate(input: ChainInput): Judgement {
  const { gbwCase } = input.policy;
  return judge(factsOf(input, analyzeChain(input, { cases: [gbwCase] }), gbwCase));
}

/** As `evaluate`; null when this chain is refused (a remedy or a device that cannot stand here). */
export function tryEvaluate(input: ChainInput): Judgement | null {
  try {
    return evaluate(input);
  } catch (error) {
    if (error instanceof EngineInputError) return null;
    throw error;
  }
}

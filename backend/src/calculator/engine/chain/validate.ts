import type { EngineIssue } from '../errors';
import type { ChainInput } from '../types';

/** Everything that is wrong with an input; empty when it can be calculated. Never throws. */
export function validateChain(_input: ChainInput): EngineIssue[] {
  return [];
}

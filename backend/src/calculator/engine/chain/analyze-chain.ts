import type { ChainAnalysis } from '../analysis';
import type { ChainInput, GbwCase } from '../types';

export interface AnalyzeOptions {
  /** Cases to compute; absent: all three. The others are missing from `cases` of the answer. */
  readonly cases?: readonly GbwCase[];
  /** True when the caller has validated the input already (trying many devices in one chain). */
  readonly validated?: boolean;
}

/** The network analysis of a whole chain. Throws EngineInputError when the input cannot be calculated. */
export function analyzeChain(_input: ChainInput, _options?: AnalyzeOptions): ChainAnalysis {
  throw new Error('not available yet');
}

import type { ChainAnalysis, ChainCaseAnalysis } from '../analysis';
import { EngineInputError } from '../errors';
import { hotIsMinimum } from '../devices/used-values';
import { ChainInput, GBW_CASES, GbwCase } from '../types';
import { analyzeCase } from './chain-case';
import { ChainNetwork } from './chain-network';
import { ChainResponse } from './response';
import { stabilityOfChain } from './stability-analysis';
import { validateChain } from './validate';

export interface AnalyzeOptions {
  /** Cases to compute; absent: all three. The others are missing from `cases` of the answer. */
  readonly cases?: readonly GbwCase[];
  /** True when the caller has validated the input already (trying many devices in one chain). */
  readonly validated?: boolean;
}

/**
 * The network analysis of a whole chain: every figure per stage and chain in the cases asked for, and the stability of
 * every feedback stage at both ends of the GBW range. SI units, dB where a name ends in Db.
 *
 * @throws EngineInputError with every issue when the input cannot be calculated
 * @example analyzeChain(input).cases.minimum.stages[1].headroomTop // { value: 0.974 }
 */
export function analyzeChain(input: ChainInput, options: AnalyzeOptions = {}): ChainAnalysis {
  if (!options.validated) assertValid(input);
  const cases: Partial<Record<GbwCase, ChainCaseAnalysis>> = {};
  let minimum: ChainResponse | undefined;
  for (const gbwCase of options.cases ?? GBW_CASES) {
    if (gbwCase === 'minimumHot' && cases.minimum && hotIsMinimum(input.policy)) {
      cases.minimumHot = { ...cases.minimum, gbwCase };
      continue;
    }
    const response = new ChainResponse(input, new ChainNetwork(input, gbwCase));
    if (gbwCase === 'minimum') minimum = response;
    cases[gbwCase] = analyzeCase(input, response, gbwCase);
  }
  return { cases: cases as ChainAnalysis['cases'], stability: stabilityOfChain(input, minimum) };
}

/** Throws EngineInputError with everything that is wrong with an input. */
export function assertValid(input: ChainInput): void {
  const issues = validateChain(input);
  if (issues.length > 0) throw new EngineInputError(issues);
}

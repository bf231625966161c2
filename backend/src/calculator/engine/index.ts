/**
 * The only door of the calculator. Framework-free: plain data in, plain data out, nothing imported from outside.
 */
import { tryDevicesInStage } from './candidates/try-devices';
import { computeCurves } from './chain/curves';
import { buildReport } from './report/build-report';
import { summarizeChain } from './report/summarize';
import { buildWorking } from './working/build-working';
import type {
  CandidatesReport,
  ChainReport,
  ChainSummary,
  CurveRequest,
  Curves,
  Working,
  WorkingRequest,
} from './report';
import type { ChainInput, Device } from './types';

export { compareCandidates } from './candidates/try-devices';
export { validateChain } from './chain/validate';
export { EngineInputError, ENGINE_ISSUE_CODES } from './errors';
export type { EngineIssue, EngineIssueCode } from './errors';
export { RANGES } from './chain/issue-collector';
export type { Range, RangeName } from './chain/issue-collector';
export { DEFAULT_POLICY, policyFrom } from './policy';
export { CUSTOMARY_TOLERANCE, nearestPreferred, preferredDecade, PREFERRED_SERIES } from './preferred-values';
export type { PreferredSeries } from './preferred-values';
export { CALCULATOR_VERSION } from './version';
export * from './types';
export * from './report';

/**
 * Everything that is said of a chain: figures in three GBW cases, verdicts, sentences, remedies, lanes, cost.
 *
 * @param input specification, policy, stages and devices in SI units
 * @param alternatives devices that remedies may propose beside those of the input, e.g. the library; only active ones are
 * @returns the report; every number finite, every missing one with its reason
 * @throws EngineInputError with all issues (stable code and path) when the input cannot be calculated
 * @example calculate(input).verdict.lead // 'S2 spends more than it has.'
 */
export function calculate(input: ChainInput, alternatives: readonly Device[] = []): ChainReport {
  return buildReport(input, alternatives);
}

/**
 * Gain and phase over frequency, of the chain and of every stage, in three GBW cases.
 *
 * @param input whole chain
 * @param request from, to in Hz and number of points
 * @throws EngineInputError
 * @example curves(input, { fromHz: 1e6, toHz: 1e8, points: 401 }).chain.minimum.gainDb.length // 401
 */
export function curves(input: ChainInput, request: CurveRequest): Curves {
  return computeCurves(input, request);
}

/**
 * How one figure came about: formula, substituted values, result, data with their origin, assumptions, limits, source.
 *
 * @param input whole chain
 * @param request stage (null: chain), figure and GBW case
 * @throws EngineInputError also when there is no such stage or figure
 * @example working(input, { stageId, figure: 'headroom', gbwCase: 'minimum' }).result // '×0.974'
 */
export function working(input: ChainInput, request: WorkingRequest): Working {
  return buildWorking(input, request);
}

/**
 * Each device put in one very stage, the whole chain evaluated again in the project's case.
 *
 * @param input whole chain
 * @param stageId the stage
 * @param devices devices to try; those of another kind are left out
 * @throws EngineInputError
 * @example tryDevices(input, stageId, devices).candidates[0].verdict // 'clear'
 */
export function tryDevices(input: ChainInput, stageId: string, devices: readonly Device[]): CandidatesReport {
  return tryDevicesInStage(input, stageId, devices);
}

/**
 * Verdict, worst headroom, gain and cost of a chain, cheap enough for lists.
 *
 * @param input whole chain
 * @throws EngineInputError
 * @example summarize(input).worstHeadroomStage // 'S2 Gain'
 */
export function summarize(input: ChainInput): ChainSummary {
  return summarizeChain(input);
}

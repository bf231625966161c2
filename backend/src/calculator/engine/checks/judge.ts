import type { Check, Verdict } from '../report';
import type { ChainFacts, StageFacts } from '../report/facts';
import { bandwidthCheck, lowerCornerCheck } from './bandwidth-check';
import {
  costCheck,
  inputNoiseCheck,
  noiseFigureCheck,
  outputOffsetCheck,
  polarityCheck,
  supplyCurrentCheck,
  supplyPowerCheck,
} from './budget-checks';
import { feedbackResistorCheck } from './current-feedback-check';
import { chainLowerCornerCheck, flatnessCheck, gainCheck, upperCornerCheck } from './gain-checks';
import { gbwCheck } from './gbw-check';
import { compressionCheck, supplyVoltageCheck } from './device-limit-checks';
import { loopGainCheck, outputCurrentCheck, slewCheck, swingCheck } from './level-checks';
import { stabilityCheck } from './stability-check';
import { worstVerdict } from './verdict-order';

const STAGE_CHECKS: readonly ((facts: ChainFacts, stage: StageFacts) => Check | null)[] = [
  gbwCheck,
  bandwidthCheck,
  lowerCornerCheck,
  stabilityCheck,
  slewCheck,
  swingCheck,
  compressionCheck,
  outputCurrentCheck,
  supplyVoltageCheck,
  loopGainCheck,
  feedbackResistorCheck,
];

const CHAIN_CHECKS: readonly ((facts: ChainFacts) => Check | null)[] = [
  gainCheck,
  flatnessCheck,
  upperCornerCheck,
  chainLowerCornerCheck,
  inputNoiseCheck,
  noiseFigureCheck,
  outputOffsetCheck,
  supplyCurrentCheck,
  supplyPowerCheck,
  costCheck,
  polarityCheck,
];

/** What was found of a chain in the project's case, without remedies. */
export interface Judgement {
  readonly facts: ChainFacts;
  /** By stage, in signal order. */
  readonly stageChecks: readonly (readonly Check[])[];
  readonly stageVerdicts: readonly Verdict[];
  /** The specification's requirements. */
  readonly chainChecks: readonly Check[];
  /** Worst stage or requirement. A chain without stages is unknown. */
  readonly verdict: Verdict;
}

/**
 * All checks that apply to a chain, by the facts of the project's GBW case. A requirement that is not set is no check.
 *
 * @param facts facts in the project's case
 */
export function judge(facts: ChainFacts): Judgement {
  const stageChecks = facts.stages.map((stage) => present(STAGE_CHECKS.map((check) => check(facts, stage))));
  const chainChecks = present(CHAIN_CHECKS.map((check) => check(facts)));
  const stageVerdicts = stageChecks.map((checks) => worstVerdict(checks.map((check) => check.verdict)));
  const found = worstVerdict([...stageVerdicts, ...chainChecks.map((check) => check.verdict)]);
  const verdict = facts.stages.length === 0 ? 'unknown' : found;
  return { facts, stageChecks, stageVerdicts, chainChecks, verdict };
}

function present(checks: readonly (Check | null)[]): readonly Check[] {
  return checks.filter((check) => check !== null);
}

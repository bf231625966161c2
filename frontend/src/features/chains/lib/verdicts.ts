import type { Check, CheckId, Verdict } from '../../../api/types';

const BADNESS: Readonly<Record<Verdict, number>> = { clear: 0, tight: 1, unknown: 2, over: 3 };

export function worstVerdict(verdicts: readonly Verdict[]): Verdict | null {
  return verdicts.reduce<Verdict | null>(
    (worst, verdict) => (worst === null || BADNESS[verdict] > BADNESS[worst] ? verdict : worst),
    null,
  );
}

/** The worst of some checks; null when none of them was made. */
export function verdictOf(checks: readonly Check[], ...ids: readonly CheckId[]): Verdict | null {
  return worstVerdict(checks.filter((check) => ids.includes(check.id)).map((check) => check.verdict));
}

/** The tone of a figure in the ledger: a clear one stays in ink, so that what is not clear stands out. */
export function toneOf(checks: readonly Check[], ...ids: readonly CheckId[]): Verdict | undefined {
  const verdict = verdictOf(checks, ...ids);
  return verdict === null || verdict === 'clear' ? undefined : verdict;
}

/** The checks that a lane shows: how far up and down the axis a stage carries. */
const LANE_CHECKS: readonly CheckId[] = ['gbw', 'bandwidth', 'lower-corner'];
const CHAIN_LANE_CHECKS: readonly CheckId[] = ['upper-corner', 'chain-lower-corner', 'flatness', 'gain', 'bandwidth'];

export function laneVerdict(checks: readonly Check[], fallback: Verdict): Verdict {
  return verdictOf(checks, ...LANE_CHECKS) ?? fallback;
}

interface Checked {
  readonly checks: readonly Check[];
}

/** The chain carries as far as its worst stage does, and as its own requirements say. */
export function chainLaneVerdict({ checks, stages }: Checked & { readonly stages: readonly Checked[] }): Verdict {
  const ofStages = stages.map((stage) => verdictOf(stage.checks, ...LANE_CHECKS)).filter((verdict) => verdict !== null);
  const ofChain = verdictOf(checks, ...CHAIN_LANE_CHECKS);
  return worstVerdict(ofChain === null ? ofStages : [...ofStages, ofChain]) ?? 'clear';
}

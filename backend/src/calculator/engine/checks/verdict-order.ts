import { CHECK_IDS } from '../report';
import type { Check, Unit, Verdict } from '../report';

/** From best to worst. */
const BADNESS: Readonly<Record<Verdict, number>> = { clear: 0, tight: 1, unknown: 2, over: 3 };

/** How bad a verdict is: over > unknown > tight > clear. */
export function badness(verdict: Verdict): number {
  return BADNESS[verdict];
}

/** The worst of several verdicts; clear when there are none. */
export function worstVerdict(verdicts: readonly Verdict[]): Verdict {
  return verdicts.reduce<Verdict>((worst, each) => (badness(each) > badness(worst) ? each : worst), 'clear');
}

/**
 * The check that a verdict rests on: the worst; among equals the one furthest from its limit in the same check, else the
 * earlier kind of check.
 */
export function worstCheck(checks: readonly Check[]): Check | null {
  return checks.reduce<Check | null>((worst, each) => (worst === null || isWorse(each, worst) ? each : worst), null);
}

/** True when check `a` is worse than check `b`. */
export function isWorse(a: Check, b: Check): boolean {
  if (a.verdict !== b.verdict) return badness(a.verdict) > badness(b.verdict);
  if (a.id !== b.id) return CHECK_IDS.indexOf(a.id) < CHECK_IDS.indexOf(b.id);
  return distance(a) > distance(b);
}

const LEVELS: ReadonlySet<Unit> = new Set<Unit>(['dB', 'dBΩ', 'deg']);

/**
 * How far a check's figure is on the wrong side of its limit or target; negative on the right side. Checks of one kind are
 * compared, and all those that several stages have ask for at least their limit, a lower corner for at most.
 */
function distance({ id, actual, limit }: Check): number {
  if (!actual || !limit || actual.value === null || limit.value === null) return 0;
  return LEVELS.has(actual.unit)
    ? (limit.value - actual.value) / Math.max(Math.abs(limit.value), 1)
    : ratioShort(id, actual.value, limit.value);
}

/** By how much a ratio-like figure falls short of its limit, as a logarithm. */
function ratioShort(id: Check['id'], actual: number, limit: number): number {
  if (actual <= 0 || limit <= 0) return Number.POSITIVE_INFINITY;
  const short = Math.log(limit / actual);
  if (id === 'supply-voltage') return Math.abs(short);
  return id === 'lower-corner' ? -short : short;
}

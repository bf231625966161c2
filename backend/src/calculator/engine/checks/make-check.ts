import type { Check, CheckId, Figure, Verdict } from '../report';
import { isAbove, isBelow } from '../text/deciding-digits';

/** A check without remedies; they are found later, only where they are asked for. */
export function makeCheck(
  id: CheckId,
  title: string,
  verdict: Verdict,
  sentence: string,
  figures: { readonly actual?: Figure | null; readonly limit?: Figure | null } = {},
): Check {
  return { id, title, verdict, actual: figures.actual ?? null, limit: figures.limit ?? null, sentence, remedies: [] };
}

/** Something is missing: never green. */
export function unknownCheck(id: CheckId, title: string, sentence: string, actual: Figure | null = null): Check {
  return makeCheck(id, title, 'unknown', sentence, { actual });
}

/** Verdict of a ratio that has to be at least 1 and should reach a target. Compared before rounding. */
export function verdictAtLeast(value: number, limit: number, target: number): Verdict {
  if (isBelow(value, limit)) return 'over';
  return isBelow(value, target) ? 'tight' : 'clear';
}

/** Verdict of a value that must not exceed a limit and should stay below a target under it. */
export function verdictAtMost(value: number, limit: number, target: number): Verdict {
  if (isAbove(value, limit)) return 'over';
  return isAbove(value, target) ? 'tight' : 'clear';
}

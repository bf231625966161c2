import type { Check, CheckId, Figure, Verdict } from '../report';
import { isAbove, isBelow } from '../text/deciding-digits';

/** What a check shows beside its sentence. */
export interface CheckFigures {
  readonly actual?: Figure | null;
  readonly limit?: Figure | null;
}

/**
 * A check whose words and figures are written only when somebody reads them: trying hundreds of devices needs verdicts, and
 * sentences of the few checks that decide. Spreading or cloning it gives plain data.
 */
class WrittenWhenRead implements Check {
  readonly remedies: Check['remedies'] = [];
  private written: string | undefined;
  private shown: CheckFigures | undefined;

  constructor(
    readonly id: CheckId,
    readonly title: string,
    readonly verdict: Verdict,
    private readonly write: () => string,
    private readonly show: () => CheckFigures,
  ) {}

  get sentence(): string {
    return (this.written ??= this.write());
  }

  get actual(): Figure | null {
    return (this.shown ??= this.show()).actual ?? null;
  }

  get limit(): Figure | null {
    return (this.shown ??= this.show()).limit ?? null;
  }
}

const NO_FIGURES = (): CheckFigures => ({});

/** A check without remedies; they are found later, only where they are asked for. */
export function makeCheck(
  id: CheckId,
  title: string,
  verdict: Verdict,
  sentence: () => string,
  figures: () => CheckFigures = NO_FIGURES,
): Check {
  return new WrittenWhenRead(id, title, verdict, sentence, figures);
}

/** Something is missing: never green. */
export function unknownCheck(id: CheckId, title: string, sentence: () => string, actual?: () => Figure | null): Check {
  return new WrittenWhenRead(id, title, 'unknown', sentence, () => ({ actual: actual?.() ?? null }));
}

/** The check as plain data. */
export function plainCheck(check: Check, remedies: Check['remedies']): Check {
  const { id, title, verdict, actual, limit, sentence } = check;
  return { id, title, verdict, actual, limit, sentence, remedies };
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

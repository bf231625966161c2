import { preferredValuesBetween, type ResistorSeries } from './resistor-series';

export interface ResistorPair {
  readonly feedbackOhm: number;
  readonly gainOhm: number;
}

/** Rf ÷ Rg that a wanted signed gain takes: G − 1 non-inverting, −G inverting. */
export function ratioForGain(topology: 'non-inverting' | 'inverting', gain: number): number {
  return topology === 'non-inverting' ? gain - 1 : Math.abs(gain);
}

export function gainOfResistors(
  topology: string,
  feedbackOhm: number,
  gainOhm: number | null | undefined,
): number | null {
  if (topology === 'follower') return 1;
  if (topology === 'transimpedance') return -feedbackOhm;
  if (topology === 'non-inverting') return gainOhm ? 1 + feedbackOhm / gainOhm : 1;
  return gainOhm ? -feedbackOhm / gainOhm : null;
}

/**
 * How far the resistor that is held may wander to meet the ratio better, as a factor. The feedback resistor of a
 * current-feedback amplifier sets its bandwidth and stays close.
 */
const GAIN_RESISTOR_REACH = 2;
const FEEDBACK_REACH = 1.2;

interface Choice {
  readonly held: number;
  readonly other: number;
  readonly error: number;
  readonly distance: number;
}

/**
 * The pair of a series that comes nearest to a ratio: one resistor is held near a value, the other follows. Of pairs that
 * are equally near the one that moves the held resistor least is taken.
 */
function choose(
  held: number,
  reach: number,
  series: Exclude<ResistorSeries, 'exact'>,
  otherFor: (held: number) => number,
): Choice | null {
  let best: Choice | null = null;
  for (const candidate of preferredValuesBetween(series, held / reach, held * reach)) {
    const wanted = otherFor(candidate);
    for (const other of preferredValuesBetween(series, wanted / 1.25, wanted * 1.25)) {
      const error = Math.abs(Math.log(other / wanted));
      const distance = Math.abs(Math.log(candidate / held));
      if (!best || isBetter({ held: candidate, other, error, distance }, best)) {
        best = { held: candidate, other, error, distance };
      }
    }
  }
  return best;
}

/** Errors that differ by less than this are the same error with rounding. */
const SAME = 1e-9;

function isBetter(a: Choice, b: Choice): boolean {
  if (Math.abs(a.error - b.error) > SAME) return a.error < b.error;
  return a.distance < b.distance - SAME;
}

export function pairHoldingGainResistor(ratio: number, gainOhm: number, series: ResistorSeries): ResistorPair {
  if (series === 'exact') return { feedbackOhm: gainOhm * ratio, gainOhm };
  const choice = choose(gainOhm, GAIN_RESISTOR_REACH, series, (held) => held * ratio);
  return choice ? { gainOhm: choice.held, feedbackOhm: choice.other } : { feedbackOhm: gainOhm * ratio, gainOhm };
}

/** For current feedback: Rf sets the bandwidth, so it is what stays near its value. */
export function pairHoldingFeedback(ratio: number, feedbackOhm: number, series: ResistorSeries): ResistorPair {
  if (series === 'exact') return { feedbackOhm, gainOhm: feedbackOhm / ratio };
  const choice = choose(feedbackOhm, FEEDBACK_REACH, series, (held) => held / ratio);
  return choice ? { feedbackOhm: choice.held, gainOhm: choice.other } : { feedbackOhm, gainOhm: feedbackOhm / ratio };
}

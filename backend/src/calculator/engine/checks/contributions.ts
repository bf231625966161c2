import type { Maybe } from '../analysis';
import type { ChainFacts, StageFacts } from '../report/facts';
import { droop } from '../report/derived';
import { decibelText } from '../text/phrases';

/** What one stage adds to a deviation of the chain, in dB. */
export interface Contribution {
  readonly stage: StageFacts;
  readonly valueDb: number;
}

type BandPoint = 'gainLowDb' | 'gainOperatingDb' | 'gainHighDb';
const BAND_POINTS: readonly BandPoint[] = ['gainLowDb', 'gainOperatingDb', 'gainHighDb'];

/** Droop of each stage at the operating frequency, most negative first; null as soon as one is not known. */
export function gainContributions(facts: ChainFacts): readonly Contribution[] | null {
  return sorted(facts, (stage) => droop(stage.analysis.gainOperatingDb, stage.analysis.idealGainDb));
}

/**
 * What each stage adds to the chain's flatness: its gain at the point of the band (edges, operating frequency) where the
 * chain is highest minus that where the chain is lowest. Largest first, as negative numbers (a loss from best to worst).
 */
export function flatnessContributions(facts: ChainFacts): readonly Contribution[] | null {
  const gains = BAND_POINTS.map((point) => ({ point, value: facts.chain[point].value }));
  const known = gains.filter((gain): gain is { point: BandPoint; value: number } => gain.value !== null);
  if (known.length < BAND_POINTS.length) return null;
  const highest = known.reduce((a, b) => (b.value > a.value ? b : a)).point;
  const lowest = known.reduce((a, b) => (b.value < a.value ? b : a)).point;
  return sorted(facts, (stage) => droop(stage.analysis[lowest], stage.analysis[highest]));
}

function sorted(facts: ChainFacts, of: (stage: StageFacts) => Maybe): readonly Contribution[] | null {
  const all = facts.stages.map((stage) => ({ stage, valueDb: of(stage).value }));
  if (all.length === 0 || all.some((each) => each.valueDb === null)) return null;
  return (all as Contribution[]).sort((a, b) => a.valueDb - b.valueDb);
}

/** "S2 contributes most: −1.87 dB." — empty when no stage loses anything. */
export function largestContributionText(contributions: readonly Contribution[] | null, totalDb: number): string {
  const largest = contributions?.[0];
  if (!largest || largest.valueDb >= 0) return '';
  const share = totalDb > 0 ? ` of ${decibelText(totalDb)}` : '';
  return ` ${largest.stage.label} contributes most: ${decibelText(Math.abs(largest.valueDb))}${share}.`;
}

import type { Check, CheckId, Verdict, VerdictReport } from '../report';
import type { Judgement } from '../checks/judge';
import { isWorse, worstCheck } from '../checks/verdict-order';
import { listText } from '../text/phrases';

/** How many remedies a verdict names; all of them stand beside the check. */
const REMEDIES_NAMED = 3;

const ON_DEVICE_PAGE = ' Enter it on the device page.';

type Lead = (label: string) => string;

const OVER_LEADS: Readonly<Record<CheckId, Lead>> = {
  gbw: (label) => `${label} spends more than it has.`,
  bandwidth: (label) => `${label} is too slow for the band.`,
  'lower-corner': (label) => `${label} cuts into the bottom of the band.`,
  stability: (label) => `${label} is not stable enough.`,
  slew: (label) => `${label} cannot follow the signal.`,
  swing: (label) => `${label} clips.`,
  compression: (label) => `${label} compresses.`,
  'output-current': (label) => `${label} cannot drive its load.`,
  'supply-voltage': (label) => `${label} does not fit the supply.`,
  gain: () => 'The chain misses its gain.',
  flatness: () => 'The chain is not flat enough.',
  'upper-corner': () => 'The chain is too slow.',
  'chain-lower-corner': () => 'The chain starts too high.',
  'loop-gain': (label) => `${label} has too little loop gain.`,
  'input-noise': () => 'The chain is too noisy.',
  'noise-figure': () => 'The chain is too noisy.',
  'output-offset': () => 'The output offset is too large.',
  'supply-current': () => 'The chain takes too much supply current.',
  'supply-power': () => 'The chain takes too much power.',
  cost: () => 'The chain costs too much.',
  polarity: () => 'The chain has the wrong polarity.',
  'feedback-resistor': (label) => `${label} has too small a feedback resistor.`,
};

const TIGHT_LEADS: Partial<Readonly<Record<CheckId, Lead>>> = {
  gbw: (label) => `${label} has little GBW to spare.`,
  bandwidth: (label) => `${label} has little bandwidth to spare.`,
  'feedback-resistor': (label) => `${label} has a small feedback resistor.`,
  stability: (label) => `${label} has little phase margin.`,
  slew: (label) => `${label} has little slew rate to spare.`,
  swing: (label) => `${label} has little swing to spare.`,
};

function lead(check: Check, label: string): string {
  if (check.verdict === 'over') return OVER_LEADS[check.id](label);
  const subject = label === '' ? 'The chain' : label;
  const tight = TIGHT_LEADS[check.id];
  return tight ? tight(label) : `${subject} is tight: ${check.title}.`;
}

type Briefs = ReadonlyMap<Check, readonly string[]>;

function textOf(check: Check, briefs: Briefs | undefined): string {
  return [check.sentence, ...(briefs?.get(check) ?? []).slice(0, REMEDIES_NAMED)].join(' ');
}

/** Everything that is missing in a stage or chain, said at once: nobody wants to be told one field after the other. */
function unknownReport(subject: string, stageId: string | null, checks: readonly Check[]): VerdictReport {
  const unknowns = checks.filter((check) => check.verdict === 'unknown');
  const where = unknowns.map((check) => check.sentence).find((sentence) => sentence.endsWith(ON_DEVICE_PAGE));
  const sentences = unknowns.map((check) => check.sentence.replace(ON_DEVICE_PAGE, '').trim());
  const text = [...new Set(sentences), ...(where ? [ON_DEVICE_PAGE.trim()] : [])].join(' ');
  const titles = listText([...new Set(unknowns.map((check) => check.title))]);
  const lead = `${subject} cannot be judged: ${titles}.`;
  return { verdict: 'unknown', lead, text, checkId: unknowns[0]?.id ?? null, stageId };
}

/** Verdict of one stage: its worst check in words. */
export function stageVerdictReport(
  label: string,
  stageId: string,
  checks: readonly Check[],
  briefs?: Briefs,
): VerdictReport {
  const worst = worstCheck(checks);
  if (!worst || worst.verdict === 'clear') {
    return { verdict: 'clear', lead: '', text: clearStageText(checks), checkId: null, stageId };
  }
  if (worst.verdict === 'unknown') return unknownReport(label, stageId, checks);
  return { verdict: worst.verdict, lead: lead(worst, label), text: textOf(worst, briefs), checkId: worst.id, stageId };
}

function clearStageText(checks: readonly Check[]): string {
  const shown = checks.find((check) => check.id === 'gbw') ?? checks.find((check) => check.id === 'bandwidth');
  return shown?.sentence ?? '';
}

/** Checks of a judgement with the remedies that were found, in the same order. */
export interface JudgedChecks {
  readonly stageChecks: readonly (readonly Check[])[];
  readonly chainChecks: readonly Check[];
  readonly briefs?: Briefs;
}

/** Verdict of the chain: the cause before the symptom, so a stage's check goes before an equally bad requirement. */
export function chainVerdictReport(judgement: Judgement, checks: JudgedChecks): VerdictReport {
  if (judgement.facts.stages.length === 0) {
    const text = 'Add a stage: choose its topology, gain and device.';
    return { verdict: 'unknown', lead: 'The chain has no stages yet.', text, checkId: null, stageId: null };
  }
  const stages = checks.stageChecks.map((each, index) => ({ check: worstCheck(each), index }));
  const worstStage = stages.reduce((worst, each) =>
    worst.check === null || (each.check !== null && isWorse(each.check, worst.check)) ? each : worst,
  );
  const requirement = worstCheck(checks.chainChecks);
  const verdict: Verdict = judgement.verdict;
  if (verdict === 'clear') {
    return {
      verdict,
      lead: '',
      text: 'Every stage and every requirement has its margin.',
      checkId: null,
      stageId: null,
    };
  }
  if (worstStage.check?.verdict === verdict) {
    const stage = judgement.facts.stages[worstStage.index];
    const report = stageVerdictReport(stage.label, stage.stage.id, checks.stageChecks[worstStage.index], checks.briefs);
    return { ...report, verdict };
  }
  if (verdict === 'unknown') return unknownReport('The chain', null, checks.chainChecks);
  return chainRequirementReport(requirement, verdict, checks.briefs);
}

function chainRequirementReport(check: Check | null, verdict: Verdict, briefs: Briefs | undefined): VerdictReport {
  if (!check) return { verdict, lead: '', text: '', checkId: null, stageId: null };
  return { verdict, lead: lead(check, ''), text: textOf(check, briefs), checkId: check.id, stageId: null };
}

import type { Check, CheckId, Verdict, VerdictReport } from '../report';
import type { Judgement } from '../checks/judge';
import { isWorse, worstCheck } from '../checks/verdict-order';

/** How many remedies a verdict names; all of them stand beside the check. */
const REMEDIES_NAMED = 3;

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
  if (check.verdict === 'unknown') return `${subject} cannot be judged: ${check.title}.`;
  const tight = TIGHT_LEADS[check.id];
  return tight ? tight(label) : `${subject} is tight: ${check.title}.`;
}

function textOf(check: Check): string {
  return [check.sentence, ...check.remedies.slice(0, REMEDIES_NAMED).map((remedy) => remedy.sentence)].join(' ');
}

/** Verdict of one stage: its worst check in words. */
export function stageVerdictReport(label: string, stageId: string, checks: readonly Check[]): VerdictReport {
  const worst = worstCheck(checks);
  if (!worst || worst.verdict === 'clear') {
    return { verdict: 'clear', lead: '', text: clearStageText(checks), checkId: null, stageId };
  }
  return { verdict: worst.verdict, lead: lead(worst, label), text: textOf(worst), checkId: worst.id, stageId };
}

function clearStageText(checks: readonly Check[]): string {
  const shown = checks.find((check) => check.id === 'gbw') ?? checks.find((check) => check.id === 'bandwidth');
  return shown?.sentence ?? '';
}

/** Checks of a judgement with the remedies that were found, in the same order. */
export interface JudgedChecks {
  readonly stageChecks: readonly (readonly Check[])[];
  readonly chainChecks: readonly Check[];
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
    const report = stageVerdictReport(stage.label, stage.stage.id, checks.stageChecks[worstStage.index]);
    return { ...report, verdict };
  }
  return chainRequirementReport(requirement, verdict);
}

function chainRequirementReport(check: Check | null, verdict: Verdict): VerdictReport {
  if (!check) return { verdict, lead: '', text: '', checkId: null, stageId: null };
  return { verdict, lead: lead(check, ''), text: textOf(check), checkId: check.id, stageId: null };
}

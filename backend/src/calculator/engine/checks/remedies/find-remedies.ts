import type { Check, CheckId } from '../../report';
import type { StageFacts } from '../../report/facts';
import type { Device } from '../../types';
import { flatnessContributions, gainContributions } from '../contributions';
import type { Judgement } from '../judge';
import { plainCheck } from '../make-check';
import { isWorse, worstCheck } from '../verdict-order';
import { chainDeviceRemedy } from './chain-remedy';
import { deviceRemedy } from './device-remedy';
import { gbwRemedies } from './gbw-remedies';
import {
  couplingRemedies,
  feedbackResistorRemedies,
  slewRemedies,
  stabilityRemedies,
  swingRemedies,
} from './other-remedies';
import { createTrials } from './trials';
import type { FoundRemedy, Trials } from './trials';

/**
 * Evaluations of modified chains that one report may spend on remedies of what is over, and of what is tight: a live preview
 * has to come while somebody types. The worst checks are served first.
 */
const MOST_EVALUATIONS = { over: 12, tight: 2 } as const;

type Finder = (trials: Trials, stage: StageFacts) => readonly FoundRemedy[];

const FINDERS: Partial<Readonly<Record<CheckId, Finder>>> = {
  gbw: gbwRemedies,
  slew: slewRemedies,
  swing: swingRemedies,
  stability: stabilityRemedies,
  'lower-corner': couplingRemedies,
  'feedback-resistor': feedbackResistorRemedies,
};

/** Checks for which a device of the same kind can be the answer. */
const DEVICE_CAN_HELP: ReadonlySet<CheckId> = new Set<CheckId>([
  'gbw',
  'bandwidth',
  'stability',
  'slew',
  'swing',
  'compression',
  'output-current',
  'supply-voltage',
  'loop-gain',
]);

/** Checks by stage and of the chain, with remedies on those that decide. */
export interface ChecksWithRemedies {
  readonly stageChecks: readonly (readonly Check[])[];
  readonly chainChecks: readonly Check[];
  /** By check (with remedies): the sentences that its verdict quotes. */
  readonly briefs: ReadonlyMap<Check, readonly string[]>;
}

/**
 * Looks for what would help: on every check of a stage that is over or tight (another device only on the worst of them), and
 * on gain and flatness of a chain whose stages pass. Every figure named comes from the full model of the changed chain.
 *
 * @param judgement the chain as it is
 * @param alternatives devices that may be proposed beside those of the input
 */
export function findRemedies(judgement: Judgement, alternatives: readonly Device[] = []): ChecksWithRemedies {
  const forOver = createTrials(judgement, MOST_EVALUATIONS.over, alternatives);
  const forTight = createTrials(judgement, MOST_EVALUATIONS.tight, alternatives);
  const trialsOf = ({ verdict }: Check): Trials => (verdict === 'over' ? forOver : forTight);
  const found = new Map<Check, readonly FoundRemedy[]>();
  const order = judgement.facts.stages
    .flatMap((stage) => judgement.stageChecks[stage.index].map((check) => ({ stage, check })))
    .filter(({ check }) => canHelp(check))
    .sort((a, b) => Number(isWorse(b.check, a.check)) - Number(isWorse(a.check, b.check)));
  const deciding = new Set(order.map(({ stage }) => worstOf(judgement, stage)));
  for (const { stage, check } of order)
    found.set(check, stageRemedies(trialsOf(check), stage, check, deciding.has(check)));
  for (const check of judgement.chainChecks) found.set(check, chainRemedies(trialsOf(check), check));
  const briefs = new Map<Check, readonly string[]>();
  const withRemedies = (check: Check): Check => {
    const own = found.get(check) ?? [];
    const complete = plainCheck(
      check,
      own.map(({ remedy }) => remedy),
    );
    briefs.set(
      complete,
      own.map(({ brief }) => brief),
    );
    return complete;
  };
  return {
    stageChecks: judgement.stageChecks.map((checks) => checks.map(withRemedies)),
    chainChecks: judgement.chainChecks.map(withRemedies),
    briefs,
  };
}

function canHelp(check: Check): boolean {
  return check.verdict === 'over' || check.verdict === 'tight';
}

/** The check of a stage that another device is looked for: the worst of those that something can be done about. */
function worstOf(judgement: Judgement, stage: StageFacts): Check | null {
  return worstCheck(judgement.stageChecks[stage.index].filter(canHelp));
}

function stageRemedies(trials: Trials, stage: StageFacts, check: Check, isDeciding: boolean): readonly FoundRemedy[] {
  const own = FINDERS[check.id]?.(trials, stage) ?? [];
  const device = isDeciding && DEVICE_CAN_HELP.has(check.id) ? deviceRemedy(trials, stage, check.id) : null;
  return device ? [...own.slice(0, 1), device, ...own.slice(1)] : own;
}

function chainRemedies(trials: Trials, check: Check): readonly FoundRemedy[] {
  if (!canHelp(check) || trials.before.stageVerdicts.includes('over')) return [];
  const { facts } = trials.before;
  const contributions =
    check.id === 'flatness' ? flatnessContributions(facts) : check.id === 'gain' ? gainContributions(facts) : null;
  const largest = contributions?.[0];
  if (!largest || largest.valueDb >= 0) return [];
  const remedy = chainDeviceRemedy(trials, largest.stage, check.id);
  return remedy ? [remedy] : [];
}

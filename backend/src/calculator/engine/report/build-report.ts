import { analyzeChain } from '../chain/analyze-chain';
import { judge } from '../checks/judge';
import { findRemedies } from '../checks/remedies/find-remedies';
import type { ChecksWithRemedies } from '../checks/remedies/find-remedies';
import { chainLane, stageLane } from '../lanes/lane';
import { frequencyAxis } from '../lanes/axis';
import type { ChainCaseReport, ChainReport, HeadlineItem, StageCaseReport, StageReport } from '../report';
import { basisText, because } from '../text/phrases';
import { GBW_CASES } from '../types';
import type { ChainInput, Device, GainBasis, GbwCase } from '../types';
import { CALCULATOR_VERSION } from '../version';
import { chainFigures } from './chain-figures';
import { gbwMaybe, worstHeadroom, worstHeadroomStage } from './derived';
import { factsOf } from './facts';
import type { ChainFacts, StageFacts } from './facts';
import { headline } from './headline';
import { stageMarks } from './marks';
import { stageFigures } from './stage-figures';
import { chainVerdictReport, stageVerdictReport } from './verdict-report';

const GAIN_BASIS_TEXT: Readonly<Record<GainBasis, string>> = {
  voltage: 'voltage: load over source EMF',
  transducer: 'transducer: power in the load over available source power',
  transimpedance: 'transimpedance: load voltage over source current',
};

type ByCase<T> = Readonly<Record<GbwCase, T>>;

function byCase<T>(of: (gbwCase: GbwCase) => T): ByCase<T> {
  return Object.fromEntries(GBW_CASES.map((gbwCase) => [gbwCase, of(gbwCase)])) as ByCase<T>;
}

/**
 * Everything that is said of a chain: figures in the three GBW cases, verdicts with sentences and remedies in the project's
 * case, lanes, headline, cost.
 *
 * @param input whole chain
 * @param alternatives devices that may be proposed beside those of the input
 * @throws EngineInputError when the input is refused
 */
export function buildReport(input: ChainInput, alternatives: readonly Device[] = []): ChainReport {
  const analysis = analyzeChain(input);
  const facts = byCase((gbwCase) => factsOf(input, analysis, gbwCase));
  const judgement = judge(facts[input.policy.gbwCase]);
  const checks = findRemedies(judgement, alternatives);
  const stages = input.stages.map((_, index) => stageReport(facts, checks, index, input.policy.gbwCase));
  const cases = byCase((gbwCase) => chainCaseReport(facts[gbwCase], facts.typical));
  const { band, gainBasis } = input.specification;
  const lanes = GBW_CASES.flatMap((gbwCase) => [
    cases[gbwCase].lane,
    ...stages.map((stage) => stage.cases[gbwCase].lane),
  ]);
  return {
    calculatorVersion: CALCULATOR_VERSION,
    gbwCase: input.policy.gbwCase,
    verdict: chainVerdictReport(judgement, checks),
    checks: checks.chainChecks,
    stages,
    cases,
    headline: byCase<readonly HeadlineItem[]>((gbwCase) => headline(facts[gbwCase], checks)),
    axis: frequencyAxis(lanes, band.lowHz, band.highHz),
    polarity: judgement.facts.chain.inverted ? 'inverted' : 'in-phase',
    cost: judgement.facts.cost.total,
    gainBasisText: GAIN_BASIS_TEXT[gainBasis],
  };
}

function stageReport(facts: ByCase<ChainFacts>, all: ChecksWithRemedies, index: number, gbwCase: GbwCase): StageReport {
  const checks = all.stageChecks[index];
  const own = facts[gbwCase];
  const stage = own.stages[index];
  return {
    stageId: stage.stage.id,
    label: stage.label,
    name: stage.stage.name,
    kind: stage.stage.kind,
    topology: 'topology' in stage.stage ? stage.stage.topology : null,
    deviceId: stage.device?.id ?? null,
    partNumber: stage.device?.partNumber ?? null,
    grade: stage.device?.grade ?? null,
    hasGbw: stage.stage.kind === 'voltage-feedback',
    operatingHz: own.input.specification.band.operatingHz,
    verdict: stageVerdictReport(stage.label, stage.stage.id, checks, all.briefs),
    checks,
    marks: stageMarks(own, stage),
    unitCost: stage.cost.money,
    cases: byCase((each) => stageCaseReport(facts[each], facts.typical, index)),
  };
}

function stageCaseReport(facts: ChainFacts, typical: ChainFacts, index: number): StageCaseReport {
  const stage = facts.stages[index];
  return {
    figures: stageFigures(facts, stage),
    gbwBasis: gbwBasis(stage),
    lane: stageLane(facts, typical, index),
  };
}

function gbwBasis(stage: StageFacts): string {
  if (stage.analysis.gbw) return basisText(stage.analysis.gbw);
  const none = gbwMaybe(stage);
  return none.value === null ? because(none.reason) : '';
}

function chainCaseReport(facts: ChainFacts, typical: ChainFacts): ChainCaseReport {
  const worst = worstHeadroomStage(facts);
  return {
    figures: chainFigures(facts),
    lane: chainLane(facts, typical),
    worstHeadroomStageId: worst?.stage.id ?? null,
    worstHeadroomHz: worst ? worstHeadroom(facts, worst).atHz : null,
    worstDroopHz: facts.chain.worstDroopDb.value === null ? null : facts.chain.worstDroopHz,
  };
}

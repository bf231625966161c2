import type {
  Chain,
  ChainCaseReport,
  ChainFigureKey,
  ChainReport,
  Figure,
  Lane,
  OptionDto,
  Stage,
  StageCaseReport,
  StageFigureKey,
  StageReport,
  VoltageFeedbackStage,
} from '../api/types';
import { buildPolicy, buildSummary, ratio } from './builders';

export function buildStage(changes: Partial<VoltageFeedbackStage> = {}): VoltageFeedbackStage {
  return {
    id: 'stage-1',
    name: 'Gain',
    kind: 'voltage-feedback',
    topology: 'inverting',
    deviceId: 'device-1',
    wantedGain: -10,
    feedbackOhm: 2000,
    gainOhm: 200,
    ...changes,
  };
}

export function buildChain(changes: Partial<Chain> = {}): Chain {
  const option = { id: 'option-1', name: 'Baseline', position: 0, version: 1, updatedAt: '2026-01-05T10:00:00.000Z' };
  return {
    id: 'chain-1',
    projectId: 'project-1',
    projectCode: 'PW-5',
    projectName: 'Thickness receiver',
    name: 'Receive chain',
    version: 7,
    specification: {
      source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf' },
      load: { resistanceOhm: 1000 },
      gainBasis: 'voltage',
      band: { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 },
      supply: { positiveV: 5, negativeV: -5 },
      requirements: {},
    },
    policy: buildPolicy(),
    currency: 'USD',
    buildQuantity: 250,
    updatedAt: '2026-01-05T10:00:00.000Z',
    options: [{ ...option, summary: buildSummary() }],
    can: { edit: true },
    ...changes,
  } as Chain;
}

export function buildOption(changes: Partial<OptionDto> = {}): OptionDto {
  return {
    id: 'option-1',
    chainId: 'chain-1',
    name: 'Baseline',
    position: 0,
    version: 1,
    updatedAt: '2026-01-05T10:00:00.000Z',
    stages: [buildStage(), buildStage({ id: 'stage-2', name: 'Driver' })],
    devices: [],
    can: { edit: true, delete: true },
    ...changes,
  };
}

const LANE: Lane = {
  lowerHz: null,
  solidToHz: 2e6,
  cornerHz: 6e6,
  typicalCornerHz: 9e6,
  bandLowHz: 3e6,
  bandHighHz: 7e6,
  description: 'Carries up to 6 MHz.',
};

/** Every figure asked for is there; which ones, and how large, is not what these tests are about. */
function anyFigures<K extends string>(known: Partial<Record<K, Figure>>): Record<K, Figure> {
  return new Proxy(known, { get: (target, key) => target[key as K] ?? ratio(1) }) as Record<K, Figure>;
}

function everyCase<T>(value: T) {
  return { typical: value, minimum: value, minimumHot: value };
}

function buildStageReport(stage: Stage, index: number): StageReport {
  const over = index === 0;
  const figures = anyFigures<StageFigureKey>({ headroom: ratio(over ? 0.974 : 5) });
  const stageCase = { figures, gbwBasis: 'minimum, p. 4', lane: LANE } as StageCaseReport;
  return {
    stageId: stage.id,
    label: `S${index + 1}`,
    name: stage.name,
    kind: stage.kind,
    topology: 'inverting',
    deviceId: 'device-1',
    partNumber: 'MRWG-G072',
    grade: 'general-purpose',
    hasGbw: true,
    operatingHz: 5e6,
    verdict: { verdict: over ? 'over' : 'clear', lead: '', text: '', checkId: null, stageId: null },
    checks: [],
    marks: [],
    unitCost: { amountMicros: 620_000, currency: 'USD' },
    cases: everyCase(stageCase),
  };
}

export function buildReport(stages: readonly Stage[]): ChainReport {
  const figures = anyFigures<ChainFigureKey>({});
  const chainCase = {
    figures,
    lane: LANE,
    worstHeadroomStageId: null,
    worstHeadroomHz: null,
    worstDroopHz: null,
  } as ChainCaseReport;
  return {
    calculatorVersion: '1',
    gbwCase: 'minimum',
    verdict: { verdict: 'over', lead: 'S1 spends more than it has.', text: '', checkId: 'gbw', stageId: 'stage-1' },
    checks: [],
    stages: stages.map(buildStageReport),
    cases: everyCase(chainCase),
    headline: everyCase([]),
    axis: { fromHz: 1e5, toHz: 1e9 },
    polarity: 'in-phase',
    cost: { amountMicros: 1_240_000, currency: 'USD' },
    gainBasisText: 'voltage gain',
  };
}

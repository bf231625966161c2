import type { Maybe, StabilityPoint } from '../analysis';
import { STAGE_FIGURES } from '../report';
import type { Figure, StageFigureKey, Unit } from '../report';
import {
  bandwidthRatio,
  droop,
  gbwMaybe,
  gbwUsed,
  loopGainDb,
  noiseDensity,
  noiseGainMaybe,
  noiseShare,
  outputCurrentHeadroom,
  slewAvailable,
  slewHeadroom,
  swingHeadroom,
  worstHeadroom,
} from './derived';
import type { ChainFacts, StageFacts } from './facts';
import { figureOf } from './figures';
import type { FigureOptions } from './figures';
import { combine, known, unknown } from '../maybe';
import { dbToRatio } from '../units';

type Builder = (facts: ChainFacts, stage: StageFacts) => Figure;

const NO_LOOP = 'No feedback loop in this stage.';

function of(unit: Unit, pick: (stage: StageFacts, facts: ChainFacts) => Maybe): Builder {
  return (facts, stage) => figureOf(pick(stage, facts), unit);
}

function headroomOptions(facts: ChainFacts): FigureOptions {
  return { limits: [1, facts.policy.headroomTarget] };
}

function cornerOptions(facts: ChainFacts): FigureOptions {
  const { highHz, operatingHz } = facts.input.specification.band;
  return { limits: [highHz, operatingHz, highHz * facts.policy.bandwidthTarget] };
}

function levelOptions(facts: ChainFacts): FigureOptions {
  return { limits: [1, dbToRatio(facts.policy.levelMarginDb)] };
}

/** Unit of a source's noise and level: a voltage, or a current for a current source. */
export function noiseUnit(facts: ChainFacts): Unit {
  return facts.input.specification.source.kind === 'current' ? 'A/√Hz' : 'V/√Hz';
}

/** dB, or dBΩ where a gain is a voltage per current of the source. */
function stageGainUnit(facts: ChainFacts, stage: StageFacts): Unit {
  return stage.index === 0 && facts.input.specification.source.kind === 'current' ? 'dBΩ' : 'dB';
}

/** Unit of the running gain: everything is referred to the source. */
function runningGainUnit(facts: ChainFacts): Unit {
  return facts.input.specification.source.kind === 'current' ? 'dBΩ' : 'dB';
}

/** The point of the GBW range at which the loop is worse off. */
export function worsePoint(stage: StageFacts): StabilityPoint | null {
  if (!stage.stability) return null;
  return stage.stability.worse === 'maximum' ? stage.stability.atMaximum : stage.stability.atMinimum;
}

function phaseMargin(stage: StageFacts): Maybe {
  const point = worsePoint(stage);
  if (!point) return unknown(NO_LOOP);
  if (point.noCrossing) return unknown('The loop gain never crosses 1.');
  const isBound = stage.stability?.secondPoleText === null;
  return point.phaseMarginDeg === null
    ? unknown('The phase margin cannot be told.')
    : known(point.phaseMarginDeg, isBound);
}

function peaking(stage: StageFacts): Maybe {
  const point = worsePoint(stage);
  return point ? known(point.peakingDb, stage.stability?.secondPoleText === null) : unknown(NO_LOOP);
}

function loopGain(stage: StageFacts): Maybe {
  return loopGainDb(stage);
}

const BUILDERS: Readonly<Record<StageFigureKey, Builder>> = {
  signalGain: (_facts, stage) => {
    const isTransimpedance = stage.stage.kind === 'voltage-feedback' && stage.stage.topology === 'transimpedance';
    return figureOf(known(stage.analysis.signalGain), isTransimpedance ? 'Ω' : 'gain', { plainGain: true });
  },
  noiseGain: (_facts, stage) =>
    figureOf(noiseGainMaybe(stage, stage.analysis.noiseGain), 'number', { plainGain: true }),
  noiseGainOperating: (_facts, stage) =>
    figureOf(noiseGainMaybe(stage, stage.analysis.noiseGainOperating), 'number', { plainGain: true }),
  noiseGainTop: (_facts, stage) =>
    figureOf(noiseGainMaybe(stage, stage.analysis.noiseGainTop), 'number', { plainGain: true }),
  gbwHave: (facts, stage) =>
    figureOf(gbwMaybe(stage), 'Hz', { limits: [gbwUsed(facts, stage, 'worst').value ?? undefined] }),
  gbwUsedOperating: of('Hz', (stage, facts) => gbwUsed(facts, stage, 'operating')),
  gbwUsedTop: of('Hz', (stage, facts) => gbwUsed(facts, stage, 'top')),
  gbwUsed: (facts, stage) =>
    figureOf(gbwUsed(facts, stage, 'worst'), 'Hz', { limits: [gbwMaybe(stage).value ?? undefined] }),
  gbwLeft: of('Hz', (stage, facts) =>
    combine([gbwMaybe(stage), gbwUsed(facts, stage, 'worst')], (have, used) => have - used),
  ),
  headroomOperating: (facts, stage) => figureOf(stage.analysis.headroomOperating, 'ratio', headroomOptions(facts)),
  headroomTop: (facts, stage) => figureOf(stage.analysis.headroomTop, 'ratio', headroomOptions(facts)),
  headroom: (facts, stage) => figureOf(worstHeadroom(facts, stage).headroom, 'ratio', headroomOptions(facts)),
  cornerFirstOrder: (facts, stage) => figureOf(stage.analysis.cornerFirstOrderHz, 'Hz', cornerOptions(facts)),
  cornerUpper: (facts, stage) => figureOf(stage.analysis.cornerUpperHz, 'Hz', cornerOptions(facts)),
  cornerLower: (facts, stage) => {
    const { lowHz } = facts.input.specification.band;
    return figureOf(stage.analysis.cornerLowerHz, 'Hz', { limits: [lowHz, lowHz / facts.policy.bandwidthTarget] });
  },
  bandwidthRatio: (facts, stage) =>
    figureOf(bandwidthRatio(facts, stage), 'ratio', { limits: [1, facts.policy.bandwidthTarget] }),
  idealGain: (facts, stage) => figureOf(stage.analysis.idealGainDb, stageGainUnit(facts, stage)),
  gainLow: (facts, stage) => figureOf(stage.analysis.gainLowDb, stageGainUnit(facts, stage)),
  gainOperating: (facts, stage) => figureOf(stage.analysis.gainOperatingDb, stageGainUnit(facts, stage)),
  gainHigh: (facts, stage) => figureOf(stage.analysis.gainHighDb, stageGainUnit(facts, stage)),
  droopLow: of('dB', (stage) => droop(stage.analysis.gainLowDb, stage.analysis.idealGainDb)),
  droopOperating: of('dB', (stage) => droop(stage.analysis.gainOperatingDb, stage.analysis.idealGainDb)),
  droopHigh: of('dB', (stage) => droop(stage.analysis.gainHighDb, stage.analysis.idealGainDb)),
  runningGain: (facts, stage) => figureOf(stage.analysis.runningGainDb, runningGainUnit(facts)),
  phase: of('deg', (stage) => stage.analysis.phaseDeg),
  loopGain: (facts, stage) =>
    figureOf(loopGain(stage), 'dB', { limits: [facts.input.specification.requirements.loopGainDb] }),
  vectorError: of('fraction', (stage) => stage.analysis.vectorError),
  phaseMargin: (facts, stage) =>
    figureOf(phaseMargin(stage), 'deg', {
      limits: [0, facts.policy.phaseMarginOverDeg, facts.policy.phaseMarginTightDeg],
    }),
  peaking: of('dB', peaking),
  riseTime: of('s', (stage) => stage.analysis.riseTimeS),
  outputLevel: of('V', (stage) => stage.analysis.outputPeakV),
  swingAvailable: of('V', (stage) => stage.analysis.swingAvailableV),
  swingHeadroom: (facts, stage) => figureOf(swingHeadroom(stage), 'ratio', levelOptions(facts)),
  slewNeeded: of('V/s', (stage) => stage.analysis.slewNeededVPerS),
  slewAvailable: of('V/s', slewAvailable),
  slewHeadroom: (facts, stage) => figureOf(slewHeadroom(stage), 'ratio', { limits: [1, facts.policy.slewTarget] }),
  fullPowerBandwidth: of('Hz', (stage) => stage.analysis.fullPowerBandwidthHz),
  outputCurrent: of('A', (stage) => stage.analysis.outputCurrentPeakA),
  outputCurrentHeadroom: (facts, stage) => figureOf(outputCurrentHeadroom(stage), 'ratio', levelOptions(facts)),
  outputOffset: of('V', (stage) => stage.analysis.outputOffsetV),
  noiseAdded: (facts, stage) => figureOf(noiseDensity(stage), noiseUnit(facts)),
  noiseShare: of('fraction', (stage, facts) => noiseShare(facts, stage)),
  supplyCurrent: of('A', (stage) => stage.analysis.supplyCurrentA),
  supplyPower: of('W', (stage) => stage.analysis.supplyPowerW),
};

/**
 * One figure of a stage.
 *
 * @param facts the chain in one GBW case
 * @param stage the stage
 * @param key which figure
 */
export function stageFigure(facts: ChainFacts, stage: StageFacts, key: StageFigureKey): Figure {
  return BUILDERS[key](facts, stage);
}

/** All figures of a stage. */
export function stageFigures(facts: ChainFacts, stage: StageFacts): Readonly<Record<StageFigureKey, Figure>> {
  const entries = STAGE_FIGURES.map((key) => [key, stageFigure(facts, stage, key)] as const);
  return Object.fromEntries(entries) as Record<StageFigureKey, Figure>;
}

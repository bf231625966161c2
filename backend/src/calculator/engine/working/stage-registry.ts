import type { StageFigureKey } from '../report';
import { slewAvailable } from '../report/derived';
import {
  droopWorking,
  idealGainWorking,
  phaseWorking,
  runningGainWorking,
  signalGainWorking,
  stageGainWorking,
} from './gain-workings';
import {
  firstOrderWorking,
  gbwHaveWorking,
  gbwLeftWorking,
  gbwUsedWorking,
  headroomWorking,
  noiseGainAtWorking,
  noiseGainWorking,
} from './gbw-workings';
import { currentHave, outputCurrentWorking, outputLevelWorking, swingAvailableWorking } from './level-workings';
import { fullPowerWorking, ratioWorking, slewAvailableWorking, slewNeededWorking } from './slew-workings';
import {
  bandwidthRatioWorking,
  cornerWorking,
  loopGainWorking,
  peakingWorking,
  phaseMarginWorking,
  riseTimeWorking,
  vectorErrorWorking,
} from './loop-workings';
import { outputOffsetWorking } from './offset-workings';
import { noiseAddedWorking, noiseShareWorking } from './noise-workings';
import type { Draft, StageScope } from './scope';
import { num } from './scope';
import { supplyCurrentWorking, supplyPowerWorking } from './supply-workings';

type Writer = (scope: StageScope) => Draft;

const band = (scope: StageScope): { lowHz: number; operatingHz: number; highHz: number } =>
  scope.facts.input.specification.band;
const levelMargin = (scope: StageScope): string => `${num(scope.facts.policy.levelMarginDb)} dB`;

const WRITERS: Readonly<Record<StageFigureKey, Writer>> = {
  signalGain: signalGainWorking,
  noiseGain: noiseGainWorking,
  noiseGainOperating: (scope) => noiseGainAtWorking(scope, band(scope).operatingHz),
  noiseGainTop: (scope) => noiseGainAtWorking(scope, band(scope).highHz),
  gbwHave: gbwHaveWorking,
  gbwUsedOperating: (scope) => gbwUsedWorking(scope, 'operating'),
  gbwUsedTop: (scope) => gbwUsedWorking(scope, 'top'),
  gbwUsed: (scope) => gbwUsedWorking(scope, 'worst'),
  gbwLeft: gbwLeftWorking,
  headroomOperating: (scope) => headroomWorking(scope, 'operating'),
  headroomTop: (scope) => headroomWorking(scope, 'top'),
  headroom: (scope) => headroomWorking(scope, 'worst'),
  cornerFirstOrder: firstOrderWorking,
  cornerUpper: (scope) => cornerWorking(scope, 'upper'),
  cornerLower: (scope) => cornerWorking(scope, 'lower'),
  bandwidthRatio: bandwidthRatioWorking,
  idealGain: idealGainWorking,
  gainLow: (scope) => stageGainWorking(scope, band(scope).lowHz, 'bottom of the band'),
  gainOperating: (scope) => stageGainWorking(scope, band(scope).operatingHz, 'operating frequency'),
  gainHigh: (scope) => stageGainWorking(scope, band(scope).highHz, 'top of the band'),
  droopLow: (scope) => droopWorking(scope, scope.stage.analysis.gainLowDb, band(scope).lowHz, 'bottom of the band'),
  droopOperating: (scope) =>
    droopWorking(scope, scope.stage.analysis.gainOperatingDb, band(scope).operatingHz, 'operating frequency'),
  droopHigh: (scope) => droopWorking(scope, scope.stage.analysis.gainHighDb, band(scope).highHz, 'top of the band'),
  runningGain: runningGainWorking,
  phase: phaseWorking,
  loopGain: loopGainWorking,
  vectorError: vectorErrorWorking,
  phaseMargin: phaseMarginWorking,
  peaking: peakingWorking,
  riseTime: riseTimeWorking,
  outputLevel: outputLevelWorking,
  swingAvailable: swingAvailableWorking,
  swingHeadroom: (scope) =>
    ratioWorking(scope, {
      title: 'Swing headroom',
      formula: 'swing available / output level',
      have: scope.stage.analysis.swingAvailableV.value,
      need: scope.stage.analysis.outputPeakV.value,
      unit: 'V',
      target: levelMargin(scope),
    }),
  slewNeeded: slewNeededWorking,
  slewAvailable: slewAvailableWorking,
  slewHeadroom: (scope) =>
    ratioWorking(scope, {
      title: 'Slew headroom',
      formula: 'slew rate available / slew rate needed',
      have: slewAvailable(scope.stage).value,
      need: scope.stage.analysis.slewNeededVPerS.value,
      unit: 'V/s',
      target: `×${num(scope.facts.policy.slewTarget)}`,
    }),
  fullPowerBandwidth: fullPowerWorking,
  outputCurrent: outputCurrentWorking,
  outputCurrentHeadroom: (scope) =>
    ratioWorking(scope, {
      title: 'Output current headroom',
      formula: 'output current available / output current',
      have: currentHave(scope),
      need: scope.stage.analysis.outputCurrentPeakA.value,
      unit: 'A',
      target: levelMargin(scope),
    }),
  outputOffset: outputOffsetWorking,
  noiseAdded: noiseAddedWorking,
  noiseShare: noiseShareWorking,
  supplyCurrent: supplyCurrentWorking,
  supplyPower: supplyPowerWorking,
};

/** Writes the working of one figure of a stage. */
export function stageDraft(scope: StageScope, key: StageFigureKey): Draft {
  return WRITERS[key](scope);
}

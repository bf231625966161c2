import type { ChainFigureKey } from '../report';
import {
  chainGainWorking,
  chainIdealWorking,
  differenceWorking,
  flatnessWorking,
  worstDroopWorking,
} from './chain-gain-workings';
import {
  chainCornerWorking,
  chainLevelWorking,
  chainOffsetWorking,
  chainPhaseWorking,
  chainRiseTimeWorking,
  groupDelayWorking,
  shrinkageWorking,
  worstHeadroomWorking,
} from './chain-workings';
import { inputNoiseWorking, noiseFigureWorking } from './noise-workings';
import type { ChainScope, Draft } from './scope';
import { sumWorking } from './supply-workings';

type Writer = (scope: ChainScope) => Draft;

const band = (scope: ChainScope): { lowHz: number; operatingHz: number; highHz: number } =>
  scope.facts.input.specification.band;

const WRITERS: Readonly<Record<ChainFigureKey, Writer>> = {
  idealGain: chainIdealWorking,
  gainLow: (scope) => chainGainWorking(scope, band(scope).lowHz),
  gainOperating: (scope) => chainGainWorking(scope, band(scope).operatingHz),
  gainHigh: (scope) => chainGainWorking(scope, band(scope).highHz),
  droopOperating: (scope) =>
    differenceWorking(
      scope,
      'Droop of the chain at the operating frequency',
      ['gain', 'ideal gain'],
      [scope.facts.chain.gainOperatingDb, scope.facts.chain.idealGainDb],
    ),
  flatness: flatnessWorking,
  worstDroop: worstDroopWorking,
  cornerUpper: (scope) => chainCornerWorking(scope, 'upper'),
  cornerLower: (scope) => chainCornerWorking(scope, 'lower'),
  shrinkage: shrinkageWorking,
  phase: chainPhaseWorking,
  groupDelay: groupDelayWorking,
  riseTime: chainRiseTimeWorking,
  worstHeadroom: worstHeadroomWorking,
  inputNoise: inputNoiseWorking,
  noiseFigure: noiseFigureWorking,
  outputOffset: chainOffsetWorking,
  outputLevel: chainLevelWorking,
  supplyCurrent: (scope) => sumWorking(scope, 'supplyCurrentA'),
  supplyPower: (scope) => sumWorking(scope, 'supplyPowerW'),
};

/** Writes the working of one figure of the chain. */
export function chainDraft(scope: ChainScope, key: ChainFigureKey): Draft {
  return WRITERS[key](scope);
}

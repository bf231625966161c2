import { CHAIN_FIGURES } from '../report';
import type { ChainFigureKey, Figure, Unit } from '../report';
import type { Requirements } from '../types';
import { droop, worstHeadroom, worstHeadroomStage } from './derived';
import type { ChainFacts } from './facts';
import { figureOf } from './figures';
import { noiseUnit } from './stage-figures';
import { unknown } from '../maybe';

type Builder = (facts: ChainFacts) => Figure;

/** dB, or dBΩ in the transimpedance basis. */
export function chainGainUnit(facts: ChainFacts): Unit {
  return facts.input.specification.gainBasis === 'transimpedance' ? 'dBΩ' : 'dB';
}

function requirements(facts: ChainFacts): Requirements {
  return facts.input.specification.requirements;
}

/** The limits that the gain at the operating frequency is compared with. */
export function gainLimits(required: Requirements): readonly number[] {
  const { gainDb, minimumGainDb, maximumGainDb } = required;
  const window = gainDb ? [gainDb.target - gainDb.tolerance, gainDb.target + gainDb.tolerance] : [];
  return [...window, minimumGainDb, maximumGainDb].filter((limit): limit is number => limit !== undefined);
}

function gain(pick: (facts: ChainFacts) => Parameters<typeof figureOf>[0], limited = false): Builder {
  return (facts) =>
    figureOf(pick(facts), chainGainUnit(facts), limited ? { limits: gainLimits(requirements(facts)) } : {});
}

const BUILDERS: Readonly<Record<ChainFigureKey, Builder>> = {
  idealGain: gain((facts) => facts.chain.idealGainDb, true),
  gainLow: gain((facts) => facts.chain.gainLowDb),
  gainOperating: gain((facts) => facts.chain.gainOperatingDb, true),
  gainHigh: gain((facts) => facts.chain.gainHighDb),
  droopOperating: (facts) => figureOf(droop(facts.chain.gainOperatingDb, facts.chain.idealGainDb), 'dB'),
  flatness: (facts) => figureOf(facts.chain.flatnessDb, 'dB', { limits: [requirements(facts).flatnessDb] }),
  worstDroop: (facts) => figureOf(facts.chain.worstDroopDb, 'dB'),
  cornerUpper: (facts) => {
    const { highHz, operatingHz } = facts.input.specification.band;
    return figureOf(facts.chain.cornerUpperHz, 'Hz', {
      limits: [requirements(facts).upperCornerHz, highHz, operatingHz],
    });
  },
  cornerLower: (facts) =>
    figureOf(facts.chain.cornerLowerHz, 'Hz', {
      limits: [requirements(facts).lowerCornerHz, facts.input.specification.band.lowHz],
    }),
  shrinkage: (facts) => figureOf(facts.chain.shrinkage, 'ratio'),
  phase: (facts) => figureOf(facts.chain.phaseDeg, 'deg'),
  groupDelay: (facts) => figureOf(facts.chain.groupDelayS, 's'),
  riseTime: (facts) => figureOf(facts.chain.riseTimeS, 's'),
  worstHeadroom: (facts) => {
    const stage = worstHeadroomStage(facts);
    const headroom = stage ? worstHeadroom(facts, stage).headroom : unknown(noHeadroomReason(facts));
    return figureOf(headroom, 'ratio', { limits: [1, facts.policy.headroomTarget] });
  },
  inputNoise: (facts) =>
    figureOf(facts.chain.inputNoise, noiseUnit(facts), { limits: [requirements(facts).inputNoise] }),
  noiseFigure: (facts) => figureOf(facts.chain.noiseFigureDb, 'dB', { limits: [requirements(facts).noiseFigureDb] }),
  outputOffset: (facts) => figureOf(facts.chain.outputOffsetV, 'V', { limits: [requirements(facts).outputOffsetV] }),
  outputLevel: (facts) => figureOf(facts.chain.outputPeakV, 'V'),
  supplyCurrent: (facts) => figureOf(facts.chain.supplyCurrentA, 'A', { limits: [requirements(facts).supplyCurrentA] }),
  supplyPower: (facts) => figureOf(facts.chain.supplyPowerW, 'W', { limits: [requirements(facts).supplyPowerW] }),
};

function noHeadroomReason(facts: ChainFacts): string {
  if (facts.stages.length === 0) return 'No stages yet.';
  const withGbw = facts.stages.find((stage) => stage.stage.kind === 'voltage-feedback');
  if (!withGbw) return 'No stage has a GBW.';
  const { headroom } = worstHeadroom(facts, withGbw);
  return headroom.value === null ? headroom.reason : 'Not known.';
}

/** One figure of the chain. */
export function chainFigure(facts: ChainFacts, key: ChainFigureKey): Figure {
  return BUILDERS[key](facts);
}

/** All figures of the chain. */
export function chainFigures(facts: ChainFacts): Readonly<Record<ChainFigureKey, Figure>> {
  const entries = CHAIN_FIGURES.map((key) => [key, chainFigure(facts, key)] as const);
  return Object.fromEntries(entries) as Record<ChainFigureKey, Figure>;
}

import type { Maybe, StageAnalysis } from '../analysis';
import { magnitude, angleDeg, MutableComplex } from '../complex';
import { supplyCurrentFor } from '../devices/amplifier-values';
import type { DeviceCorner } from '../devices/used-values';
import type { PreparedStage } from '../stages/prepare-stage';
import type { ChainInput, Supply } from '../types';
import { ratioToDb } from '../units';
import type { StageAddedNoise } from './added-noise';
import type { Corners } from './corners';
import { gbwBudget } from './gbw-budget';
import type { StageLevels } from './levels';
import { known, mapMaybe, notEntered, unknown } from '../maybe';
import type { ChainResponse } from './response';

/** What was read off the network at one frequency: per stage (index k), complex gains node to node and running. */
export interface GainsAt {
  readonly stageDb: readonly number[];
  readonly runningDb: readonly number[];
  readonly phaseDeg: readonly number[];
  readonly chainRe: number;
  readonly chainIm: number;
  /** |T| and |1 + T|; null without a loop. */
  readonly loop: readonly ({ readonly gain: number; readonly returnDifference: number } | null)[];
}

/** Solves a frequency and reads off all gains. Index 0 stands for nothing: stages count from 1. */
export function gainsAt(response: ChainResponse, frequencyHz: number): GainsAt {
  response.solve(frequencyHz);
  const gain: MutableComplex = { re: 0, im: 0 };
  const stageDb = [NaN];
  const runningDb = [NaN];
  const phaseDeg = [NaN];
  const loop: (GainsAt['loop'][number] | null)[] = [null];
  response.network.stages.forEach((stage, index) => {
    response.stageGain(index + 1, gain);
    stageDb.push(ratioToDb(magnitude(gain)));
    phaseDeg.push(angleDeg(gain));
    response.runningGain(index + 1, gain);
    runningDb.push(ratioToDb(magnitude(gain)));
    if (stage.loop) stage.loop.loadedLoopGain(gain);
    loop.push(stage.loop ? { gain: magnitude(gain), returnDifference: Math.hypot(1 + gain.re, gain.im) } : null);
  });
  response.chainGain(gain);
  return { stageDb, runningDb, phaseDeg, chainRe: gain.re, chainIm: gain.im, loop };
}

/** Everything about the stages of one case that is computed for all of them at once. */
export interface CaseParts {
  readonly low: GainsAt;
  readonly operating: GainsAt;
  readonly high: GainsAt;
  readonly corners: readonly Corners[];
  readonly levels: readonly StageLevels[];
  readonly noise: readonly StageAddedNoise[];
  readonly offsets: readonly Maybe[];
}

/** Rise time of a corner: 0.35/f. Source: common practice (ln 9/(2π) = 0.3497 for one pole). */
export function riseTime(cornerUpperHz: Maybe): Maybe {
  return mapMaybe(cornerUpperHz, (cornerHz) => 0.35 / cornerHz);
}

/** Supply current of a stage's amplifier or block, A. */
export function supplyCurrentOf(stage: PreparedStage, corner: DeviceCorner): Maybe {
  if (!stage.device) return known(0);
  const used = supplyCurrentFor(stage.device, corner);
  return used ? known(used.value) : notEntered('supply current', stage.device);
}

/** Power from both rails, W. */
export function supplyPowerOf(current: Maybe, supply: Supply): Maybe {
  return mapMaybe(current, (amperes) => amperes * (supply.positiveV - supply.negativeV));
}

const NO_LOOP = unknown('Has no feedback loop.');

/**
 * All figures of stage k (1-based) in one case, from the parts computed for the whole chain.
 *
 * @example analyzeStage(input, response, 2, 'minimum', parts).headroomTop
 */
export function analyzeStage(
  input: ChainInput,
  response: ChainResponse,
  k: number,
  corner: DeviceCorner,
  parts: CaseParts,
): StageAnalysis {
  const stage = response.network.prepared[k - 1];
  const corners = parts.corners[k];
  const loop = parts.operating.loop[k];
  const supplyCurrentA = supplyCurrentOf(stage, corner);
  return {
    stageId: stage.stage.id,
    ...gbwBudget(input, response, k, corner),
    cornerUpperHz: corners.upperHz,
    cornerLowerHz: corners.lowerHz,
    operatingBeyondCorner: corners.operatingBeyond,
    idealGainDb: known(ratioToDb(Math.abs(response.idealGain[k]))),
    gainLowDb: known(parts.low.stageDb[k]),
    gainOperatingDb: known(parts.operating.stageDb[k]),
    gainHighDb: known(parts.high.stageDb[k]),
    runningGainDb: known(parts.operating.runningDb[k]),
    phaseDeg: known(parts.operating.phaseDeg[k]),
    loopGain: loop ? known(loop.gain) : NO_LOOP,
    vectorError: loop ? known(1 / loop.returnDifference) : NO_LOOP,
    riseTimeS: riseTime(corners.upperHz),
    ...parts.levels[k - 1],
    outputOffsetV: parts.offsets[k - 1],
    noiseAdded: parts.noise[k - 1].referred,
    supplyCurrentA,
    supplyPowerW: supplyPowerOf(supplyCurrentA, input.specification.supply),
  };
}

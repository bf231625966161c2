import type { ChainCaseAnalysis, Maybe, StageAnalysis } from '../analysis';
import { MutableComplex, angleDeg } from '../complex';
import { TWO_PI } from '../constants';
import type { ChainInput, GbwCase, Specification } from '../types';
import { powerToDb, ratioToDb } from '../units';
import { addedNoise, ChainAddedNoise, sumOf } from './added-noise';
import { bandExtremes } from './band';
import { Corners, findCorners } from './corners';
import { DcOffsets, dcOffsets } from './dc-offset';
import { inputPeak, stageLevels } from './levels';
import { known, mapMaybe, unknown } from '../maybe';
import type { ChainResponse } from './response';
import { CaseParts, GainsAt, analyzeStage, gainsAt, riseTime, supplyPowerOf } from './stage-analysis';

/** What has to be added to 20·log|H| to be in the gain basis, dB; or why the basis does not apply. */
export function basisOffsetDb(specification: Specification): Maybe {
  const { gainBasis, source, load } = specification;
  if (gainBasis === 'voltage') return { value: 0 };
  if (gainBasis === 'transimpedance') {
    return source.kind === 'current'
      ? { value: 0 }
      : unknown('Transimpedance gain needs a current source; this chain has a voltage source.');
  }
  if (load.resistanceOhm === null) return unknown('Transducer gain needs a load resistance; the load is open.');
  if (source.kind === 'current' && source.capacitanceF > 0) {
    return unknown('Transducer gain needs a real source impedance; this source has a capacitance.');
  }
  return { value: powerToDb((4 * source.resistanceOhm) / load.resistanceOhm) };
}

/** Per entry (0 = chain): is there a series capacitor or a lower corner that a lower −3 dB corner can come from? */
function blocksDc(response: ChainResponse): boolean[] {
  const stages = response.network.prepared.map(({ feedback, section, block }) => {
    if (feedback) return (feedback.couplingF ?? 0) > 0;
    if (section) return section.seriesF > 0;
    return (block?.lowerCornerHz ?? 0) > 0;
  });
  return [stages.includes(true), ...stages];
}

/** −dφ/dω by a central difference of the chain's gain over ±0.01 % of the frequency, s. */
function groupDelay(response: ChainResponse, frequencyHz: number): Maybe {
  const step = 1e-4;
  const above: MutableComplex = { re: 0, im: 0 };
  const below: MutableComplex = { re: 0, im: 0 };
  response.solve(frequencyHz * (1 + step));
  response.chainGain(above);
  response.solve(frequencyHz * (1 - step));
  response.chainGain(below);
  const turn = Math.atan2(above.im * below.re - above.re * below.im, above.re * below.re + above.im * below.im);
  return known(-turn / (2 * step * TWO_PI * frequencyHz));
}

function shrinkageOf(chain: Corners, stages: readonly StageAnalysis[]): Maybe {
  const stageCorners = stages.flatMap(({ cornerUpperHz }) =>
    cornerUpperHz.value === null ? [] : [cornerUpperHz.value],
  );
  if (stageCorners.length === 0) return unknown('No stage has an upper −3 dB corner.');
  return mapMaybe(chain.upperHz, (cornerHz) => cornerHz / Math.min(...stageCorners));
}

interface ChainParts {
  readonly parts: CaseParts;
  readonly noise: ChainAddedNoise;
  readonly offsets: DcOffsets;
}

function partsOf(input: ChainInput, response: ChainResponse, gbwCase: GbwCase): ChainParts {
  const { band } = input.specification;
  const { network } = response;
  const offsets = dcOffsets(input, network.prepared, gbwCase);
  const noise = addedNoise(input, network, band.operatingHz);
  const parts: CaseParts = {
    low: gainsAt(response, band.lowHz),
    operating: gainsAt(response, band.operatingHz),
    high: gainsAt(response, band.highHz),
    corners: findCorners(response, band.operatingHz, blocksDc(response)),
    levels: stageLevels(input, response, offsets.stages),
    noise: noise.stages,
    offsets: offsets.stages,
  };
  return { parts, noise, offsets };
}

/** Gain figures of the chain in its basis. */
function chainGains(input: ChainInput, response: ChainResponse, parts: CaseParts) {
  const { band } = input.specification;
  const offset = basisOffsetDb(input.specification);
  const inBasis = (db: number): Maybe => mapMaybe(offset, (offsetDb) => db + offsetDb);
  const gainDb = ({ chainRe, chainIm }: GainsAt): Maybe => inBasis(powerToDb(chainRe * chainRe + chainIm * chainIm));
  const extremes = bandExtremes(response, band.lowHz, band.highHz);
  return {
    idealGainDb: inBasis(ratioToDb(Math.abs(response.idealGain[0]))),
    gainLowDb: gainDb(parts.low),
    gainOperatingDb: gainDb(parts.operating),
    gainHighDb: gainDb(parts.high),
    flatnessDb: known(powerToDb(extremes.highestPower / extremes.lowestPower)),
    worstDroopDb: known(powerToDb(extremes.lowestPower)),
    worstDroopHz: extremes.lowestHz,
  };
}

/**
 * All figures of the chain and its stages in one case.
 *
 * @example analyzeCase(input, new ChainResponse(input, new ChainNetwork(input, 'minimum')), 'minimum').flatnessDb
 */
export function analyzeCase(input: ChainInput, response: ChainResponse, gbwCase: GbwCase): ChainCaseAnalysis {
  const { specification } = input;
  const { parts, noise, offsets } = partsOf(input, response, gbwCase);
  const stages = input.stages.map((_, index) => analyzeStage(input, response, index + 1, gbwCase, parts));
  const corners = parts.corners[0];
  const supplyCurrentA = sumOf(stages.map((stage) => stage.supplyCurrentA));
  const idealLoad = Math.abs(response.ideal.node[response.network.count]);
  return {
    gbwCase,
    stages,
    ...chainGains(input, response, parts),
    cornerUpperHz: corners.upperHz,
    cornerLowerHz: corners.lowerHz,
    operatingBeyondCorner: corners.operatingBeyond,
    shrinkage: shrinkageOf(corners, stages),
    phaseDeg: known(angleDeg({ re: parts.operating.chainRe, im: parts.operating.chainIm })),
    groupDelayS: groupDelay(response, specification.band.operatingHz),
    riseTimeS: riseTime(corners.upperHz),
    inputNoise: noise.inputNoise,
    noiseFigureDb: noise.noiseFigureDb,
    outputOffsetV: offsets.load,
    outputPeakV: mapMaybe(inputPeak(specification.source, 'largest'), (peak) => peak * idealLoad),
    supplyCurrentA,
    supplyPowerW: supplyPowerOf(supplyCurrentA, specification.supply),
    inverted: response.idealGain[0] < 0,
  };
}

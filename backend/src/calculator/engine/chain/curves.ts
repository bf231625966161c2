import { EngineInputError } from '../errors';
import type { MutableComplex } from '../complex';
import { hotIsMinimum } from '../devices/used-values';
import type { CurveCase, CurveRequest, Curves } from '../report';
import { ChainInput, GBW_CASES, GbwCase } from '../types';
import { degrees, powerToDb, ratioToDb } from '../units';
import { assertValid } from './analyze-chain';
import { basisOffsetDb } from './chain-case';
import { ChainNetwork } from './chain-network';
import { ChainResponse } from './response';

/** Steps between two frequencies that the phase is followed over are at most this ratio: 20 a decade. */
const LARGEST_STEP = 10 ** 0.05;

interface Trace {
  readonly gainDb: (number | null)[];
  readonly phaseDeg: (number | null)[];
  re: number;
  im: number;
  phase: number;
}

const newTrace = (): Trace => ({ gainDb: [], phaseDeg: [], re: 1, im: 0, phase: 0 });

/** Follows the phase on from the last point; the first starts from its principal value. */
function follow(trace: Trace, gain: MutableComplex): void {
  const { re, im } = trace;
  trace.phase += Math.atan2(gain.im * re - gain.re * im, gain.re * re + gain.im * im);
  trace.re = gain.re;
  trace.im = gain.im;
}

function put(trace: Trace, offsetDb: number | null): void {
  const db = powerToDb(trace.re * trace.re + trace.im * trace.im);
  trace.gainDb.push(offsetDb !== null && Number.isFinite(db) ? db + offsetDb : null);
  trace.phaseDeg.push(Number.isFinite(trace.phase) ? degrees(trace.phase) : null);
}

function assertAscending({ fromHz, toHz }: CurveRequest): void {
  if (fromHz < toHz) return;
  throw new EngineInputError([
    { code: 'band_reversed', path: 'toHz', message: 'The range has to end above its start.' },
  ]);
}

function frequencies({ fromHz, toHz, points }: CurveRequest): number[] {
  const ratio = Math.log(toHz / fromHz) / (points - 1);
  return Array.from({ length: points }, (_, i) => (i === points - 1 ? toHz : fromHz * Math.exp(ratio * i)));
}

/** Traces of the chain (index 0) and every stage over the frequencies, in-between points solved where they are far apart. */
function traces(response: ChainResponse, frequenciesHz: readonly number[], chainOffsetDb: number | null): Trace[] {
  const found = Array.from({ length: response.network.count + 1 }, newTrace);
  const gain: MutableComplex = { re: 0.5, im: 0.5 };
  const visit = (frequencyHz: number): void => {
    response.solve(frequencyHz);
    for (let k = 0; k < found.length; k++) {
      if (k === 0) response.chainGain(gain);
      else response.stageGain(k, gain);
      follow(found[k], gain);
    }
  };
  let lastHz = frequenciesHz[0];
  for (const frequencyHz of frequenciesHz) {
    const steps = Math.ceil(Math.log(frequencyHz / lastHz) / Math.log(LARGEST_STEP) - 1e-9);
    for (let step = 1; step < steps; step++) visit(lastHz * (frequencyHz / lastHz) ** (step / steps));
    visit(frequencyHz);
    for (let k = 0; k < found.length; k++) put(found[k], k === 0 ? chainOffsetDb : 0);
    lastHz = frequencyHz;
  }
  return found;
}

/**
 * Turns a trace by whole turns until its phase at the operating frequency is a principal value: a chain in phase reads
 * near 0° there, whatever its couplings do at the first frequency.
 */
function unwindAt(trace: Trace, index: number): void {
  const at = trace.phaseDeg[index];
  if (at === null || at === undefined) return;
  const turns = Math.ceil((at - 180) / 360) * 360;
  trace.phaseDeg.forEach((phase, k) => {
    if (phase !== null) trace.phaseDeg[k] = phase - turns;
  });
}

function indexNearest(frequenciesHz: readonly number[], frequencyHz: number): number {
  const after = frequenciesHz.findIndex((each) => each >= frequencyHz);
  if (after < 1) return after < 0 ? frequenciesHz.length - 1 : 0;
  return frequencyHz / frequenciesHz[after - 1] < frequenciesHz[after] / frequencyHz ? after - 1 : after;
}

const curveOf = ({ gainDb, phaseDeg }: Trace): CurveCase => ({ gainDb, phaseDeg });

/**
 * Gain and phase over a logarithmic frequency range: the chain in its gain basis and every stage node to node, in all
 * three cases. Phase in degrees, continuous, and between −180° and 180° at the point nearest to the operating frequency.
 *
 * @throws EngineInputError like analyzeChain, and for a range that does not ascend
 * @example computeCurves(input, { fromHz: 1e5, toHz: 1e8, points: 401 }).chain.minimum.gainDb[0]
 */
export function computeCurves(input: ChainInput, request: CurveRequest): Curves {
  assertValid(input);
  assertAscending(request);
  const frequenciesHz = frequencies(request);
  const operatingIndex = indexNearest(frequenciesHz, input.specification.band.operatingHz);
  const offset = basisOffsetDb(input.specification).value;
  const all = {} as Record<GbwCase, Trace[]>;
  const { policy } = input;
  const idealCase = policy.gbwCase === 'minimumHot' && hotIsMinimum(policy) ? 'minimum' : policy.gbwCase;
  let ideal: readonly number[] = [];
  for (const gbwCase of GBW_CASES) {
    if (gbwCase === 'minimumHot' && hotIsMinimum(policy)) {
      all.minimumHot = all.minimum;
      continue;
    }
    const response = new ChainResponse(input, new ChainNetwork(input, gbwCase));
    all[gbwCase] = traces(response, frequenciesHz, offset);
    all[gbwCase].forEach((trace) => unwindAt(trace, operatingIndex));
    if (gbwCase === idealCase) ideal = response.idealGain;
  }
  const caseCurves = (k: number): Record<GbwCase, CurveCase> => ({
    typical: curveOf(all.typical[k]),
    minimum: curveOf(all.minimum[k]),
    minimumHot: curveOf(all.minimumHot[k]),
  });
  const idealDb = (k: number, offsetDb: number | null): number | null =>
    offsetDb === null ? null : ratioToDb(Math.abs(ideal[k])) + offsetDb;
  return {
    frequenciesHz,
    chain: caseCurves(0),
    idealGainDb: idealDb(0, offset),
    stages: input.stages.map((stage, index) => ({
      stageId: stage.id,
      label: `S${index + 1}`,
      idealGainDb: idealDb(index + 1, 0),
      cases: caseCurves(index + 1),
    })),
  };
}

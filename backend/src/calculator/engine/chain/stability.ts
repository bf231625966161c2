import type { StabilityPoint } from '../analysis';
import type { MutableComplex } from '../complex';
import { LoopSamples, marginFromSamples } from './loop-crossings';
import { scanStages, StageScan } from './loop-scan';
import type { ChainResponse } from './response';
import { powerToDb } from '../units';

/** Below this relative power above ideal (0.002 dB) a peak is not looked for more finely. */
const WORTH_REFINING = 1.0005;
const GOLDEN = (Math.sqrt(5) - 1) / 2;
const GOLDEN_STEPS = 14;

/** The grid up to a stage's own limit, the limit itself as its end. */
function samplesOf(response: ChainResponse, grid: readonly number[], scan: StageScan, loop: LoopAt): LoopSamples {
  let length = grid.length;
  while (length > 2 && grid[length - 2] >= scan.span.limitHz) length--;
  const { re, im } = scan;
  if (grid[length - 1] <= scan.span.limitHz) return { frequenciesHz: grid, re, im, length };
  const samples = { frequenciesHz: grid.slice(0, length), re: re.slice(0, length), im: im.slice(0, length), length };
  const end = { re: 0, im: 0 };
  loop(scan.span.limitHz, end);
  samples.frequenciesHz[length - 1] = scan.span.limitHz;
  samples.re[length - 1] = end.re;
  samples.im[length - 1] = end.im;
  scan.power[length - 1] = response.power[scan.index];
  return samples;
}

type LoopAt = (frequencyHz: number, out: MutableComplex) => void;

function stabilityOf(response: ChainResponse, grid: readonly number[], scan: StageScan): StabilityPoint {
  const { network } = response;
  const feedback = network.stages[scan.index - 1].loop;
  const loop: LoopAt = (frequencyHz, out) => {
    response.solve(frequencyHz);
    feedback?.loadedLoopGain(out);
  };
  const samples = samplesOf(response, grid, scan, loop);
  const margin = marginFromSamples(samples, loop);
  const gain: MutableComplex = { re: 0.5, im: 0.5 };
  let noiseGainAtCrossing: number | null = null;
  let crossingPower = 0;
  for (const crossingHz of margin.crossingsHz) {
    response.solve(crossingHz);
    feedback?.noiseGain(gain);
    const noiseGain = Math.hypot(gain.re, gain.im);
    if (noiseGainAtCrossing === null || noiseGain < noiseGainAtCrossing) noiseGainAtCrossing = noiseGain;
    crossingPower = Math.max(crossingPower, response.power[scan.index]);
  }
  let peak: number | undefined;
  return {
    noCrossing: margin.noCrossing,
    phaseMarginDeg: margin.phaseMarginDeg,
    crossingHz: margin.crossingHz,
    noiseGainAtCrossing,
    // Searched for when it is read: trying hundreds of devices never asks for it.
    get peakingDb() {
      peak ??= peakingDb(response, samples, scan, crossingPower, margin.crossingHz);
      return peak;
    },
  };
}

/** Highest relative gain, from the samples, the crossings and golden sections around the higher of the two. */
function peakingDb(
  response: ChainResponse,
  { frequenciesHz, length }: LoopSamples,
  { index, power }: StageScan,
  crossingPower: number,
  crossingHz: number | null,
): number {
  let highest = 0;
  for (let i = 1; i < length; i++) if (power[i] > power[highest]) highest = i;
  const sampled = Math.max(power[highest], crossingPower);
  if (sampled < WORTH_REFINING) return Math.max(0, powerToDb(sampled));
  let centre = highest;
  if (crossingHz !== null && crossingPower > power[highest]) {
    centre = frequenciesHz.findIndex((frequencyHz) => frequencyHz >= crossingHz);
  }
  const from = Math.log(frequenciesHz[Math.max(0, centre - 1)]);
  const to = Math.log(frequenciesHz[Math.min(length - 1, centre + 1)]);
  const refined = highestBetween(response, index, from, to);
  return Math.max(0, powerToDb(Math.max(sampled, refined)));
}

function highestBetween(response: ChainResponse, index: number, from: number, to: number): number {
  const value = (log: number): number => {
    response.solve(Math.exp(log));
    return response.power[index];
  };
  let highest = 0;
  for (let step = 0; step < GOLDEN_STEPS; step++) {
    const c = to - GOLDEN * (to - from);
    const d = from + GOLDEN * (to - from);
    const atC = value(c);
    const atD = value(d);
    highest = Math.max(highest, atC, atD);
    if (atC > atD) to = d;
    else from = c;
  }
  return highest;
}

/**
 * Phase margin, noise gain at the crossings and peaking of every feedback stage of a chain in one corner, by stage index
 * (1-based). The loop is the loaded one; crossings count from 1 Hz to 100 × max(GBW, second pole).
 * Source: definition of the phase margin; textbook feedback theory.
 *
 * @example one pole: about 90°, no peaking
 */
export function stabilityPoints(response: ChainResponse): Map<number, StabilityPoint> {
  const points = new Map<number, StabilityPoint>();
  if (!response.network.stages.some((stage) => stage.loop)) return points;
  const { grid, scans } = scanStages(response);
  for (const scan of scans) points.set(scan.index, stabilityOf(response, grid, scan));
  return points;
}

import type { ChainResponse } from './response';

const BAND_POINTS = 101;
const GOLDEN = (Math.sqrt(5) - 1) / 2;
const GOLDEN_STEPS = 16;
/** Share of a grid step by which an edge is left to see which way the gain goes. */
const EDGE_STEP = 1e-3;

/** Extremes of the chain's power over ideal within the band. */
export interface BandExtremes {
  readonly highestPower: number;
  readonly lowestPower: number;
  /** Where the lowest is. */
  readonly lowestHz: number;
}

interface Extreme {
  readonly log: number;
  readonly power: number;
}

/** Largest value of `sign`·power between two log frequencies, by golden section; `best` is the sample between them. */
function refineExtreme(
  response: ChainResponse,
  sign: 1 | -1,
  from: number,
  to: number,
): { log: number; power: number } {
  const value = (log: number): number => sign * response.chainPower(Math.exp(log));
  let a = from;
  let b = to;
  let c = b - GOLDEN * (b - a);
  let d = a + GOLDEN * (b - a);
  let atC = value(c);
  let atD = value(d);
  for (let step = 0; step < GOLDEN_STEPS; step++) {
    if (atC > atD) {
      b = d;
      d = c;
      atD = atC;
      c = b - GOLDEN * (b - a);
      atC = value(c);
    } else {
      a = c;
      c = d;
      atC = atD;
      d = a + GOLDEN * (b - a);
      atD = value(d);
    }
  }
  return atC > atD ? { log: c, power: sign * atC } : { log: d, power: sign * atD };
}

/**
 * Highest and lowest chain power over ideal in the band: 101 logarithmic points of the band's own, both edges included,
 * then golden sections around the two extremes.
 *
 * @example a chain with one pole far above the band: highest at the low edge, lowest at the high edge
 */
export function bandExtremes(response: ChainResponse, lowHz: number, highHz: number): BandExtremes {
  const from = Math.log(lowHz);
  const step = (Math.log(highHz) - from) / (BAND_POINTS - 1);
  const logAt = (index: number): number => from + step * Math.min(Math.max(index, 0), BAND_POINTS - 1);
  let highest = response.chainPower(lowHz);
  let lowest = highest;
  let highestAt = 0;
  let lowestAt = 0;
  for (let index = 1; index < BAND_POINTS; index++) {
    const power = response.chainPower(index === BAND_POINTS - 1 ? highHz : Math.exp(from + step * index));
    if (power > highest) {
      highest = power;
      highestAt = index;
    }
    if (power < lowest) {
      lowest = power;
      lowestAt = index;
    }
  }
  const around = (sign: 1 | -1, index: number, power: number): Extreme => {
    const edge = index === 0 || index === BAND_POINTS - 1;
    const inward = index === 0 ? 1 : -1;
    const log = logAt(index);
    // At an edge there is something to look for only where the gain still goes the same way inward.
    if (edge && sign * response.chainPower(Math.exp(log + inward * step * EDGE_STEP)) <= sign * power)
      return { log, power };
    return refineExtreme(response, sign, logAt(index - 1), logAt(index + 1));
  };
  const top = around(1, highestAt, highest);
  const bottom = around(-1, lowestAt, lowest);
  const edgeHz = lowestAt === 0 ? lowHz : highHz;
  const sampledHz = lowestAt === 0 || lowestAt === BAND_POINTS - 1 ? edgeHz : Math.exp(logAt(lowestAt));
  return {
    highestPower: Math.max(highest, top.power),
    lowestPower: Math.min(lowest, bottom.power),
    lowestHz: bottom.power < lowest ? Math.exp(bottom.log) : sampledHz,
  };
}

import type { Maybe } from '../analysis';
import { HALF_POWER } from '../constants';
import { findRoot } from '../root';
import type { ChainResponse } from './response';

/** Taken out once: these run at every frequency. */
const { exp, log } = Math;

const HIGHEST_HZ = 1e12;
const LOWEST_HZ = 1e-3;
const POINTS_PER_DECADE = 8;
const TOLERANCE = 1e-12;

/** Where a stage or chain comes to half the power of its ideal gain. */
export interface Corners {
  readonly upperHz: Maybe;
  readonly lowerHz: Maybe;
  /** Already under half power at the operating frequency. */
  readonly operatingBeyond: boolean;
}

interface Bracket {
  readonly fromHz: number;
  readonly fromExcess: number;
  readonly toHz: number;
  readonly toExcess: number;
}

/** ln of twice the relative power: positive above half power. */
const excessOf = (power: number): number => log(power / HALF_POWER);

/** First crossings of half power on the way from a frequency in steps of a constant ratio, per entry of `wanted`. */
function scan(response: ChainResponse, startHz: number, ratio: number, wanted: readonly number[]): Bracket[][] {
  const found: Bracket[][] = wanted.map(() => []);
  const last = new Float64Array(wanted.length);
  response.solve(startHz);
  for (let k = 0; k < wanted.length; k++) last[k] = excessOf(response.power[k]);
  let open = wanted.filter((count) => count > 0).length;
  let fromHz = startHz;
  while (open > 0) {
    const toHz = fromHz * ratio;
    if (toHz > HIGHEST_HZ || toHz < LOWEST_HZ) break;
    response.solve(toHz);
    for (let k = 0; k < wanted.length; k++) {
      const excess = excessOf(response.power[k]);
      const crossed = excess >= 0 !== last[k] >= 0;
      if (crossed && found[k].length < wanted[k]) {
        found[k].push({ fromHz, fromExcess: last[k], toHz, toExcess: excess });
        if (found[k].length === wanted[k]) open--;
      }
      last[k] = excess;
    }
    fromHz = toHz;
  }
  return found;
}

function refine(response: ChainResponse, k: number, bracket: Bracket): number {
  const excess = (logHz: number): number => {
    if (k === 0) return excessOf(response.chainPower(exp(logHz)));
    response.solve(exp(logHz));
    return excessOf(response.power[k]);
  };
  const from = log(bracket.fromHz);
  const to = log(bracket.toHz);
  return exp(findRoot(excess, from, bracket.fromExcess, to, bracket.toExcess, TOLERANCE));
}

const NO_UPPER: Maybe = { value: null, reason: 'No upper −3 dB corner below 1 THz.' };
const NO_LOWER: Maybe = { value: null, reason: 'No lower −3 dB corner: passes DC.' };
const NO_LOWER_FOUND: Maybe = { value: null, reason: 'No lower −3 dB corner above 1 mHz.' };
const NEVER: Maybe = { value: null, reason: 'Never comes to half the power of its ideal gain.' };

/**
 * Exact −3 dB corners of the chain (index 0) and of every stage (index k): the lowest frequency above the operating
 * frequency, or the highest below it, where |H|² is half of the ideal gain's square (3.0103 dB). Where it is already under
 * that at the operating frequency, the upper corner is searched downward and `operatingBeyond` is set; if there is none
 * below either, the operating frequency lies under the lower corner and both are searched upward.
 *
 * @param blocksDc per entry: a series capacitor or lower corner exists, so that a lower corner can
 * @example one pole at 6.818 MHz, operated at 5 MHz: upper corner 6.818 MHz, no lower corner
 */
export function findCorners(response: ChainResponse, operatingHz: number, blocksDc: readonly boolean[]): Corners[] {
  response.solve(operatingHz);
  const over = Array.from(response.power, (power) => power >= HALF_POWER);
  const ratio = 10 ** (1 / POINTS_PER_DECADE);
  const downward = scan(
    response,
    operatingHz,
    1 / ratio,
    over.map((isOver, k) => (isOver ? 0 : 1) + (blocksDc[k] ? 1 : 0)),
  );
  const upward = scan(
    response,
    operatingHz,
    ratio,
    over.map((isOver, k) => (isOver ? 1 : downward[k].length > 0 ? 0 : 2)),
  );
  return over.map((isOver, k) => {
    const lower = blocksDc[k] ? NO_LOWER_FOUND : NO_LOWER;
    const at = (bracket: Bracket | undefined, none: Maybe): Maybe =>
      bracket ? { value: refine(response, k, bracket) } : none;
    if (isOver) {
      return { upperHz: at(upward[k][0], NO_UPPER), lowerHz: at(downward[k][0], lower), operatingBeyond: false };
    }
    if (downward[k].length > 0) {
      return { upperHz: at(downward[k][0], NEVER), lowerHz: at(downward[k][1], lower), operatingBeyond: true };
    }
    const none = upward[k].length > 0 ? NO_UPPER : NEVER;
    return { upperHz: at(upward[k][1], none), lowerHz: at(upward[k][0], NEVER), operatingBeyond: true };
  });
}

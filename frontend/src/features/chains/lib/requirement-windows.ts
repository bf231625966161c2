import type { Specification } from '../../../api/types';
import type { Values } from './response-geometry';

export interface GainWindow {
  readonly lowDb?: number;
  readonly highDb?: number;
}

/** The gain asked for. It holds at the operating frequency and nowhere else. */
export function requiredGain(requirements: Specification['requirements']): GainWindow | null {
  const { gainDb, minimumGainDb, maximumGainDb } = requirements;
  const lowDb = gainDb ? gainDb.target - gainDb.tolerance : minimumGainDb;
  const highDb = gainDb ? gainDb.target + gainDb.tolerance : maximumGainDb;
  return lowDb === undefined && highDb === undefined ? null : { lowDb, highDb };
}

/**
 * Where the gain may lie over the band without breaking the flatness asked for: from the highest gain in the band
 * down by the flatness. `edgesDb` are the gains at the band edges, between which the points of the sweep fall.
 */
export function allowedByFlatness(
  specification: Pick<Specification, 'band' | 'requirements'>,
  frequenciesHz: readonly number[],
  gainDb: Values,
  edgesDb: Values,
): Required<GainWindow> | null {
  const { band, requirements } = specification;
  const { flatnessDb } = requirements;
  if (flatnessDb === undefined) return null;
  const inside = gainDb.filter((_, index) => {
    const frequencyHz = frequenciesHz[index] ?? 0;
    return frequencyHz >= band.lowHz && frequencyHz <= band.highHz;
  });
  const known = [...inside, ...edgesDb].filter((gain) => gain !== null);
  if (known.length === 0) return null;
  const highDb = Math.max(...known);
  return { lowDb: highDb - flatnessDb, highDb };
}

import type { CurveRequest, Curves } from '../report';
import type { ChainInput } from '../types';

/** Gain and phase over frequency of the chain (in its gain basis) and of every stage (node to node), three cases. */
export function computeCurves(_input: ChainInput, _request: CurveRequest): Curves {
  throw new Error('not available yet');
}

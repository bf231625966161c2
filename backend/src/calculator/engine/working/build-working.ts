import type { Working, WorkingRequest } from '../report';
import type { ChainInput } from '../types';

/** How a figure came about. */
export function buildWorking(_input: ChainInput, _request: WorkingRequest): Working {
  throw new Error('not available yet');
}

import { keepPreviousData, queryOptions } from '@tanstack/react-query';

import { getJson, postJson } from '../../api/client';
import { isApiError } from '../../api/api-error';
import { KEYS } from '../../api/query-keys';
import type {
  CalculationRequest,
  CalculationResponse,
  CandidatesReport,
  Chain,
  DeviceKind,
  DeviceList,
  OptionDto,
} from '../../api/types';
import { canonicalText } from './lib/draft-key';

export const chainQuery = (chainId: string) =>
  queryOptions({
    queryKey: [...KEYS.chains, chainId],
    queryFn: ({ signal }) => getJson<Chain>(`/chains/${chainId}`, { signal }),
  });

export const optionQuery = (optionId: string) =>
  queryOptions({
    queryKey: [...KEYS.options, optionId],
    queryFn: ({ signal }) => getJson<OptionDto>(`/options/${optionId}`, { signal }),
  });

/** Refused input is an answer; only a request without one is worth another try. */
function retryCalculation(failures: number, error: unknown): boolean {
  return isApiError(error, 0) && failures < 2;
}

/**
 * One calculation, under a key made of its whole input: an older answer can never stand in for a newer question, and
 * `signal` ends the request that nobody waits for any more.
 */
export const calculationQuery = (request: CalculationRequest) =>
  queryOptions({
    queryKey: [...KEYS.calculations, 'report', canonicalText(request)],
    queryFn: ({ signal }) => postJson<CalculationResponse>('/calculations', request, signal),
    placeholderData: keepPreviousData,
    retry: retryCalculation,
    gcTime: 60_000,
  });

export type CandidatesRequest = Omit<CalculationRequest, 'include'> & { readonly stageId: string };

export const candidatesQuery = (request: CandidatesRequest) =>
  queryOptions({
    queryKey: [...KEYS.calculations, 'candidates', request.stageId, canonicalText(request)],
    queryFn: ({ signal }) => postJson<CandidatesReport>('/calculations/candidates', request, signal),
    // Devices tried in another stage would mislead; those of this stage stay until the new ones are there.
    placeholderData: (previous) => (previous?.stageId === request.stageId ? previous : undefined),
    retry: retryCalculation,
    gcTime: 60_000,
  });

/** Devices that a new stage of this kind can be made with, the cheapest first. */
export const devicesOfKindQuery = (kind: DeviceKind) =>
  queryOptions({
    queryKey: [...KEYS.devices, 'of-kind', kind],
    queryFn: ({ signal }) =>
      getJson<DeviceList>('/devices', {
        params: { kind, sort: 'price', order: 'asc', page: 1, pageSize: 100 },
        signal,
      }),
  });

import { queryOptions } from '@tanstack/react-query';

import { getJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { Session } from '../../api/types';

export const sessionQuery = () =>
  queryOptions({
    queryKey: KEYS.session,
    queryFn: ({ signal }) => getJson<Session>('/session', { signal }),
    staleTime: 5 * 60_000,
  });

export interface OneTimeLink {
  readonly name: string;
  readonly email: string;
}

export const oneTimeLinkQuery = (token: string) =>
  queryOptions({
    queryKey: [...KEYS.session, 'one-time-link', token],
    queryFn: ({ signal }) => getJson<OneTimeLink>(`/one-time-links/${encodeURIComponent(token)}`, { signal }),
    retry: false,
    staleTime: Infinity,
  });

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

const ONE_TIME_LINK = 'one-time-link';

/** A link is spent by being used: what was read of it is never read again. */
export const isOfOneTimeLink = ({ queryKey }: { readonly queryKey: readonly unknown[] }): boolean =>
  queryKey[0] === KEYS.session[0] && queryKey[1] === ONE_TIME_LINK;

export const oneTimeLinkQuery = (token: string) =>
  queryOptions({
    queryKey: [...KEYS.session, ONE_TIME_LINK, token],
    queryFn: ({ signal }) => getJson<OneTimeLink>(`/one-time-links/${encodeURIComponent(token)}`, { signal }),
    retry: false,
    staleTime: Infinity,
  });

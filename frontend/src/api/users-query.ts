import { queryOptions } from '@tanstack/react-query';

import { getJson } from './client';
import { KEYS } from './query-keys';
import type { UserRow } from './types';

/** Everybody sees names and roles; administrators also the addresses. */
export const usersQuery = () =>
  queryOptions({
    queryKey: KEYS.users,
    queryFn: ({ signal }) => getJson<UserRow[]>('/users', { signal }),
  });

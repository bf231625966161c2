import { queryOptions } from '@tanstack/react-query';

import { getJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { Desk } from '../../api/types';

export const deskQuery = () =>
  queryOptions({
    queryKey: KEYS.desk,
    queryFn: ({ signal }) => getJson<Desk>('/desk', { signal }),
  });

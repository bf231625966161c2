import { MutationCache, QueryCache, QueryClient } from '@tanstack/react-query';

import { isApiError } from '../api/api-error';
import { KEYS } from '../api/query-keys';

const MAXIMUM_RETRIES = 2;

/** Refusals do not change by asking again; a server that did not answer may. */
function shouldRetry(failureCount: number, error: unknown): boolean {
  if (isApiError(error) && error.status >= 400 && error.status < 500) return false;
  return failureCount < MAXIMUM_RETRIES;
}

/** `onSignedOut` is called when the server no longer knows the session of somebody who was signed in. */
export function createQueryClient(onSignedOut: () => void): QueryClient {
  const watch = (error: unknown): void => {
    if (isApiError(error, 401) && error.code !== 'invalid_credentials') onSignedOut();
  };
  return new QueryClient({
    queryCache: new QueryCache({
      onError: (error, query) => {
        if (query.queryKey[0] !== KEYS.session[0]) watch(error);
      },
    }),
    mutationCache: new MutationCache({ onError: watch }),
    defaultOptions: {
      queries: { retry: shouldRetry, staleTime: 15_000, refetchOnWindowFocus: false },
      mutations: { retry: false },
    },
  });
}

import { useMutation, useQueryClient } from '@tanstack/react-query';

import { deleteJson, postJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { Session, SessionUser } from '../../api/types';
import { isOfOneTimeLink } from './queries';

interface SignedIn {
  readonly user: SessionUser;
}

const isOfSession = (query: { readonly queryKey: readonly unknown[] }): boolean =>
  query.queryKey[0] === KEYS.session[0];

/** Puts the person into the session that is already loaded; another person sees nothing of the one before. */
function useSignedIn(): (answer: SignedIn) => Promise<void> {
  const client = useQueryClient();
  return async ({ user }) => {
    const before = client.getQueryData<Session>(KEYS.session)?.user;
    if (before && before.id !== user.id) client.removeQueries({ predicate: (query) => !isOfSession(query) });
    client.setQueryData<Session>(KEYS.session, (session) =>
      session ? { ...session, user, setupNeeded: false } : session,
    );
    await client.invalidateQueries({ predicate: (query) => !isOfOneTimeLink(query) });
  };
}

export interface Credentials {
  readonly email: string;
  readonly password: string;
}

export function useSignIn() {
  const signedIn = useSignedIn();
  return useMutation({
    mutationFn: (credentials: Credentials) => postJson<SignedIn>('/session', credentials),
    onSuccess: signedIn,
  });
}

export function useDemoSignIn() {
  const signedIn = useSignedIn();
  return useMutation({
    mutationFn: (userId: string) => postJson<SignedIn>('/session/demo', { userId }),
    onSuccess: signedIn,
  });
}

export function useSetUp() {
  const signedIn = useSignedIn();
  return useMutation({
    mutationFn: (body: Credentials & { readonly token: string; readonly name: string }) =>
      postJson<SignedIn>('/setup', body),
    onSuccess: signedIn,
  });
}

export function useSetPassword(token: string) {
  const signedIn = useSignedIn();
  return useMutation({
    mutationFn: (password: string) => postJson<SignedIn>(`/one-time-links/${encodeURIComponent(token)}`, { password }),
    onSuccess: signedIn,
  });
}

/** Leaves by loading the sign-in page anew: nothing that this person saw stays in memory. */
export function useSignOut() {
  return useMutation({
    mutationFn: () => deleteJson('/session'),
    onSuccess: () => window.location.assign('/sign-in'),
  });
}

import { createContext, useContext } from 'react';

import type { Role, SessionUser } from '../api/types';

/** The signed-in person; set by the layout, so that every page behind sign-in has one. */
export const SessionUserContext = createContext<SessionUser | null>(null);

export function useSessionUser(): SessionUser {
  const user = useContext(SessionUserContext);
  if (!user) throw new Error('useSessionUser needs a signed-in layout above it');
  return user;
}

/** For offering things; the server decides by itself. */
export function useHasRole(...roles: readonly Role[]): boolean {
  const user = useSessionUser();
  return roles.some((role) => user.roles.includes(role));
}

import type { SessionUser } from '../common/session-user';

/** A person's account as sign-in sees it. */
export interface Account extends SessionUser {
  readonly active: boolean;
  readonly isDemo: boolean;
  readonly title: string | null;
  readonly passwordHash: string | null;
  readonly sessionEpoch: number;
}

export function toSessionUser({ id, name, email, roles }: SessionUser): SessionUser {
  return { id, name, email, roles };
}

import type { Role } from './role';

/** The signed-in person as guards, policies and presenters see them. */
export interface SessionUser {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}

import type { SessionUser } from '../common/session-user';

type Roles = Pick<SessionUser, 'roles'>;

/** Whoever reads this has seen the project already: what cannot be seen was answered with 404 before. */
export function canEditChain({ roles }: Roles): boolean {
  return roles.includes('designer') || roles.includes('lead');
}

/** A chain keeps at least one option. */
export function canDeleteOption(user: Roles, optionCount: number): boolean {
  return canEditChain(user) && optionCount > 1;
}

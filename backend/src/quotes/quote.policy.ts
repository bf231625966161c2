import type { SessionUser } from '../common/session-user';

/** Prices are entered by whoever plans or buys; an administrator as such does neither. */
export function canSetQuote({ roles }: Pick<SessionUser, 'roles'>): boolean {
  return roles.includes('designer') || roles.includes('buyer') || roles.includes('lead');
}

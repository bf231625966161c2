import type { SessionUser } from '../common/session-user';

/** Invite, change roles, deactivate, hand out password links. */
export function canManageUsers(actor: SessionUser): boolean {
  return actor.roles.includes('admin');
}

/** Names and roles are for everybody in the team; mail addresses for those who manage people. */
export function canListUsers(_actor: SessionUser): boolean {
  return true;
}

export function canSeeEmail(actor: SessionUser): boolean {
  return canManageUsers(actor);
}

import type { SessionUser } from '../common/session-user';

/** How a person stands to a project. */
export interface ProjectAccess {
  readonly open: boolean;
  readonly member: boolean;
}

type Roles = Pick<SessionUser, 'roles'>;

const plans = ({ roles }: Roles): boolean => roles.includes('designer') || roles.includes('lead');

/** Membership gates a closed project for everyone, administrators included. */
export function canSeeProject({ open, member }: ProjectAccess): boolean {
  return open || member;
}

export function canCreateProject(user: Roles): boolean {
  return plans(user);
}

export function canEditProject(user: Roles, access: ProjectAccess): boolean {
  return canSeeProject(access) && plans(user);
}

export function canSetPolicy(user: Roles, access: ProjectAccess): boolean {
  return canSeeProject(access) && user.roles.includes('lead');
}

export function canCreateChain(user: Roles, access: ProjectAccess): boolean {
  return canEditProject(user, access);
}

/** A project with chains cannot be deleted by anybody. */
export function canDeleteProject(user: Roles, access: ProjectAccess, chainCount: number): boolean {
  return canEditProject(user, access) && chainCount === 0;
}

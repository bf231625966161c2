import type { Policy } from '../calculator/engine';
import type { SessionUser } from '../common/session-user';
import type { ProjectDto, ProjectListItemDto, ProjectMemberDto, ProjectRightsDto } from './dto/project.dto';
import type { Project } from './models/project.model';
import { canCreateChain, canDeleteProject, canEditProject, canSetPolicy } from './project.policy';
import type { ProjectAccess } from './project.policy';

/** What other features may know of a project. */
export interface ProjectFacts {
  readonly id: string;
  readonly code: string;
  readonly name: string;
  readonly policy: Policy;
  readonly currency: string;
  readonly buildQuantity: number;
  readonly version: number;
  readonly access: ProjectAccess;
}

function rights(user: SessionUser, access: ProjectAccess, chainCount: number): ProjectRightsDto {
  return {
    edit: canEditProject(user, access),
    setPolicy: canSetPolicy(user, access),
    createChain: canCreateChain(user, access),
    delete: canDeleteProject(user, access, chainCount),
  };
}

const accessOf = (project: Project, memberIds: readonly string[], user: SessionUser): ProjectAccess => ({
  open: project.open,
  member: memberIds.includes(user.id),
});

export function presentProject(
  project: Project,
  members: readonly ProjectMemberDto[],
  chainCount: number,
  user: SessionUser,
): ProjectDto {
  const { id, code, name, description, open, policy, currency, buildQuantity, version } = project;
  const memberIds = members.map((member) => member.id);
  return {
    id,
    code,
    name,
    description,
    open,
    members: members.map((member) => ({ id: member.id, name: member.name })),
    policy,
    currency,
    buildQuantity,
    chainCount,
    version,
    updatedAt: project.updatedAt.toISOString(),
    can: rights(user, accessOf(project, memberIds, user), chainCount),
  };
}

export function presentProjectListItem(
  project: Project,
  memberIds: readonly string[],
  chainCount: number,
  user: SessionUser,
): ProjectListItemDto {
  const { id, code, name, open, currency, buildQuantity } = project;
  return {
    id,
    code,
    name,
    open,
    memberCount: memberIds.length,
    chainCount,
    currency,
    buildQuantity,
    updatedAt: project.updatedAt.toISOString(),
    can: rights(user, accessOf(project, memberIds, user), chainCount),
  };
}

export function projectFacts(project: Project, access: ProjectAccess): ProjectFacts {
  const { id, code, name, policy, currency, buildQuantity, version } = project;
  return { id, code, name, policy, currency, buildQuantity, version, access };
}

/** What goes on record about a project. */
export function auditedProject(project: Project, memberIds: readonly string[]): Record<string, unknown> {
  const { code, name, description, open, currency, buildQuantity, policy } = project;
  return { code, name, description, open, currency, buildQuantity, policy, memberIds };
}

import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { NotFoundError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { Project } from './models/project.model';
import { ProjectMember } from './models/project-member.model';
import { canSeeProject } from './project.policy';
import { projectFacts } from './project.presenter';
import type { ProjectFacts } from './project.presenter';

/** Who may see which project: the one answer that every feature below a project asks for. */
@Injectable()
export class ProjectAccessService {
  constructor(
    @InjectModel(Project) private readonly projects: typeof Project,
    @InjectModel(ProjectMember) private readonly members: typeof ProjectMember,
  ) {}

  /** The project with how `user` stands to it; absent and hidden projects look the same. */
  async getVisible(user: SessionUser, projectId: string, transaction?: Transaction): Promise<ProjectFacts> {
    const project = await this.projects.findByPk(projectId, { transaction });
    const membership = await this.members.count({ where: { projectId, userId: user.id }, transaction });
    const access = { open: project?.open ?? false, member: membership > 0 };
    if (project === null || !canSeeProject(access)) throw new NotFoundError();
    return projectFacts(project, access);
  }

  async findAllVisible(user: SessionUser): Promise<ProjectFacts[]> {
    const projects = await this.projects.findAll({
      order: [
        ['code', 'ASC'],
        ['id', 'ASC'],
      ],
    });
    const memberships = await this.members.findAll({ where: { userId: user.id } });
    const memberOf = new Set(memberships.map((membership) => membership.projectId));
    return projects
      .map((project) => projectFacts(project, { open: project.open, member: memberOf.has(project.id) }))
      .filter((facts) => canSeeProject(facts.access));
  }
}

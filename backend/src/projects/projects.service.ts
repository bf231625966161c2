import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { DEFAULT_POLICY } from '../calculator/engine';
import { ConflictError, ForbiddenError, InvalidError, StaleVersionError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { WriteQueue } from '../database/write-queue';
import { UsersService } from '../users/users.service';
import type { CreateProjectDto } from './dto/create-project.dto';
import type { ProjectDto, ProjectListItemDto } from './dto/project.dto';
import type { UpdateProjectDto } from './dto/update-project.dto';
import { Project } from './models/project.model';
import { ProjectMember } from './models/project-member.model';
import { ProjectAccessService } from './project-access.service';
import { canCreateProject, canDeleteProject, canEditProject, canSetPolicy } from './project.policy';
import type { ProjectAccess } from './project.policy';
import { auditedProject, presentProject, presentProjectListItem } from './project.presenter';

@Injectable()
export class ProjectsService {
  constructor(
    @InjectModel(Project) private readonly projects: typeof Project,
    @InjectModel(ProjectMember) private readonly members: typeof ProjectMember,
    private readonly access: ProjectAccessService,
    private readonly users: UsersService,
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
  ) {}

  async findAll(user: SessionUser): Promise<ProjectListItemDto[]> {
    const visible = await this.access.findAllVisible(user);
    const ids = visible.map((facts) => facts.id);
    const rows = await this.projects.findAll({ where: { id: ids } });
    const members = await this.members.findAll({ where: { projectId: ids } });
    const chainCounts = await this.countChains();
    const byId = new Map(rows.map((row) => [row.id, row]));
    return ids.flatMap((id) => {
      const row = byId.get(id);
      const memberIds = members.filter((member) => member.projectId === id).map((member) => member.userId);
      return row ? [presentProjectListItem(row, memberIds, chainCounts.get(id) ?? 0, user)] : [];
    });
  }

  async findOne(user: SessionUser, id: string): Promise<ProjectDto> {
    await this.access.getVisible(user, id);
    return this.present(user, id);
  }

  async create(user: SessionUser, dto: CreateProjectDto): Promise<ProjectDto> {
    if (!canCreateProject(user)) throw new ForbiddenError();
    const memberIds = [...new Set([user.id, ...(dto.memberIds ?? [])])];
    await this.assertPeopleExist(memberIds);
    const project = await this.queue.transaction(async (transaction) => {
      const { code, name, open, currency, buildQuantity } = dto;
      const row = await this.projects.create(
        { code, name, description: dto.description ?? '', open, currency, buildQuantity, policy: DEFAULT_POLICY },
        { transaction },
      );
      await this.replaceMembers(row.id, memberIds, transaction);
      await this.record(user, 'project.created', row, transaction, { after: auditedProject(row, memberIds) });
      return row;
    });
    return this.present(user, project.id);
  }

  async update(user: SessionUser, id: string, dto: UpdateProjectDto): Promise<ProjectDto> {
    const { access } = await this.access.getVisible(user, id);
    assertMayChange(user, access, dto);
    if (dto.memberIds) await this.assertPeopleExist(dto.memberIds);
    await this.queue.transaction(async (transaction) => {
      const row = await this.projects.findByPk(id, { transaction, rejectOnEmpty: true });
      if (row.version !== dto.version) throw new StaleVersionError(await this.present(user, id, transaction));
      const oldMemberIds = await this.memberIdsOf(id, transaction);
      const before = auditedProject(row, oldMemberIds);
      row.set({ ...changesOf(dto), policy: { ...row.policy, ...dto.policy }, version: row.version + 1 });
      const memberIds = dto.memberIds ? [...new Set(dto.memberIds)] : oldMemberIds;
      assertSomebodySees(row.open, memberIds);
      await row.save({ transaction });
      if (dto.memberIds) await this.replaceMembers(id, memberIds, transaction);
      await this.record(user, 'project.updated', row, transaction, { before, after: auditedProject(row, memberIds) });
    });
    return this.present(user, id);
  }

  async remove(user: SessionUser, id: string): Promise<void> {
    const { access } = await this.access.getVisible(user, id);
    if (!canEditProject(user, access)) throw new ForbiddenError();
    await this.queue.transaction(async (transaction) => {
      const chainCount = (await this.countChains(transaction)).get(id) ?? 0;
      if (!canDeleteProject(user, access, chainCount)) {
        throw new ConflictError(
          'in_use',
          `The project still has ${chainCount === 1 ? 'a chain; delete it' : `${chainCount} chains; delete these`} first.`,
        );
      }
      const row = await this.projects.findByPk(id, { transaction, rejectOnEmpty: true });
      const before = auditedProject(row, await this.memberIdsOf(id, transaction));
      await row.destroy({ transaction });
      await this.record(user, 'project.deleted', row, transaction, { before });
    });
  }

  private async present(user: SessionUser, id: string, transaction?: Transaction): Promise<ProjectDto> {
    const row = await this.projects.findByPk(id, { transaction, rejectOnEmpty: true });
    const people = await this.users.findNames(await this.memberIdsOf(id, transaction));
    const chainCounts = await this.countChains(transaction);
    return presentProject(row, people, chainCounts.get(id) ?? 0, user);
  }

  private async memberIdsOf(projectId: string, transaction?: Transaction): Promise<string[]> {
    const rows = await this.members.findAll({ where: { projectId }, order: ['userId'], transaction });
    return rows.map((row) => row.userId);
  }

  private async replaceMembers(projectId: string, userIds: readonly string[], transaction: Transaction): Promise<void> {
    await this.members.destroy({ where: { projectId }, transaction });
    await this.members.bulkCreate(
      userIds.map((userId) => ({ projectId, userId })),
      { transaction },
    );
  }

  /** Chains belong to a feature above this one: only their number is looked at. */
  private async countChains(transaction?: Transaction): Promise<Map<string, number>> {
    const rows = await this.projects.sequelize!.query<{ projectId: string; count: number }>(
      'SELECT project_id AS projectId, COUNT(*) AS count FROM chains GROUP BY project_id',
      { type: QueryTypes.SELECT, transaction },
    );
    return new Map(rows.map((row) => [row.projectId, row.count]));
  }

  private async assertPeopleExist(userIds: readonly string[]): Promise<void> {
    const known = new Set((await this.users.findNames(userIds)).map((person) => person.id));
    const index = userIds.findIndex((id) => !known.has(id));
    if (index < 0) return;
    throw new InvalidError([{ path: 'memberIds', code: 'user_unknown', message: 'names a person who does not exist' }]);
  }

  private record(
    user: SessionUser,
    action: string,
    row: Project,
    transaction: Transaction,
    change: { before?: unknown; after?: unknown },
  ): Promise<void> {
    return this.audit.record(transaction, {
      actorId: user.id,
      action,
      entity: 'project',
      entityId: row.id,
      ...change,
    });
  }
}

function assertMayChange(user: SessionUser, access: ProjectAccess, dto: UpdateProjectDto): void {
  if (!canEditProject(user, access)) throw new ForbiddenError();
  if (dto.policy && !canSetPolicy(user, access)) throw new ForbiddenError('Only a lead may set the policy.');
}

/** A closed project without members would be lost to everybody. */
function assertSomebodySees(open: boolean, memberIds: readonly string[]): void {
  if (open || memberIds.length > 0) return;
  throw new InvalidError([
    { path: 'memberIds', code: 'too_few', message: 'A closed project needs at least one member.' },
  ]);
}

function changesOf(dto: UpdateProjectDto): Partial<UpdateProjectDto> {
  const { code, name, description, open, currency, buildQuantity } = dto;
  const changes = { code, name, description, open, currency, buildQuantity };
  return Object.fromEntries(Object.entries(changes).filter(([, value]) => value !== undefined));
}

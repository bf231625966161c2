import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { ConflictError, NotFoundError, StaleVersionError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { SessionStore } from '../database/session-store';
import { WriteQueue } from '../database/write-queue';
import type { CreateUserDto } from './dto/create-user.dto';
import type { UpdateUserDto } from './dto/update-user.dto';
import type { CreatedUserDto, PasswordLinkDto, UserDto } from './dto/user.dto';
import { User } from './models/user.model';
import { OneTimeLinksService } from './one-time-links.service';
import { auditedUser, presentUser } from './user.presenter';

/** People as administrators manage them. */
@Injectable()
export class UsersService {
  constructor(
    @InjectModel(User) private readonly users: typeof User,
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
    private readonly links: OneTimeLinksService,
    private readonly sessions: SessionStore,
  ) {}

  async findAll(actor: SessionUser): Promise<UserDto[]> {
    const users = await this.users.findAll({ order: ['name', 'id'] });
    return users.map((user) => presentUser(user, actor));
  }

  /** The people among `ids`, deactivated ones included, for features that refer to people (`[{id, name}]` in the given order). */
  async findNames(ids: readonly string[]): Promise<{ id: string; name: string }[]> {
    const users = await this.users.findAll({ where: { id: [...ids] } });
    const byId = new Map(users.map((user) => [user.id, user]));
    return ids.flatMap((id) => {
      const user = byId.get(id);
      return user === undefined ? [] : [{ id: user.id, name: user.name }];
    });
  }

  async create(actor: SessionUser, dto: CreateUserDto): Promise<CreatedUserDto> {
    return this.queue.transaction(async (transaction) => {
      const { name, email, roles } = dto;
      const user = await this.users.create({ name, email, roles }, { transaction });
      const link = await this.links.create(user.id, actor.id, transaction);
      await this.audit.record(transaction, {
        actorId: actor.id,
        action: 'user.invited',
        entity: 'user',
        entityId: user.id,
        after: auditedUser(user),
      });
      return { user: presentUser(user, actor), link };
    });
  }

  async update(actor: SessionUser, id: string, dto: UpdateUserDto): Promise<UserDto> {
    const { user, accessChanged } = await this.queue.transaction(async (transaction) => {
      const row = await this.getById(id, transaction);
      if (row.version !== dto.version) throw new StaleVersionError(presentUser(row, actor));
      const before = auditedUser(row);
      row.set({ ...pickChanges(dto), version: row.version + 1 });
      // Whoever loses or gains a right starts over with a new session.
      const changed = row.changed('roles') || row.changed('active');
      if (changed) row.set({ sessionEpoch: row.sessionEpoch + 1 });
      await row.save({ transaction });
      if (!row.active) await this.links.removeAllOf(row.id, transaction);
      await this.assertAdminLeft(transaction);
      await this.audit.record(transaction, {
        actorId: actor.id,
        action: dto.active === false ? 'user.deactivated' : 'user.updated',
        entity: 'user',
        entityId: id,
        before,
        after: auditedUser(row),
      });
      return { user: row, accessChanged: changed };
    });
    if (accessChanged) await this.sessions.endSessionsOf(id);
    return presentUser(user, actor);
  }

  async createPasswordLink(actor: SessionUser, id: string): Promise<PasswordLinkDto> {
    return this.queue.transaction(async (transaction) => {
      const user = await this.getById(id, transaction);
      if (!user.active) throw new ConflictError('user_inactive', 'This person is deactivated; activate them first.');
      const link = await this.links.create(user.id, actor.id, transaction);
      await this.audit.record(transaction, {
        actorId: actor.id,
        action: 'user.password_link_made',
        entity: 'user',
        entityId: id,
      });
      return link;
    });
  }

  private async getById(id: string, transaction: Transaction): Promise<User> {
    const user = await this.users.findByPk(id, { transaction });
    if (user === null) throw new NotFoundError();
    return user;
  }

  /** At least one active administrator who can sign in must remain, or nobody could ever let people in again. */
  private async assertAdminLeft(transaction: Transaction): Promise<void> {
    const active = await this.users.findAll({ where: { active: true }, transaction });
    const canSignIn = (user: User) => typeof user.passwordHash === 'string' || user.isDemo;
    if (!active.some((user) => user.roles.includes('admin') && canSignIn(user))) {
      throw new ConflictError('last_admin', 'This is the last active administrator; make somebody else one first.');
    }
  }
}

function pickChanges({ name, roles, active }: UpdateUserDto): Partial<UpdateUserDto> {
  return {
    ...(name === undefined ? {} : { name }),
    ...(roles === undefined ? {} : { roles }),
    ...(active === undefined ? {} : { active }),
  };
}

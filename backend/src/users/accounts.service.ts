import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { ConflictError, NotFoundError } from '../common/errors';
import type { Role } from '../common/role';
import { SessionStore } from '../database/session-store';
import { WriteQueue } from '../database/write-queue';
import type { Account } from './account';
import { User } from './models/user.model';
import { OneTimeLinksService } from './one-time-links.service';
import { PasswordHasher } from './password-hasher';
import { auditedUser } from './user.presenter';

export interface DemoAccount {
  readonly id: string;
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
  readonly title: string;
}

/** Accounts as sign-in needs them; what administrators do with people is in {@link UsersService}. */
@Injectable()
export class AccountsService {
  constructor(
    @InjectModel(User) private readonly users: typeof User,
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
    private readonly links: OneTimeLinksService,
    private readonly hasher: PasswordHasher,
    private readonly sessions: SessionStore,
  ) {}

  findActive(id: string): Promise<Account | null> {
    return this.users.findOne({ where: { id, active: true } });
  }

  findByEmail(email: string): Promise<Account | null> {
    return this.users.findOne({ where: { email: email.trim().toLowerCase() } });
  }

  findDemoAccounts(): Promise<Account[]> {
    return this.users.findAll({ where: { isDemo: true, active: true }, order: ['createdAt', 'name'] });
  }

  async exist(): Promise<boolean> {
    return (await this.users.count()) > 0;
  }

  /** One person of the invented team; no password, so only the demo's own sign-in opens the account. */
  async createDemoAccount(account: DemoAccount, transaction: Transaction): Promise<Account> {
    const user = await this.users.create({ ...account, isDemo: true }, { transaction });
    await this.audit.record(transaction, {
      actorId: null,
      action: 'user.seeded',
      entity: 'user',
      entityId: user.id,
      after: auditedUser(user),
    });
    return user;
  }

  /** The first person of a new installation; 404 as soon as there is anybody. */
  async createFirstAdmin(name: string, email: string, password: string): Promise<Account> {
    const passwordHash = await this.hasher.hash(password);
    return this.queue.transaction(async (transaction) => {
      if ((await this.users.count({ transaction })) > 0) throw new NotFoundError();
      const user = await this.users.create({ name, email, roles: ['admin'], passwordHash }, { transaction });
      await this.audit.record(transaction, {
        actorId: user.id,
        action: 'user.set_up',
        entity: 'user',
        entityId: user.id,
        after: auditedUser(user),
      });
      return user;
    });
  }

  async findByLink(token: string): Promise<Account | null> {
    const userId = await this.links.findUserId(token);
    return userId === null ? null : this.findActive(userId);
  }

  /** Uses a link up: the person has a new password and every earlier session is over. */
  async setPasswordByLink(token: string, password: string): Promise<Account> {
    if ((await this.findByLink(token)) === null) throw new NotFoundError();
    const passwordHash = await this.hasher.hash(password);
    const user = await this.queue.transaction(async (transaction) => {
      const userId = await this.links.findUserId(token, transaction);
      const row = userId === null ? null : await this.users.findByPk(userId, { transaction });
      if (row === null || !row.active) throw new NotFoundError();
      await this.links.removeAllOf(row.id, transaction);
      await row.update({ passwordHash, sessionEpoch: row.sessionEpoch + 1 }, { transaction });
      await this.audit.record(transaction, {
        actorId: row.id,
        action: 'user.password_set',
        entity: 'user',
        entityId: row.id,
      });
      return row;
    });
    await this.sessions.endSessionsOf(user.id);
    return user;
  }

  /** Puts a sign-in on record. */
  async recordSignIn(user: Account, way: 'password' | 'demo' | 'link' | 'setup'): Promise<void> {
    await this.queue.transaction(async (transaction) => {
      const current = await this.users.findByPk(user.id, { transaction });
      if (current === null || !current.active) throw new ConflictError('account_changed', 'Please sign in again.');
      await this.audit.record(transaction, {
        actorId: user.id,
        action: 'session.started',
        entity: 'user',
        entityId: user.id,
        after: { way },
      });
    });
  }
}

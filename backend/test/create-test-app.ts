import { mkdtempSync, rmSync } from 'node:fs';
import type { Server } from 'node:http';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { getConnectionToken } from '@nestjs/sequelize';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { QueryTypes } from 'sequelize';
import type { Sequelize } from 'sequelize-typescript';
import request from 'supertest';
import { bootApp, type BootedApp } from '../src/boot';
import type { Role } from '../src/common/role';
import { readEnvironment } from '../src/config/environment';
import { createUser, type CreateUserOptions, type TestUser } from './factories/users';

export type Agent = ReturnType<typeof request.agent>;

export interface SignedIn {
  readonly agent: Agent;
  readonly user: TestUser;
}

/** One application on a real database file of its own, listening on a free port. */
export class TestApp {
  private constructor(
    readonly booted: BootedApp,
    readonly dataDir: string,
  ) {}

  static async create(environment: Readonly<Record<string, string>> = {}): Promise<TestApp> {
    const dataDir = environment.DATA_DIR ?? mkdtempSync(path.join(tmpdir(), 'bandledger-test-'));
    const config = readEnvironment({
      DEMO: 'off',
      LOG_LEVEL: 'error',
      // The lowest cost: the tests sign in hundreds of times.
      SCRYPT_COST: '10',
      PUBLIC_URL: 'http://127.0.0.1:4180',
      ...environment,
      DATA_DIR: dataDir,
    });
    const booted = await bootApp(config);
    await booted.app.listen(0, '127.0.0.1');
    return new TestApp(booted, dataDir);
  }

  get app(): NestExpressApplication {
    return this.booted.app;
  }

  get server(): Server {
    return this.app.getHttpServer() as Server;
  }

  get sequelize(): Sequelize {
    return this.app.get<Sequelize>(getConnectionToken());
  }

  /** The rows of a query, for looking at what was really stored. */
  rows<T extends object>(sql: string, bind: Record<string, unknown> = {}): Promise<T[]> {
    return this.sequelize.query<T>(sql, { bind, type: QueryTypes.SELECT });
  }

  /** A client with the CSRF header and its own cookies, not signed in. */
  anonymous(): Agent {
    const agent = request.agent(this.server);
    agent.set('X-Requested-With', 'bandledger');
    return agent;
  }

  /** A new person with these roles, signed in by password. */
  async signedIn(roles: Role | readonly Role[], options: Omit<CreateUserOptions, 'roles'> = {}): Promise<SignedIn> {
    const user = await createUser(this.app, { ...options, roles: typeof roles === 'string' ? [roles] : roles });
    return { user, agent: await this.signIn(user) };
  }

  async signIn(user: Pick<TestUser, 'email' | 'password'>): Promise<Agent> {
    const agent = this.anonymous();
    await agent.post('/api/session').send({ email: user.email, password: user.password }).expect(200);
    return agent;
  }

  async close({ keepData = false } = {}): Promise<void> {
    await this.booted.close();
    if (!keepData) rmSync(this.dataDir, { recursive: true, force: true });
  }
}

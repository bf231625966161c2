import { Injectable, type OnApplicationShutdown } from '@nestjs/common';
import connectSessionSequelize from 'connect-session-sequelize';
import session from 'express-session';
import { DataTypes, type Model, type ModelStatic } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { Runtime } from '../config/runtime';
import { sessionsFile } from './data-folder';
import { sqliteOptions } from './sqlite';

/** What a session knows: who signed in, and the epoch of that person's sessions at that time. */
export interface SessionIdentity {
  readonly id: string;
  readonly epoch: number;
}

declare module 'express-session' {
  interface SessionData {
    user: SessionIdentity;
    renewedAtMs: number;
  }
}

const SequelizeStore = connectSessionSequelize(session.Store);

/** Sessions in a file of their own: the store writes beside the write queue and must not meet it. */
@Injectable()
export class SessionStore implements OnApplicationShutdown {
  readonly store: InstanceType<typeof SequelizeStore>;
  private readonly sequelize: Sequelize;
  private readonly model: ModelStatic<Model>;

  constructor(runtime: Runtime) {
    this.sequelize = new Sequelize(sqliteOptions(sessionsFile(runtime.config.dataDir)));
    this.model = this.sequelize.define(
      'Session',
      {
        sid: { type: DataTypes.STRING(64), primaryKey: true },
        expires: { type: DataTypes.DATE, allowNull: false },
        data: { type: DataTypes.TEXT, allowNull: false },
        userId: { type: DataTypes.UUID, allowNull: true },
      },
      { tableName: 'sessions', indexes: [{ fields: ['user_id'] }, { fields: ['expires'] }] },
    );
    // The library's types know less than the library: disableTouch is missing from them.
    const options: ConstructorParameters<typeof SequelizeStore>[0] & { disableTouch: boolean } = {
      db: this.sequelize,
      table: 'Session',
      disableTouch: true,
      extendDefaultFields: (defaults, data) => ({
        ...defaults,
        userId: (data as Partial<session.SessionData>).user?.id ?? null,
      }),
    };
    this.store = new SequelizeStore(options);
  }

  /** Sessions may be thrown away at any time, so their one table needs no migrations. */
  async prepare(): Promise<void> {
    await this.sequelize.query('PRAGMA journal_mode = WAL');
    await this.model.sync();
  }

  /** Forgets every session of a person. */
  async endSessionsOf(userId: string): Promise<void> {
    await this.model.destroy({ where: { userId } });
  }

  async onApplicationShutdown(): Promise<void> {
    this.store.stopExpiringSessions();
    await this.sequelize.close();
  }
}

import { AsyncLocalStorage } from 'node:async_hooks';
import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { Mutex } from 'async-mutex';
import { Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';

const WRITING_SQL = /^\s*(insert|update|delete|replace)\b/i;

/**
 * The one way to write: SQLite has one writer, so write transactions wait for each other here instead of failing.
 * Keep them short; no mail, no computing, no other queue inside.
 */
@Injectable()
export class WriteQueue {
  private readonly mutex = new Mutex();
  private readonly inside = new AsyncLocalStorage<true>();

  constructor(@InjectConnection() private readonly sequelize: Sequelize) {
    this.refuseWritesOutside();
  }

  /** Runs `work` alone in a transaction; what it throws rolls back. Pass the transaction to every call in it. */
  async transaction<T>(work: (transaction: Transaction) => Promise<T>): Promise<T> {
    if (this.inside.getStore()) throw new Error('A write transaction was asked for inside another one.');
    return this.mutex.runExclusive(() =>
      this.inside.run(true, () => this.sequelize.transaction({ type: Transaction.TYPES.IMMEDIATE }, work)),
    );
  }

  /** A forgotten `{ transaction }` would pass with one user and fail with two: make it fail at once. */
  private refuseWritesOutside(): void {
    const original = this.sequelize.query.bind(this.sequelize) as (...args: unknown[]) => Promise<unknown>;
    const guarded = (sql: string | { query: string }, options?: { transaction?: unknown }): Promise<unknown> => {
      const statement = typeof sql === 'string' ? sql : sql.query;
      if (WRITING_SQL.test(statement) && !options?.transaction) {
        return Promise.reject(new Error(`A write without the write queue's transaction: ${statement.slice(0, 80)}`));
      }
      return original(sql, options);
    };
    this.sequelize.query = guarded as Sequelize['query'];
  }
}

import sqlite3 from 'sqlite3';
import type { SequelizeOptions } from 'sequelize-typescript';

/** How long a connection waits for another one's write before SQLITE_BUSY. */
const BUSY_TIMEOUT_MS = 5000;

/** Sequelize opens connections by itself and offers no hook for it, so the timeout is set where they are made. */
class PatientDatabase extends sqlite3.Database {
  constructor(filename: string, mode: number, callback?: (error: Error | null) => void) {
    super(filename, mode, callback);
    this.configure('busyTimeout', BUSY_TIMEOUT_MS);
  }
}

/**
 * Options of every SQLite file here. Foreign keys are switched on by Sequelize on each connection it opens;
 * transactions take the write lock at once, so that none fails half way.
 */
export function sqliteOptions(storage: string): SequelizeOptions {
  return {
    dialect: 'sqlite',
    dialectModule: { ...sqlite3, Database: PatientDatabase },
    storage,
    transactionType: 'IMMEDIATE' as SequelizeOptions['transactionType'],
    logging: false,
    define: { underscored: true, timestamps: true },
  };
}

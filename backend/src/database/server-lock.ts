import { readFileSync, rmSync, writeFileSync } from 'node:fs';
import path from 'node:path';
import sqlite3 from 'sqlite3';
import { StartError } from './start-error';

export interface ServerLock {
  release(): Promise<void>;
}

function exec(database: sqlite3.Database, sql: string): Promise<void> {
  return new Promise((resolve, reject) => database.exec(sql, (error) => (error ? reject(error) : resolve())));
}

function close(database: sqlite3.Database): Promise<void> {
  return new Promise((resolve) => database.close(() => resolve()));
}

function open(file: string): Promise<sqlite3.Database> {
  return new Promise((resolve, reject) => {
    const database: sqlite3.Database = new sqlite3.Database(file, (error) =>
      error ? reject(error) : resolve(database),
    );
  });
}

function holder(pidFile: string): string {
  try {
    return ` (process ${readFileSync(pidFile, 'utf8').trim()})`;
  } catch {
    return '';
  }
}

/**
 * One server per data folder. The lock is SQLite's own lock on `server.lock`, held by the operating system for as long
 * as the process lives: it cannot go stale after a crash, nor mistake a reused process id (every container's is 1).
 * `server.pid` only tells a person who holds it.
 */
export async function acquireServerLock(dataDir: string): Promise<ServerLock> {
  const pidFile = path.join(dataDir, 'server.pid');
  const database = await open(path.join(dataDir, 'server.lock'));
  try {
    database.configure('busyTimeout', 0);
    await exec(database, 'BEGIN EXCLUSIVE');
  } catch {
    await close(database);
    throw new StartError(`The data folder ${dataDir} is in use by another Bandledger server${holder(pidFile)}.`);
  }
  writeFileSync(pidFile, `${process.pid}\n`);
  return {
    async release() {
      rmSync(pidFile, { force: true });
      await close(database);
    },
  };
}

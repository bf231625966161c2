import 'reflect-metadata';
import { existsSync, rmSync } from 'node:fs';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { bootApp } from '../../boot';
import { type AppConfig, ConfigError, readProcessEnvironment } from '../../config/environment';
import { databaseFile, prepareDataFolder, sessionsFile } from '../data-folder';
import { acquireServerLock } from '../server-lock';
import { sqliteOptions } from '../sqlite';
import { StartError } from '../start-error';

/** SQLite's own companions of a database file go with it. */
const COMPANIONS = ['', '-wal', '-shm', '-journal'];

interface Holdings {
  readonly isDemo: number;
  readonly realPeople: number;
}

/** Refuses a database that real people work in, or that cannot be told to be a demo. */
async function assertOnlyDemo(file: string): Promise<void> {
  const sequelize = new Sequelize(sqliteOptions(file));
  try {
    const [holdings] = await sequelize.query<Holdings>(
      `SELECT (SELECT COUNT(*) FROM settings WHERE key = 'data_kind' AND value = json_quote('demo')) AS isDemo,
              (SELECT COUNT(*) FROM users WHERE is_demo = 0) AS realPeople`,
      { type: QueryTypes.SELECT },
    );
    if (!holdings?.isDemo) throw new StartError('This data folder is no demo; it is left as it is.');
    if (holdings.realPeople > 0)
      throw new StartError('Real people have accounts in this database; it is left as it is.');
  } finally {
    await sequelize.close();
  }
}

/** Deletes the demo's database and builds it anew. Throws {@link StartError} when it must not. */
export async function resetDemo(config: AppConfig): Promise<void> {
  prepareDataFolder(config.dataDir);
  const file = databaseFile(config.dataDir);
  if (existsSync(file)) {
    const lock = await acquireServerLock(config.dataDir);
    try {
      await assertOnlyDemo(file);
      for (const path of [file, sessionsFile(config.dataDir)]) {
        for (const companion of COMPANIONS) rmSync(`${path}${companion}`, { force: true });
      }
    } finally {
      await lock.release();
    }
  }
  const booted = await bootApp({ ...config, demo: 'on' });
  await booted.close();
}

async function main(): Promise<void> {
  process.umask(0o077);
  const config = readProcessEnvironment();
  await resetDemo(config);
  console.log(`The demo in ${config.dataDir} is as on its first day.`);
}

function fail(error: unknown): never {
  const expected = error instanceof ConfigError || error instanceof StartError;
  process.stderr.write(`${expected ? error.message : error instanceof Error ? error.stack : String(error)}\n`);
  process.exit(1);
}

if (require.main === module) main().then(() => process.exit(0), fail);

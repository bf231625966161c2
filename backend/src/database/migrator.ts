import { readdirSync } from 'node:fs';
import path from 'node:path';
import { DatabaseError, type QueryInterface, type Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { SequelizeStorage, Umzug } from 'umzug';
import { sqliteOptions } from './sqlite';
import { StartError } from './start-error';

/** One direction of a migration. Every statement must be given the transaction. */
export type MigrationStep = (queryInterface: QueryInterface, transaction: Transaction) => Promise<void>;

interface MigrationFile {
  readonly up: MigrationStep;
  readonly down: MigrationStep;
}

const MIGRATIONS_DIR = path.join(__dirname, 'migrations');
/** 2026-12-01-0001-users.ts, or .js once compiled; the name without ending is what the database remembers. */
const FILE_NAME = /^(\d{4}-\d{2}-\d{2}-\d{4}-[a-z0-9-]+)\.(ts|js)$/;

function load(file: string): MigrationFile {
  // eslint-disable-next-line @typescript-eslint/no-require-imports -- found by folder, so that a new file is enough
  return require(path.join(MIGRATIONS_DIR, file)) as MigrationFile;
}

const storageOptions = (sequelize: Sequelize) => ({ sequelize, modelName: 'schema_migrations', timestamps: false });

/** The migrations in order; each step runs in a transaction of its own, so a failing one leaves nothing behind. */
export function createMigrator(sequelize: Sequelize): Umzug<QueryInterface> {
  const inTransaction = (step: MigrationStep) => () =>
    sequelize.transaction((transaction) => step(sequelize.getQueryInterface(), transaction));
  const migrations = readdirSync(MIGRATIONS_DIR)
    .sort()
    .flatMap((file) => {
      const name = file.endsWith('.d.ts') ? undefined : FILE_NAME.exec(file)?.[1];
      if (name === undefined) return [];
      const { up, down } = load(file);
      return [{ name, up: inTransaction(up), down: inTransaction(down) }];
    });
  return new Umzug({
    migrations,
    context: sequelize.getQueryInterface(),
    storage: new SequelizeStorage(storageOptions(sequelize)),
    logger: undefined,
  });
}

/** A file that a later version has migrated must not be written by this one. */
async function assertNotNewer(sequelize: Sequelize, migrator: Umzug<QueryInterface>): Promise<void> {
  const known = new Set((await migrator.migrations(sequelize.getQueryInterface())).map(({ name }) => name));
  const executed = await new SequelizeStorage(storageOptions(sequelize)).executed();
  const unknown = executed.find((name) => !known.has(name));
  if (unknown !== undefined) {
    throw new StartError(`The database was written by a newer version of Bandledger (${unknown}); update this one.`);
  }
}

/** Brings the file up to date with a connection of its own and leaves it in write-ahead mode. */
export async function migrateDatabase(file: string): Promise<void> {
  const sequelize = new Sequelize(sqliteOptions(file));
  try {
    await sequelize.query('PRAGMA journal_mode = WAL');
    const migrator = createMigrator(sequelize);
    await assertNotNewer(sequelize, migrator);
    await migrator.up();
  } catch (error) {
    if (error instanceof DatabaseError && error.message.includes('SQLITE_NOTADB')) {
      throw new StartError(`${file} is not a database; move it away, or restore it from a backup.`);
    }
    throw error;
  } finally {
    await sequelize.close();
  }
}

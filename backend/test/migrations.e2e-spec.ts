import { mkdtempSync, readdirSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import { createMigrator, migrateDatabase } from '../src/database/migrator';
import { sqliteOptions } from '../src/database/sqlite';

describe('migrations', () => {
  let folder: string;
  let file: string;
  let sequelize: Sequelize;

  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'bandledger-migrations-'));
    file = path.join(folder, 'test.sqlite');
    sequelize = new Sequelize(sqliteOptions(file));
  });
  afterEach(async () => {
    await sequelize.close();
    rmSync(folder, { recursive: true, force: true });
  });

  const objects = () =>
    sequelize.query<{ type: string; name: string }>(
      `SELECT type, name FROM sqlite_master
       WHERE name NOT LIKE 'sqlite_%' AND name <> 'schema_migrations' ORDER BY type, name`,
      { type: QueryTypes.SELECT },
    );
  const pragma = (name: string) => sequelize.query<object>(`PRAGMA ${name}`, { type: QueryTypes.SELECT });

  it('go up from nothing, down to nothing and up again to the same', async () => {
    const migrator = createMigrator(sequelize);
    const executed = await migrator.up();
    const files = readdirSync(path.join(__dirname, '../src/database/migrations')).filter((name) =>
      name.endsWith('.ts'),
    );
    expect(executed.map(({ name }) => `${name}.ts`)).toEqual(files.sort());
    const first = await objects();
    expect(first.map(({ name }) => name)).toEqual(expect.arrayContaining(['users', 'settings', 'audit_events']));
    await migrator.down({ to: 0 });
    expect(await objects()).toEqual([]);
    await migrator.up();
    expect(await objects()).toEqual(first);
    expect(await pragma('foreign_key_check')).toEqual([]);
    expect(await pragma('integrity_check')).toEqual([{ integrity_check: 'ok' }]);
  });

  it('go down one by one', async () => {
    const migrator = createMigrator(sequelize);
    const executed = await migrator.up();
    for (const { name } of [...executed].reverse()) {
      const [reverted] = await migrator.down();
      expect(reverted?.name).toBe(name);
    }
    expect(await objects()).toEqual([]);
  });

  it('have nothing to do the second time and leave the file in write-ahead mode', async () => {
    await migrateDatabase(file);
    await migrateDatabase(file);
    expect(await createMigrator(sequelize).pending()).toEqual([]);
    expect(await pragma('journal_mode')).toEqual([{ journal_mode: 'wal' }]);
  });

  it('refuse a database that a newer version has written', async () => {
    await migrateDatabase(file);
    await sequelize.query("INSERT INTO schema_migrations (name) VALUES ('2999-01-01-0001-later')");
    await expect(migrateDatabase(file)).rejects.toThrow(/newer version of Bandledger \(2999-01-01-0001-later\)/);
  });

  it('refuse a file that is no database', async () => {
    const other = path.join(folder, 'notes.sqlite');
    writeFileSync(other, 'These are notes and no database. '.repeat(100));
    await expect(migrateDatabase(other)).rejects.toThrow(/is not a database/);
  });
});

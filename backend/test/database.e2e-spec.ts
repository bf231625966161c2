import { randomUUID } from 'node:crypto';
import { getModelToken } from '@nestjs/sequelize';
import { AuditService } from '../src/audit/audit.service';
import { toAppError } from '../src/common/error.filter';
import { WriteQueue } from '../src/database/write-queue';
import { SettingsService } from '../src/settings/settings.service';
import { User } from '../src/users/models/user.model';
import { TestApp } from './create-test-app';

describe('the database', () => {
  let testApp: TestApp;
  let queue: WriteQueue;
  let users: typeof User;

  beforeAll(async () => {
    testApp = await TestApp.create();
    queue = testApp.app.get(WriteQueue);
    users = testApp.app.get<typeof User>(getModelToken(User), { strict: false });
  });
  afterAll(() => testApp.close());

  const person = (id = randomUUID()) => ({ id, name: 'N', email: `${id}@example.org`, roles: ['buyer'] as const });
  const count = async (where: string) => {
    const [row] = await testApp.rows<{ n: number }>(`SELECT count(*) AS n FROM users WHERE ${where}`);
    return row?.n;
  };

  describe('WriteQueue', () => {
    it('takes a hundred writes at once, none fails and none is lost', async () => {
      await queue.transaction(async (transaction) => {
        await users.create({ ...person(), name: 'counter', version: 1 }, { transaction });
      });
      const increment = () =>
        queue.transaction(async (transaction) => {
          const row = await users.findOne({ where: { name: 'counter' }, transaction, rejectOnEmpty: true });
          await row.update({ version: row.version + 1 }, { transaction });
        });
      const readers = Array.from({ length: 50 }, () => users.count());
      await Promise.all([...Array.from({ length: 100 }, increment), ...readers]);
      const row = await users.findOne({ where: { name: 'counter' } });
      expect(row?.version).toBe(101);
    });

    it('rolls back what throws and goes on with the next', async () => {
      const failing = queue.transaction(async (transaction) => {
        await users.create({ ...person(), name: 'rolled back' }, { transaction });
        throw new Error('on purpose');
      });
      const next = queue.transaction(async (transaction) => {
        await users.create({ ...person(), name: 'kept' }, { transaction });
      });
      await expect(failing).rejects.toThrow('on purpose');
      await next;
      expect(await count("name = 'rolled back'")).toBe(0);
      expect(await count("name = 'kept'")).toBe(1);
    });

    it('refuses a transaction inside a transaction instead of waiting for ever', async () => {
      const nested = queue.transaction(() => queue.transaction(() => Promise.resolve('never')));
      await expect(nested).rejects.toThrow('inside another one');
    });

    it('refuses a write that was not given the transaction', async () => {
      await expect(users.create({ ...person(), name: 'outside' })).rejects.toThrow('without the write queue');
      await expect(testApp.sequelize.query("UPDATE users SET name = 'x'")).rejects.toThrow('without the write queue');
      await expect(users.destroy({ where: { name: 'kept' } })).rejects.toThrow('without the write queue');
      expect(await count("name = 'outside'")).toBe(0);
    });

    it('lets readers see the last state while a write is under way', async () => {
      await queue.transaction(async (transaction) => {
        await users.create({ ...person(), name: 'not yet visible' }, { transaction });
        expect(await count("name = 'not yet visible'")).toBe(0);
      });
      expect(await count("name = 'not yet visible'")).toBe(1);
    });
  });

  it('has foreign keys and patience on every connection, those of transactions included', async () => {
    const pragmas = (options: object) =>
      Promise.all(
        ['foreign_keys', 'busy_timeout'].map((name) =>
          testApp.sequelize.query(`PRAGMA ${name}`, { ...options, plain: true }),
        ),
      );
    const expected = [expect.objectContaining({ foreign_keys: 1 }), expect.objectContaining({ timeout: 5000 })];
    expect(await pragmas({ type: 'SELECT' })).toEqual(expected);
    await queue.transaction(async (transaction) => {
      expect(await pragmas({ transaction, type: 'SELECT' })).toEqual(expected);
    });
  });

  it('refuses a reference to nothing', async () => {
    const dangling = queue.transaction((transaction) =>
      testApp.sequelize.query(
        `INSERT INTO one_time_links (id, user_id, token_hash, expires_at, created_at, updated_at)
         VALUES ('a', 'nobody', 'h', '2026-01-01', '2026-01-01', '2026-01-01')`,
        { transaction },
      ),
    );
    await expect(dangling).rejects.toThrow(/FOREIGN KEY/);
  });

  it('does not take a broken CHECK for something that exists already', async () => {
    const broken = queue.transaction((transaction) => users.create({ ...person(), name: '' }, { transaction }));
    const error: unknown = await broken.catch((reason: unknown) => reason);
    expect(toAppError(error)).toMatchObject({ status: 500, code: 'internal' });
    const row = person();
    const twice = queue.transaction(async (transaction) => {
      await users.create(row, { transaction });
      await users.create({ ...row, id: randomUUID() }, { transaction });
    });
    const duplicate: unknown = await twice.catch((reason: unknown) => reason);
    expect(toAppError(duplicate)).toMatchObject({ status: 409, details: { fieldErrors: [{ path: 'email' }] } });
  });

  describe('audit_events', () => {
    it('keeps before and after without anything that opens a door', async () => {
      const after = { name: 'x', passwordHash: 'p', nested: [{ token: 't', kept: 1 }] };
      await queue.transaction((transaction) =>
        testApp.app
          .get(AuditService)
          .record(transaction, { actorId: null, action: 'thing.made', entity: 'thing', entityId: '1', after }),
      );
      const [row] = await testApp.rows<{ after: unknown; before: unknown; actor_id: unknown }>(
        "SELECT json(after) AS after, before, actor_id FROM audit_events WHERE action = 'thing.made'",
      );
      expect(row?.after).toBe('{"name":"x","nested":[{"kept":1}]}');
      expect(row).toMatchObject({ before: null, actor_id: null });
    });

    const abort = (reason: string) => ({ parent: { message: expect.stringContaining(reason) } });

    it('can be neither changed nor deleted', async () => {
      const run = (sql: string) =>
        queue.transaction((transaction) => testApp.sequelize.query(sql, { transaction }).then(() => undefined));
      await expect(run("UPDATE audit_events SET action = 'x'")).rejects.toMatchObject(abort('never changed'));
      await expect(run('DELETE FROM audit_events')).rejects.toMatchObject(abort('never deleted'));
    });
  });

  it('keeps settings by key', async () => {
    const settings = testApp.app.get(SettingsService, { strict: false });
    expect(await settings.find('zone')).toBeNull();
    await queue.transaction((transaction) => settings.set('zone', { name: 'UTC' }, transaction));
    await queue.transaction((transaction) => settings.set('zone', { name: 'Europe/Vienna' }, transaction));
    expect(await settings.find('zone')).toEqual({ name: 'Europe/Vienna' });
  });
});

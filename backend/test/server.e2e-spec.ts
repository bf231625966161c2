import { existsSync, mkdtempSync, readFileSync, rmSync, statSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { bootApp } from '../src/boot';
import { readEnvironment } from '../src/config/environment';
import { StartError } from '../src/database/start-error';
import { TestApp } from './create-test-app';

describe('a data folder', () => {
  let folder: string;

  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'bandledger-server-'));
  });
  afterEach(() => rmSync(folder, { recursive: true, force: true }));

  const environment = (extra: Record<string, string> = {}) => ({ DATA_DIR: folder, SCRYPT_COST: '10', ...extra });

  /** Starts, looks, stops; the folder stays. */
  async function startOn<T>(extra: Record<string, string>, look: (testApp: TestApp) => T | Promise<T>): Promise<T> {
    const testApp = await TestApp.create(environment(extra));
    try {
      return await look(testApp);
    } finally {
      await testApp.close({ keepData: true });
    }
  }
  const isDemo = (testApp: TestApp) => testApp.booted.runtime.demo;
  const boot = (extra: Record<string, string>) => bootApp(readEnvironment(environment(extra)));

  describe('serves one server', () => {
    it('and refuses a second one in one line that names the folder and the holder', async () => {
      await startOn({}, async () => {
        await expect(boot({ DEMO: 'off' })).rejects.toThrow(StartError);
        await expect(boot({ DEMO: 'off' })).rejects.toThrow(`${folder} is in use by another Bandledger server`);
        await expect(boot({ DEMO: 'off' })).rejects.toThrow(`process ${process.pid}`);
      });
    });

    it('after a stop and after a crash that left its files behind', async () => {
      await startOn({}, () => undefined);
      writeFileSync(path.join(folder, 'server.pid'), `${process.pid}\n`);
      writeFileSync(path.join(folder, 'server.lock'), '');
      await startOn({}, (testApp) => testApp.anonymous().get('/api/health').expect(200));
      expect(existsSync(path.join(folder, 'server.pid'))).toBe(false);
    });
  });

  describe('is a demo or a team’s', () => {
    it('and becomes a demo when it is empty and only this machine can reach it', async () => {
      expect(await startOn({ DEMO: 'auto' }, isDemo)).toBe(true);
    });

    it.each([
      ['a set-up token is given', { SETUP_TOKEN: 'a-token-for-the-tests' }],
      ['it listens to the outside', { HOST: '0.0.0.0' }],
      ['its public address is outside', { PUBLIC_URL: 'https://budget.example.org' }],
      ['the demo is off', { DEMO: 'off' }],
    ])('and becomes a team’s when %s', async (_when, extra) => {
      expect(await startOn({ DEMO: 'auto', ...(extra as Record<string, string>) }, isDemo)).toBe(false);
    });

    it('and stays what it became', async () => {
      await startOn({ DEMO: 'off' }, () => undefined);
      expect(await startOn({ DEMO: 'auto' }, isDemo)).toBe(false);
      await expect(boot({ DEMO: 'on' })).rejects.toThrow('belongs to a real team');
    });

    it('and a demo is filled once, not at every start', async () => {
      const rows = (testApp: TestApp) =>
        testApp.rows('SELECT id FROM devices UNION ALL SELECT id FROM users ORDER BY id');
      const first = await startOn({ DEMO: 'auto' }, rows);
      expect(first.length).toBeGreaterThan(10);
      expect(await startOn({ DEMO: 'auto' }, rows)).toEqual(first);
    });

    it('and a demo is not opened as a team’s, nor to the outside, saying why', async () => {
      await startOn({ DEMO: 'auto' }, () => undefined);
      await expect(boot({ DEMO: 'off' })).rejects.toThrow('holds the demo');
      await expect(boot({ HOST: '0.0.0.0' })).rejects.toThrow(
        /Demo mode refuses HOST=0\.0\.0\.0: its sign-ins need no password/,
      );
      await expect(boot({ PUBLIC_URL: 'https://budget.example.org' })).rejects.toThrow('Demo mode refuses PUBLIC_URL');
      expect(await startOn({ DEMO: 'auto' }, isDemo)).toBe(true);
    });
  });

  it('keeps its secret to itself and uses it again', async () => {
    await startOn({}, () => undefined);
    const file = path.join(folder, 'session-secret');
    const secret = readFileSync(file, 'utf8');
    expect(secret.trim()).toMatch(/^[\w-]{43}$/);
    expect(statSync(file).mode & 0o777).toBe(0o600);
    await startOn({}, () => undefined);
    expect(readFileSync(file, 'utf8')).toBe(secret);
  });

  it('keeps sessions over a restart', async () => {
    const cookie = await startOn({}, async (testApp) => {
      const { user } = await testApp.signedIn('lead');
      const { body, headers } = await testApp
        .anonymous()
        .post('/api/session')
        .send({ email: user.email, password: user.password })
        .expect(200);
      expect(body.user.id).toBe(user.id);
      return (headers['set-cookie'] as unknown as string[])[0]?.split(';')[0] ?? '';
    });
    await startOn({}, (testApp) => testApp.anonymous().get('/api/users').set('Cookie', cookie).expect(200));
  });

  it('that cannot be made is one clear line', async () => {
    writeFileSync(path.join(folder, 'file'), '');
    const inside = path.join(folder, 'file', 'data');
    await expect(bootApp(readEnvironment({ DATA_DIR: inside }))).rejects.toThrow(`${inside} cannot be made`);
  });

  it('with a damaged secret is one clear line', async () => {
    writeFileSync(path.join(folder, 'session-secret'), 'short');
    await expect(boot({})).rejects.toThrow('is damaged');
  });
});

import { mkdtempSync, rmSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { validateSync } from 'class-validator';
import { toFieldErrors } from '../src/common/field-errors';
import { instanceOf } from '../src/common/fields/nested';
import { type AppConfig, readEnvironment } from '../src/config/environment';
import { demoDevices } from '../src/database/demo/device-bodies';
import { resetDemo } from '../src/database/demo/reset';
import { DEVICE_BODY } from '../src/devices/dto/device-body.dto';
import { TestApp } from './create-test-app';

interface DeskRow {
  readonly projectCode: string;
  readonly stage: string;
  readonly lead: string;
  readonly worstHeadroom: { readonly value: number };
}

const ENVIRONMENT = { DEMO: 'on', LOG_LEVEL: 'error', SCRYPT_COST: '10', PUBLIC_URL: 'http://127.0.0.1:4180' };

async function agentFor(testApp: TestApp, name: string) {
  const agent = testApp.anonymous();
  const { body: session } = await agent.get('/api/session').expect(200);
  const account = session.demoAccounts.find((one: { name: string }) => one.name === name);
  await agent.post('/api/session/demo').send({ userId: account.userId }).expect(200);
  return agent;
}

describe('the demo', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await TestApp.create(ENVIRONMENT);
  });
  afterAll(() => testApp.close());

  it('leads the designer from the desk to the one stage that is over', async () => {
    const agent = await agentFor(testApp, 'Ilse Varga');
    const { body: desk } = await agent.get('/api/desk').expect(200);
    const rows = desk.overChains as DeskRow[];
    expect(rows).toHaveLength(1);
    expect(rows[0]).toMatchObject({ projectCode: 'PW-5', stage: 'S2 Gain', lead: 'S2 spends more than it has.' });
    expect(rows[0]?.worstHeadroom.value).toBeCloseTo(0.974, 3);
  });

  it('has a project that its members alone see', async () => {
    const codes = async (name: string) => {
      const { body } = await (await agentFor(testApp, name)).get('/api/projects').expect(200);
      return (body as { code: string }[]).map(({ code }) => code);
    };
    expect(await codes('Ilse Varga')).toEqual(['PW-5']);
    expect(await codes('Mirel Sandqvist')).toEqual(['PW-5']);
    expect(await codes('Teo Marsh')).toEqual(['PW-5', 'PW-8']);
  });

  it('has options Baseline, A, B and C, and quotes that run from the day of seeding', async () => {
    const agent = await agentFor(testApp, 'Anouk Deles');
    const { body: projects } = await agent.get('/api/projects').expect(200);
    const { body: chains } = await agent.get(`/api/projects/${projects[0].id}/chains`).expect(200);
    expect(chains[0].options.map((option: { name: string }) => option.name)).toEqual(['Baseline', 'A', 'B', 'C']);
    const { body: devices } = await agent.get('/api/devices').query({ search: 'MRWG-G072' }).expect(200);
    expect(devices.items[0].quote.breaks).toEqual([
      { quantity: 1, unitPriceMicros: 1_350_000 },
      { quantity: 10, unitPriceMicros: 1_120_000 },
      { quantity: 100, unitPriceMicros: 920_000 },
      { quantity: 250, unitPriceMicros: 620_000 },
      { quantity: 1000, unitPriceMicros: 550_000 },
    ]);
    const days = (Date.parse(devices.items[0].quote.validUntil) - Date.now()) / 86_400_000;
    expect(days).toBeGreaterThan(118);
    expect(days).toBeLessThan(121);
  });

  it('holds only devices that the form would take', () => {
    for (const { part, body } of demoDevices()) {
      const instance = instanceOf(DEVICE_BODY, body) as object;
      const errors = validateSync(instance, { whitelist: true, forbidNonWhitelisted: true, forbidUnknownValues: true });
      expect({ part, errors: toFieldErrors(errors) }).toEqual({ part, errors: [] });
      expect(part).toMatch(/^(QUIL|MRWG|TLYR)-/);
    }
  });
});

describe('demo:reset', () => {
  let dataDir: string;
  let config: AppConfig;

  beforeEach(() => {
    dataDir = mkdtempSync(path.join(tmpdir(), 'bandledger-reset-'));
    config = readEnvironment({ ...ENVIRONMENT, DEMO: 'auto', DATA_DIR: dataDir });
  });
  afterEach(() => rmSync(dataDir, { recursive: true, force: true }));

  const reopened = (environment: Record<string, string> = {}) =>
    TestApp.create({ ...ENVIRONMENT, DEMO: 'auto', DATA_DIR: dataDir, ...environment });

  it('builds the demo anew, and a second start does not', async () => {
    await resetDemo(config);
    const changed = await reopened();
    const agent = await agentFor(changed, 'Ilse Varga');
    await agent.post('/api/projects').send({ code: 'X', name: 'X', open: true, currency: 'USD', buildQuantity: 1 });
    await changed.close({ keepData: true });
    const again = await reopened();
    expect(await again.rows('SELECT code FROM projects ORDER BY code')).toHaveLength(3);
    await again.close({ keepData: true });
    await resetDemo(config);
    const fresh = await reopened();
    expect(await fresh.rows('SELECT code FROM projects ORDER BY code')).toEqual([{ code: 'PW-5' }, { code: 'PW-8' }]);
    await fresh.close({ keepData: true });
  });

  it('leaves a database alone in which a real person has an account', async () => {
    const used = await reopened();
    await used.signedIn('designer');
    await used.close({ keepData: true });
    await expect(resetDemo(config)).rejects.toThrow('Real people');
    const kept = await reopened();
    expect(await kept.rows('SELECT id FROM users WHERE is_demo = 0')).toHaveLength(1);
    await kept.close({ keepData: true });
  });

  it('leaves a real team’s database alone', async () => {
    const team = await reopened({ DEMO: 'off' });
    await team.close({ keepData: true });
    await expect(resetDemo(config)).rejects.toThrow('is no demo');
  });

  it('does not take the data folder from a running server', async () => {
    const running = await reopened();
    await expect(resetDemo(config)).rejects.toThrow('in use by another Bandledger server');
    await running.close({ keepData: true });
  });
});

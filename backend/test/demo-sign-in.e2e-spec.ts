import { request as httpRequest } from 'node:http';
import type { AddressInfo } from 'node:net';
import { WriteQueue } from '../src/database/write-queue';
import { AccountsService } from '../src/users/accounts.service';
import { TestApp } from './create-test-app';

describe('the demo’s sign-in', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await TestApp.create({ DEMO: 'on' });
  });
  afterAll(() => testApp.close());

  it('offers one account per role, each opened without a password', async () => {
    const { body } = await testApp.anonymous().get('/api/session').expect(200);
    expect(body).toMatchObject({ user: null, demo: true, setupNeeded: false });
    const roles = new Set(body.demoAccounts.flatMap((account: { roles: string[] }) => account.roles));
    expect([...roles].sort()).toEqual(['admin', 'buyer', 'designer', 'lead']);
    for (const { userId, name, title } of body.demoAccounts) {
      expect(title).not.toBe('');
      const agent = testApp.anonymous();
      const response = await agent.post('/api/session/demo').send({ userId }).expect(200);
      expect(response.body.user).toMatchObject({ id: userId, name });
      await agent.get('/api/users').expect(200);
    }
  });

  it('tells the administrator who is invented', async () => {
    const { body: session } = await testApp.anonymous().get('/api/session').expect(200);
    const admin = session.demoAccounts.find(({ roles }: { roles: string[] }) => roles.includes('admin'));
    const agent = testApp.anonymous();
    await agent.post('/api/session/demo').send({ userId: admin.userId }).expect(200);
    const { body: people } = await agent.get('/api/users').expect(200);
    expect(people.find(({ id }: { id: string }) => id === admin.userId)).toMatchObject({
      demo: true,
      hasPassword: false,
    });
  });

  it('opens no account of a real person, and none without the header', async () => {
    const { user } = await testApp.signedIn('designer');
    await testApp.anonymous().post('/api/session/demo').send({ userId: user.id }).expect(404);
    await testApp.anonymous().post('/api/session/demo').send({ userId: 'x' }).expect(422);
    await testApp
      .anonymous()
      .post('/api/session/demo')
      .set('X-Requested-With', '')
      .send({ userId: user.id })
      .expect(403);
  });

  it('has no set-up', async () => {
    const body = { token: 'x', name: 'x', email: 'x@example.org', password: 'long enough' };
    await testApp.anonymous().post('/api/setup').send(body).expect(404);
  });

  it('answers under no name but the machine’s own', async () => {
    const { port } = testApp.server.address() as AddressInfo;
    const ask = (host: string) =>
      new Promise<unknown>((resolve, reject) => {
        httpRequest({ host: '127.0.0.1', port, path: '/api/session', headers: { Host: host } }, (response) => {
          let text = '';
          response.on('data', (chunk: Buffer) => (text += chunk.toString()));
          response.on('end', () =>
            resolve({ status: response.statusCode, code: (JSON.parse(text) as { code?: string }).code }),
          );
        })
          .on('error', reject)
          .end();
      });
    expect(await ask('rebound.example.org')).toEqual({ status: 403, code: 'demo_host_refused' });
    expect(await ask(`localhost:${port}`)).toEqual({ status: 200 });
    expect(await ask(`[::1]:${port}`)).toEqual({ status: 200 });
  });

  it('is not offered to a team', async () => {
    const team = await TestApp.create();
    try {
      const account = {
        id: '7d7ae0a4-6a0e-4b8a-9a53-0d0a9bb9f9ce',
        name: 'D',
        email: 'd@example.org',
        title: 'Designer',
      };
      await team.app.get(WriteQueue).transaction(async (transaction) => {
        const accounts = team.app.get(AccountsService, { strict: false });
        await accounts.createDemoAccount({ ...account, roles: ['designer'] }, transaction);
      });
      await team.anonymous().post('/api/session/demo').send({ userId: account.id }).expect(404);
      expect((await team.anonymous().get('/api/session')).body.demoAccounts).toEqual([]);
    } finally {
      await team.close();
    }
  });
});

import { Clock } from '../src/common/clock';
import { CSRF_HEADER_VALUE } from '../src/common/csrf.guard';
import { createUser } from './factories/users';
import { TestApp } from './create-test-app';

const sessionCookie = (response: { headers: Record<string, unknown> }): string => {
  const cookies = response.headers['set-cookie'] as string[] | undefined;
  return cookies?.find((cookie) => cookie.startsWith('bandledger.sid=')) ?? '';
};

describe('session', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await TestApp.create();
  });
  afterAll(() => testApp.close());

  describe('GET /api/session', () => {
    it('tells an unknown visitor only what the sign-in page needs, and sets no cookie', async () => {
      const response = await testApp.anonymous().get('/api/session').expect(200);
      expect(response.body).toMatchObject({ user: null, demo: false, demoAccounts: [] });
      expect(response.headers['set-cookie']).toBeUndefined();
      expect(response.headers['cache-control']).toBe('no-store');
    });

    it('tells who is signed in', async () => {
      const { agent, user } = await testApp.signedIn(['designer', 'lead']);
      const { body } = await agent.get('/api/session').expect(200);
      expect(body.user).toEqual({ id: user.id, name: user.name, email: user.email, roles: ['designer', 'lead'] });
      expect(body.setupNeeded).toBe(false);
    });
  });

  describe('POST /api/session', () => {
    it('signs in with any case of the mail address, by a cookie that scripts cannot read', async () => {
      const user = await createUser(testApp.app);
      const response = await testApp
        .anonymous()
        .post('/api/session')
        .send({ email: ` ${user.email.toUpperCase()} `, password: user.password })
        .expect(200);
      expect(response.body.user).toMatchObject({ id: user.id });
      expect(JSON.stringify(response.body)).not.toMatch(/hash|epoch/i);
      expect(sessionCookie(response)).toMatch(/HttpOnly/);
      expect(sessionCookie(response)).toMatch(/SameSite=Lax/);
      expect(sessionCookie(response)).not.toMatch(/Secure/);
    });

    it('puts the sign-in on record', async () => {
      const { user } = await testApp.signedIn('buyer');
      const rows = await testApp.rows('SELECT action, actor_id FROM audit_events WHERE entity_id = $id', {
        id: user.id,
      });
      expect(rows).toEqual([{ action: 'session.started', actor_id: user.id }]);
    });

    it('gives unknown, deactivated, wrong and password-less accounts the same answer', async () => {
      const active = await createUser(testApp.app);
      const inactive = await createUser(testApp.app, { active: false });
      const { agent } = await testApp.signedIn('admin');
      const invited = await agent
        .post('/api/users')
        .send({ name: 'Invited', email: 'invited@example.org', roles: ['buyer'] })
        .expect(201);
      const attempts = [
        { email: 'nobody@example.org', password: active.password },
        { email: active.email, password: 'wrong password' },
        { email: inactive.email, password: inactive.password },
        { email: invited.body.user.email as string, password: 'any password' },
      ];
      for (const attempt of attempts) {
        const { body } = await testApp.anonymous().post('/api/session').send(attempt).expect(401);
        expect(body).toEqual({
          code: 'invalid_credentials',
          message: 'Mail address or password is wrong.',
          requestId: expect.any(String),
        });
      }
    });

    it.each([
      [{}, ['email', 'password']],
      [{ email: 'a@example.org' }, ['password']],
      [{ email: 7, password: 'x' }, ['email']],
      [{ email: 'a@example.org', password: 'x'.repeat(201) }, ['password']],
      [{ email: 'a@example.org', password: 'x', remember: true }, ['remember']],
    ])('answers 422 by field for %j', async (body, paths) => {
      const response = await testApp.anonymous().post('/api/session').send(body).expect(422);
      expect(response.body.fieldErrors.map((error: { path: string }) => error.path)).toEqual(paths);
    });

    it('changes the session id at sign-in, so that a planted one is worth nothing', async () => {
      const first = await createUser(testApp.app);
      const second = await createUser(testApp.app);
      const agent = testApp.anonymous();
      const before = await agent.post('/api/session').send({ email: first.email, password: first.password });
      const after = await agent.post('/api/session').send({ email: second.email, password: second.password });
      const [planted] = sessionCookie(before).split(';');
      expect(sessionCookie(after).split(';')[0]).not.toBe(planted);
      const { body } = await testApp
        .anonymous()
        .get('/api/session')
        .set('Cookie', planted ?? '');
      expect(body.user).toBeNull();
    });
  });

  describe('DELETE /api/session', () => {
    it('ends the session on the server, not only in the browser', async () => {
      const user = await createUser(testApp.app);
      const agent = testApp.anonymous();
      const response = await agent.post('/api/session').send({ email: user.email, password: user.password });
      const [cookie] = sessionCookie(response).split(';');
      await agent.delete('/api/session').expect(204);
      await testApp
        .anonymous()
        .get('/api/users')
        .set('Cookie', cookie ?? '')
        .expect(401);
    });

    it('does not mind when nobody is signed in', async () => {
      await testApp.anonymous().delete('/api/session').expect(204);
    });
  });

  it('is renewed while it is used, at most every five minutes', async () => {
    const { agent } = await testApp.signedIn('buyer');
    const at = (minutes: number) => {
      const instant = new Date(Date.now() + minutes * 60_000);
      jest.spyOn(testApp.app.get(Clock), 'now').mockReturnValue(instant);
      return agent.get('/api/users').expect(200);
    };
    expect(sessionCookie(await at(4))).toBe('');
    expect(sessionCookie(await at(6))).toMatch(/Expires=/);
    expect(sessionCookie(await at(7))).toBe('');
    jest.restoreAllMocks();
  });

  it('is over when it has not been used for its hours, although the store still has it', async () => {
    const { agent, user } = await testApp.signedIn('buyer');
    const clock = jest.spyOn(testApp.app.get(Clock), 'now');
    clock.mockReturnValue(new Date(Date.now() + 13 * 3_600_000));
    await agent.get('/api/users').expect(401);
    jest.restoreAllMocks();
    await testApp.signIn(user);
  });

  it('starts for many at the same moment', async () => {
    const people = await Promise.all(Array.from({ length: 20 }, () => createUser(testApp.app)));
    const agents = await Promise.all(people.map((person) => testApp.signIn(person)));
    const answers = await Promise.all(agents.map((agent) => agent.get('/api/session')));
    expect(answers.map(({ body }) => body.user.id as string)).toEqual(people.map(({ id }) => id));
  });

  it('refuses a cookie that was not signed here', async () => {
    const response = await testApp
      .anonymous()
      .get('/api/users')
      .set('Cookie', 'bandledger.sid=s%3Aforged.AAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAAA')
      .expect(401);
    expect(response.body.code).toBe('not_signed_in');
  });

  it('sends Secure cookies exactly when the public address is https', async () => {
    const secure = await TestApp.create({ PUBLIC_URL: 'https://budget.example.org', TRUST_PROXY_HOPS: '1' });
    try {
      const user = await createUser(secure.app);
      const response = await secure
        .anonymous()
        .post('/api/session')
        .set({ 'X-Forwarded-Proto': 'https', 'X-Requested-With': CSRF_HEADER_VALUE })
        .send({ email: user.email, password: user.password })
        .expect(200);
      expect(sessionCookie(response)).toMatch(/Secure/);
      expect(response.headers['strict-transport-security']).toBeDefined();
    } finally {
      await secure.close();
    }
  });
});

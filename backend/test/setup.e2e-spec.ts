import { TestApp } from './create-test-app';

const TOKEN = 'a-token-for-the-tests';
const valid = { token: TOKEN, name: 'First', email: 'first@example.org', password: 'a long password' };

describe('POST /api/setup', () => {
  let testApp: TestApp;

  beforeEach(async () => {
    testApp = await TestApp.create({ SETUP_TOKEN: TOKEN });
  });
  afterEach(() => testApp.close());

  it('makes the first administrator once, signed in and on record', async () => {
    const agent = testApp.anonymous();
    expect((await agent.get('/api/session')).body.setupNeeded).toBe(true);
    const { body } = await agent.post('/api/setup').send(valid).expect(201);
    expect(body.user).toMatchObject({ name: 'First', roles: ['admin'] });
    expect((await agent.get('/api/session')).body).toMatchObject({ setupNeeded: false, user: { name: 'First' } });
    await testApp.signIn(valid);
    await testApp
      .anonymous()
      .post('/api/setup')
      .send({ ...valid, email: 'second@example.org' })
      .expect(404);
    expect(await testApp.rows('SELECT email FROM users')).toEqual([{ email: 'first@example.org' }]);
    const events = await testApp.rows<{ action: string }>('SELECT action FROM audit_events ORDER BY id');
    expect(events.map(({ action }) => action)).toEqual(['user.set_up', 'session.started', 'session.started']);
  });

  it('makes one administrator only, even when asked several times at once', async () => {
    const attempts = [1, 2, 3].map((n) =>
      testApp
        .anonymous()
        .post('/api/setup')
        .send({ ...valid, email: `admin${n}@example.org` }),
    );
    const statuses = (await Promise.all(attempts)).map(({ status }) => status).sort();
    expect(statuses).toEqual([201, 404, 404]);
    expect(await testApp.rows('SELECT id FROM users')).toHaveLength(1);
  });

  it('refuses another token, and stops guessing', async () => {
    const guess = { ...valid, token: 'another-token-altogether' };
    for (let attempt = 0; attempt < 10; attempt += 1) {
      const { body } = await testApp.anonymous().post('/api/setup').send(guess).expect(403);
      expect(body.code).toBe('wrong_setup_token');
    }
    const { body } = await testApp.anonymous().post('/api/setup').send(guess).expect(429);
    expect(body.code).toBe('too_many_attempts');
    expect(await testApp.rows('SELECT id FROM users')).toEqual([]);
  });

  it('names every wrong field', async () => {
    const { body } = await testApp
      .anonymous()
      .post('/api/setup')
      .send({ token: '', name: '', email: 'x', password: 'short' })
      .expect(422);
    const paths = body.fieldErrors.map((error: { path: string }) => error.path).sort();
    expect(paths).toEqual(['email', 'name', 'password', 'token']);
  });
});

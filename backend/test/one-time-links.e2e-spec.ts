import { Clock } from '../src/common/clock';
import { type SignedIn, TestApp } from './create-test-app';

const PASSWORD = 'a long new password';

describe('one-time links', () => {
  let testApp: TestApp;
  let admin: SignedIn;
  let counter = 0;

  beforeAll(async () => {
    testApp = await TestApp.create({ LINK_VALID_HOURS: '2' });
    admin = await testApp.signedIn('admin');
  });
  afterEach(() => jest.restoreAllMocks());
  afterAll(() => testApp.close());

  async function invite(): Promise<{ id: string; email: string; path: string }> {
    counter += 1;
    const email = `invited${counter}@example.org`;
    const { body } = await admin.agent
      .post('/api/users')
      .send({ name: 'Invited', email, roles: ['designer'] })
      .expect(201);
    const path = (body.link.path as string).replace('/welcome/', '/api/one-time-links/');
    return { id: body.user.id as string, email, path };
  }

  it('says whose it is', async () => {
    const { path, email } = await invite();
    const response = await testApp.anonymous().get(path).expect(200);
    expect(response.body).toEqual({ name: 'Invited', email });
    expect(response.headers['cache-control']).toBe('no-store');
    expect(response.headers['referrer-policy']).toBe('no-referrer');
  });

  it('sets the password, signs in, and works once', async () => {
    const { path, email, id } = await invite();
    const agent = testApp.anonymous();
    const { body } = await agent.post(path).send({ password: PASSWORD }).expect(200);
    expect(body.user).toMatchObject({ id, roles: ['designer'] });
    await agent.get('/api/users').expect(200);
    await testApp.signIn({ email, password: PASSWORD });
    await testApp.anonymous().get(path).expect(404);
    await testApp.anonymous().post(path).send({ password: 'another password' }).expect(404);
    await testApp.signIn({ email, password: PASSWORD });
  });

  it('works once even when used twice at the same moment', async () => {
    const { path } = await invite();
    const attempts = [1, 2, 3].map((n) =>
      testApp
        .anonymous()
        .post(path)
        .send({ password: `${PASSWORD} ${n}` }),
    );
    const statuses = (await Promise.all(attempts)).map(({ status }) => status).sort();
    expect(statuses).toEqual([200, 404, 404]);
  });

  it('is replaced by a newer one', async () => {
    const { path, id } = await invite();
    await admin.agent.post(`/api/users/${id}/password-link`).expect(201);
    await testApp.anonymous().get(path).expect(404);
  });

  it('runs out', async () => {
    const { path } = await invite();
    const twoHoursOn = new Date(Date.now() + 2 * 3_600_000 + 1000);
    jest.spyOn(testApp.app.get(Clock), 'now').mockReturnValue(twoHoursOn);
    await testApp.anonymous().get(path).expect(404);
    await testApp.anonymous().post(path).send({ password: PASSWORD }).expect(404);
  });

  it('is void once the person is deactivated', async () => {
    const { path, id } = await invite();
    await admin.agent.patch(`/api/users/${id}`).send({ version: 1, active: false }).expect(200);
    await testApp.anonymous().post(path).send({ password: PASSWORD }).expect(404);
  });

  it('ends every earlier session of the person', async () => {
    const { user, agent } = await testApp.signedIn('buyer');
    const { body } = await admin.agent.post(`/api/users/${user.id}/password-link`).expect(201);
    const path = (body.path as string).replace('/welcome/', '/api/one-time-links/');
    await testApp.anonymous().post(path).send({ password: PASSWORD }).expect(200);
    await agent.get('/api/users').expect(401);
    await testApp.anonymous().post('/api/session').send({ email: user.email, password: user.password }).expect(401);
  });

  it.each([
    ['short', 'too_short'],
    ['x'.repeat(201), 'too_long'],
    [12345678901, 'not_text'],
  ])('answers 422 to the password %j and stays good', async (password, code) => {
    const { path } = await invite();
    const { body } = await testApp.anonymous().post(path).send({ password }).expect(422);
    expect(body.fieldErrors).toEqual([{ path: 'password', code, message: expect.any(String) }]);
    await testApp.anonymous().get(path).expect(200);
  });

  it('answers 404 for a token that never was', () =>
    testApp.anonymous().get('/api/one-time-links/nothing').expect(404));
});

import { Clock } from '../src/common/clock';
import { createUser, type TestUser } from './factories/users';
import { TestApp } from './create-test-app';

const WINDOW_MS = 15 * 60_000;

describe('rate limits', () => {
  describe('requests', () => {
    let testApp: TestApp;

    beforeAll(async () => {
      testApp = await TestApp.create({ RATE_GENERAL_PER_MINUTE: '5' });
    });
    afterAll(() => testApp.close());

    it('count by person, so that one cannot use up the other’s share', async () => {
      const first = await testApp.signedIn('designer');
      const second = await testApp.signedIn('designer');
      const statuses: number[] = [];
      for (let n = 0; n < 6; n += 1) statuses.push((await first.agent.get('/api/users')).status);
      expect(statuses).toEqual([200, 200, 200, 200, 200, 429]);
      const refused = await first.agent.get('/api/session').expect(429);
      expect(refused.body.code).toBe('too_many_requests');
      expect(Number(refused.headers['retry-after'])).toBeGreaterThan(0);
      await second.agent.get('/api/users').expect(200);
    });
  });

  it('count calculations in a bucket of their own', async () => {
    const testApp = await TestApp.create({ RATE_CALCULATIONS_PER_MINUTE: '2' });
    try {
      const { agent } = await testApp.signedIn('designer');
      const calculate = async () => (await agent.post('/api/calculations').send({})).status;
      expect([await calculate(), await calculate(), await calculate()]).toEqual([422, 422, 429]);
      await agent.get('/api/users').expect(200);
    } finally {
      await testApp.close();
    }
  });

  describe('wrong passwords', () => {
    let testApp: TestApp;
    let user: TestUser;

    beforeEach(async () => {
      testApp = await TestApp.create({ TRUST_PROXY_HOPS: '1' });
      user = await createUser(testApp.app);
    });
    afterEach(async () => {
      jest.restoreAllMocks();
      await testApp.close();
    });

    const attempt = (email: string, password: string, address = '192.0.2.1') =>
      testApp.anonymous().post('/api/session').set('X-Forwarded-For', address).send({ email, password });

    async function fail(times: number, email = user.email, address?: string): Promise<number[]> {
      const statuses: number[] = [];
      for (let n = 0; n < times; n += 1) statuses.push((await attempt(email, `wrong ${n}`, address)).status);
      return statuses;
    }

    it('ends fifty guesses in 429 with a clear error, and even the right password waits', async () => {
      const statuses = await fail(50);
      expect(statuses.slice(0, 10).every((status) => status === 401)).toBe(true);
      expect(statuses.slice(10).every((status) => status === 429)).toBe(true);
      const { status, body, headers } = await attempt(user.email, user.password);
      expect(status).toBe(429);
      expect(body).toMatchObject({ code: 'too_many_attempts', retryAfterSeconds: expect.any(Number) });
      expect(body.message).toMatch(/Try again in \d+ minutes/);
      expect(Number(headers['retry-after'])).toBeLessThanOrEqual(WINDOW_MS / 1000);
    });

    it('treats an account that does not exist just the same', async () => {
      const statuses = await fail(12, 'nobody@example.org');
      expect(statuses).toEqual([...Array<number>(10).fill(401), 429, 429]);
    });

    it('lets in again when the window is over, however many attempts were refused in it', async () => {
      await fail(30);
      jest.spyOn(testApp.app.get(Clock), 'now').mockReturnValue(new Date(Date.now() + WINDOW_MS + 1000));
      await attempt(user.email, user.password).expect(200);
    });

    it('does not keep the owner out at an address where they have signed in before', async () => {
      await attempt(user.email, user.password, '198.51.100.7').expect(200);
      for (let host = 1; host <= 8; host += 1) await fail(8, user.email, `203.0.113.${host}`);
      await attempt(user.email, user.password, '203.0.113.99').expect(429);
      await attempt(user.email, user.password, '198.51.100.7').expect(200);
    });

    it('stops an address that tries one password on many accounts', async () => {
      const statuses: number[] = [];
      for (let n = 0; n < 52; n += 1) statuses.push((await attempt(`person${n}@example.com`, 'password1')).status);
      expect(statuses.filter((status) => status === 401)).toHaveLength(50);
      expect(statuses.slice(50)).toEqual([429, 429]);
      await attempt(user.email, user.password, '198.51.100.8').expect(200);
    });

    it('forgets the failures when an administrator’s link sets a new password', async () => {
      const { agent } = await testApp.signedIn('admin');
      await fail(11);
      const { body } = await agent.post(`/api/users/${user.id}/password-link`).expect(201);
      const path = (body.path as string).replace('/welcome/', '/api/one-time-links/');
      await testApp.anonymous().post(path).send({ password: 'a long new password' }).expect(200);
      await attempt(user.email, 'a long new password').expect(200);
    });
  });
});

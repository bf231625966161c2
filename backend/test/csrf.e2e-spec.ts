import request from 'supertest';
import { type SignedIn, TestApp } from './create-test-app';

const PUBLIC_URL = 'http://127.0.0.1:4180';
const body = { name: 'Somebody', email: 'somebody@example.org', roles: ['buyer'] };

describe('requests that another site could have made', () => {
  let testApp: TestApp;
  let admin: SignedIn;

  beforeAll(async () => {
    testApp = await TestApp.create({ PUBLIC_URL });
    admin = await testApp.signedIn('admin');
  });
  afterAll(() => testApp.close());

  const storedNothing = async () => {
    expect(await testApp.rows('SELECT id FROM users WHERE email = $email', { email: body.email })).toEqual([]);
  };

  it.each(['post', 'delete'] as const)('refuses %s /api/session without the header', async (method) => {
    const response = await request(testApp.server)[method]('/api/session').send({}).expect(403);
    expect(response.body.code).toBe('csrf_header_missing');
  });

  it.each([
    ['no header', { 'X-Requested-With': '' }, 'csrf_header_missing'],
    ['another header', { 'X-Requested-With': 'XMLHttpRequest' }, 'csrf_header_missing'],
    ['another origin', { Origin: 'https://elsewhere.example' }, 'foreign_origin'],
    ['another port', { Origin: 'http://127.0.0.1:4181' }, 'foreign_origin'],
    ['an opaque origin', { Origin: 'null' }, 'foreign_origin'],
    ['a cross-site fetch', { 'Sec-Fetch-Site': 'cross-site', Origin: PUBLIC_URL }, 'foreign_origin'],
    ['a same-site fetch', { 'Sec-Fetch-Site': 'same-site' }, 'foreign_origin'],
    ['a fetch by the address bar', { 'Sec-Fetch-Site': 'none' }, 'foreign_origin'],
  ])('refuses a write with %s although the session is good', async (_what, headers, code) => {
    const response = await admin.agent.post('/api/users').set(headers).send(body).expect(403);
    expect(response.body.code).toBe(code);
    await storedNothing();
  });

  it.each([
    ['the own origin', { Origin: PUBLIC_URL }],
    ['a same-origin fetch, under whatever name', { 'Sec-Fetch-Site': 'same-origin', Origin: 'http://localhost:5173' }],
    ['neither, as scripts send it', {}],
  ])('accepts a write with %s', async (_what, headers) => {
    // Past the guard, the empty body is what is wrong.
    await admin.agent.post('/api/users').set(headers).send({}).expect(422);
  });

  it('lets reading requests through and grants no cross-origin access', async () => {
    const response = await request(testApp.server)
      .get('/api/session')
      .set('Origin', 'https://elsewhere.example')
      .expect(200);
    expect(response.headers['access-control-allow-origin']).toBeUndefined();
    const preflight = await request(testApp.server).options('/api/session').set('Origin', 'https://elsewhere.example');
    expect(preflight.headers['access-control-allow-origin']).toBeUndefined();
  });
});

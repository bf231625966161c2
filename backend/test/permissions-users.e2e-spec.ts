import type { Role } from '../src/common/role';
import type { SessionUser } from '../src/common/session-user';
import { canListUsers, canManageUsers, canSeeEmail } from '../src/users/user.policy';
import { type Agent, TestApp } from './create-test-app';
import { readPermissions } from './permissions-table';

const ID = '3f3c7a4e-58a9-4e0e-8f5e-6c1c5b1d2a10';

/** Asks for what would change nothing: an allowed request fails later, for another reason than permission. */
const REQUESTS: Readonly<Record<string, (agent: Agent) => PromiseLike<{ status: number }>>> = {
  'session.read': (agent) => agent.get('/api/session'),
  'session.start': (agent) => agent.post('/api/session').send({}),
  'session.end': (agent) => agent.delete('/api/session'),
  'link.read': (agent) => agent.get('/api/one-time-links/none'),
  'link.use': (agent) => agent.post('/api/one-time-links/none').send({ password: 'long enough to be one' }),
  'health.read': (agent) => agent.get('/api/health'),
  'user.list': (agent) => agent.get('/api/users'),
  'user.invite': (agent) => agent.post('/api/users').send({}),
  'user.update': (agent) => agent.patch(`/api/users/${ID}`).send({ version: 1 }),
  'user.make_password_link': (agent) => agent.post(`/api/users/${ID}/password-link`),
};

const POLICIES: Readonly<Record<string, (actor: SessionUser) => boolean>> = {
  'user.list': canListUsers,
  'user.see_email': canSeeEmail,
  'user.invite': canManageUsers,
  'user.update': canManageUsers,
  'user.make_password_link': canManageUsers,
};

const cells = [...readPermissions('session'), ...readPermissions('users')];

describe('docs/permissions.md, session and users', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await TestApp.create();
  });
  afterAll(() => testApp.close());

  it('names every action there is, and no other', () => {
    const documented = new Set(cells.map(({ action }) => action));
    expect([...documented].sort()).toEqual([...new Set([...Object.keys(REQUESTS), ...Object.keys(POLICIES)])].sort());
  });

  it.each(cells.filter(({ action }) => action in REQUESTS))(
    'the route for $action answers $column: $allowed',
    async ({ action, column, allowed }) => {
      const agent = column === 'nobody' ? testApp.anonymous() : (await testApp.signedIn(column as Role)).agent;
      const response = await REQUESTS[action]?.(agent);
      if (allowed) expect([401, 403]).not.toContain(response?.status);
      else expect(response?.status).toBe(column === 'nobody' ? 401 : 403);
    },
  );

  it.each(cells.filter(({ action, column }) => action in POLICIES && column !== 'nobody'))(
    'the policy for $action says to a $column: $allowed',
    ({ action, column, allowed }) => {
      const actor: SessionUser = { id: ID, name: 'A', email: 'a@example.org', roles: [column as Role] };
      expect(POLICIES[action]?.(actor)).toBe(allowed);
    },
  );
});

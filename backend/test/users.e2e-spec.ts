import { randomUUID } from 'node:crypto';
import { ROLES } from '../src/common/role';
import { createUser } from './factories/users';
import { type SignedIn, TestApp } from './create-test-app';

interface AuditRow {
  action: string;
  before: string | null;
  after: string | null;
  request_id: string;
}

describe('users', () => {
  let testApp: TestApp;
  let admin: SignedIn;
  let designer: SignedIn;

  beforeAll(async () => {
    testApp = await TestApp.create();
    admin = await testApp.signedIn('admin');
    designer = await testApp.signedIn('designer');
  });
  afterAll(() => testApp.close());

  const audit = (id: string) =>
    testApp.rows<AuditRow>('SELECT * FROM audit_events WHERE entity_id = $id ORDER BY id', { id });

  describe('GET /api/users', () => {
    it('needs a session', () => testApp.anonymous().get('/api/users').expect(401));

    it('shows administrators mail addresses and whether a password was chosen', async () => {
      const { body } = await admin.agent.get('/api/users').expect(200);
      const row = body.find((user: { id: string }) => user.id === designer.user.id);
      expect(row).toEqual({
        id: designer.user.id,
        name: designer.user.name,
        email: designer.user.email,
        roles: ['designer'],
        active: true,
        hasPassword: true,
        version: 1,
        can: { edit: true },
      });
    });

    it.each(['designer', 'buyer', 'lead'] as const)('shows a %s names and roles only', async (role) => {
      const { agent } = await testApp.signedIn(role);
      const { body } = await agent.get('/api/users').expect(200);
      const row = body.find((user: { id: string }) => user.id === admin.user.id);
      expect(row).toEqual({
        id: admin.user.id,
        name: admin.user.name,
        roles: ['admin'],
        active: true,
        version: 1,
        can: { edit: false },
      });
    });
  });

  describe('POST /api/users', () => {
    const valid = { name: 'Ada Okonjo', email: 'Ada.Okonjo@Example.org', roles: ['designer', 'lead'] };

    it('needs a session', () => testApp.anonymous().post('/api/users').send(valid).expect(401));

    it.each(['designer', 'buyer', 'lead'] as const)('is not for a %s', async (role) => {
      const { agent } = await testApp.signedIn(role);
      const { body } = await agent.post('/api/users').send(valid).expect(403);
      expect(body.code).toBe('forbidden');
    });

    it('makes the person without a password, and a link that is stored only as a hash', async () => {
      const { body } = await admin.agent.post('/api/users').send(valid).expect(201);
      expect(body.user).toMatchObject({ name: 'Ada Okonjo', email: 'ada.okonjo@example.org', hasPassword: false });
      expect(body.link.path).toMatch(/^\/welcome\/[\w-]{43}$/);
      expect(new Date(body.link.expiresAt as string).getTime()).toBeGreaterThan(Date.now());
      const token = (body.link.path as string).replace('/welcome/', '');
      const [link] = await testApp.rows<{ token_hash: string }>(
        'SELECT token_hash FROM one_time_links WHERE user_id = $id',
        { id: body.user.id },
      );
      expect(link?.token_hash).toMatch(/^[0-9a-f]{64}$/);
      expect(link?.token_hash).not.toContain(token);
      const [event] = await audit(body.user.id as string);
      expect(event).toMatchObject({ action: 'user.invited', before: null });
      expect(event?.request_id).toMatch(/^[0-9a-f-]{36}$/);
    });

    it('refuses a mail address that is taken, whatever its case', async () => {
      const response = await admin.agent
        .post('/api/users')
        .send({ ...valid, email: designer.user.email.toUpperCase() })
        .expect(409);
      expect(response.body).toMatchObject({ code: 'already_exists', fieldErrors: [{ path: 'email' }] });
    });

    it.each([
      ['name', { ...valid, name: '' }, 'required'],
      ['name', { ...valid, name: '   ' }, 'required'],
      ['name', { ...valid, name: 'x'.repeat(10_000) }, 'too_long'],
      ['name', { ...valid, name: 'bell\u0007' }, 'control_character'],
      ['name', { email: valid.email, roles: valid.roles }, 'required'],
      ['email', { ...valid, email: 'no address' }, 'not_an_email'],
      ['email', { ...valid, email: null }, 'required'],
      ['roles', { ...valid, roles: [] }, 'too_few'],
      ['roles', { ...valid, roles: ['owner'] }, 'not_allowed'],
      ['roles', { ...valid, roles: ['lead', 'lead'] }, 'repeated'],
      ['roles', { ...valid, roles: 'admin' }, 'not_a_list'],
      ['isDemo', { ...valid, isDemo: true }, 'unknown_field'],
    ])('answers 422 at %s for %j', async (path, body, code) => {
      const before = await testApp.rows('SELECT id FROM users');
      const response = await admin.agent.post('/api/users').send(body).expect(422);
      expect(response.body.fieldErrors).toEqual([{ path, code, message: expect.any(String) }]);
      expect(await testApp.rows('SELECT id FROM users')).toHaveLength(before.length);
    });

    it.each(['עברית ومرحبا', '😀 Ω‘er', '<script>alert(1)</script>', '=HYPERLINK("x")', 'José'])(
      'keeps the name %j as it is',
      async (name) => {
        const email = `${randomUUID()}@example.org`;
        const { body } = await admin.agent
          .post('/api/users')
          .send({ ...valid, name, email })
          .expect(201);
        expect(body.user.name).toBe(name.normalize('NFC'));
      },
    );
  });

  describe('PATCH /api/users/:id', () => {
    it('needs a session and the role', async () => {
      const path = `/api/users/${designer.user.id}`;
      await testApp.anonymous().patch(path).send({ version: 1 }).expect(401);
      await designer.agent
        .patch(path)
        .send({ version: 1, roles: ['admin'] })
        .expect(403);
    });

    it('answers 404 for a person that does not exist and for what is no id', async () => {
      await admin.agent.patch(`/api/users/${randomUUID()}`).send({ version: 1 }).expect(404);
      await admin.agent.patch('/api/users/1 OR 1=1').send({ version: 1 }).expect(404);
    });

    it('changes the name and leaves the session alive', async () => {
      const { agent, user } = await testApp.signedIn('designer');
      const { body } = await admin.agent.patch(`/api/users/${user.id}`).send({ version: 1, name: 'New name' });
      expect(body).toMatchObject({ name: 'New name', version: 2, roles: ['designer'], active: true });
      await agent.get('/api/users').expect(200);
      const events = await audit(user.id);
      expect(events.at(-1)).toMatchObject({ action: 'user.updated' });
      expect(events.at(-1)?.before).not.toMatch(/hash/);
    });

    it('ends the sessions of a person whose roles change', async () => {
      const { agent, user } = await testApp.signedIn('designer');
      await admin.agent
        .patch(`/api/users/${user.id}`)
        .send({ version: 1, roles: ['buyer'] })
        .expect(200);
      await agent.get('/api/users').expect(401);
      const again = await testApp.signIn(user);
      expect((await again.get('/api/session')).body.user.roles).toEqual(['buyer']);
    });

    it('ends the sessions of a person who is deactivated, and lets them in no more', async () => {
      const { agent, user } = await testApp.signedIn('lead');
      await admin.agent.patch(`/api/users/${user.id}`).send({ version: 1, active: false }).expect(200);
      await agent.get('/api/users').expect(401);
      expect((await agent.get('/api/session').expect(200)).body.user).toBeNull();
      await testApp.anonymous().post('/api/session').send({ email: user.email, password: user.password }).expect(401);
    });

    it('answers 409 with the current row to a stale version and stores nothing', async () => {
      const user = await createUser(testApp.app);
      await admin.agent.patch(`/api/users/${user.id}`).send({ version: 1, name: 'First' }).expect(200);
      const { body } = await admin.agent
        .patch(`/api/users/${user.id}`)
        .send({ version: 1, name: 'Second' })
        .expect(409);
      expect(body).toMatchObject({ code: 'stale_version', current: { name: 'First', version: 2 } });
      const rows = await testApp.rows('SELECT name, version FROM users WHERE id = $id', { id: user.id });
      expect(rows).toEqual([{ name: 'First', version: 2 }]);
    });

    it.each([
      ['version', {}, 'required'],
      ['version', { version: '1' }, 'not_a_number'],
      ['active', { version: 1, active: 'no' }, 'not_a_boolean'],
      ['name', { version: 1, name: null }, 'not_text'],
      ['roles', { version: 1, roles: null }, 'required'],
      ['email', { version: 1, email: 'other@example.org' }, 'unknown_field'],
    ])('answers 422 at %s for %j', async (path, body, code) => {
      const response = await admin.agent.patch(`/api/users/${designer.user.id}`).send(body).expect(422);
      expect(response.body.fieldErrors[0]).toMatchObject({ path, code });
    });

    it.each([
      ['deactivate', { active: false }],
      ['take the role from', { roles: ['lead'] }],
    ])('does not let anybody %s the last administrator who can sign in', async (_what, change) => {
      // Invited but without a password: no help to anybody.
      await admin.agent
        .post('/api/users')
        .send({ name: 'Second admin', email: `${randomUUID()}@example.org`, roles: ['admin'] })
        .expect(201);
      const response = await admin.agent.patch(`/api/users/${admin.user.id}`).send({ version: 1, ...change });
      expect(response.status).toBe(409);
      expect(response.body.code).toBe('last_admin');
      const [row] = await testApp.rows<{ active: number; roles: unknown }>(
        'SELECT active, roles, version FROM users WHERE id = $id',
        { id: admin.user.id },
      );
      expect(row).toMatchObject({ active: 1, version: 1 });
    });
  });

  describe('POST /api/users/:id/password-link', () => {
    it('needs a session and the role, and answers 404 for nobody', async () => {
      const path = `/api/users/${designer.user.id}/password-link`;
      await testApp.anonymous().post(path).expect(401);
      await designer.agent.post(path).expect(403);
      await admin.agent.post(`/api/users/${randomUUID()}/password-link`).expect(404);
    });

    it('makes a link and puts it on record without its token', async () => {
      const user = await createUser(testApp.app);
      const { body } = await admin.agent.post(`/api/users/${user.id}/password-link`).expect(201);
      expect(Object.keys(body as object).sort()).toEqual(['expiresAt', 'path']);
      const [event] = await audit(user.id);
      expect(event).toMatchObject({ action: 'user.password_link_made', before: null, after: null });
    });

    it('is refused for a deactivated person', async () => {
      const user = await createUser(testApp.app, { active: false });
      const { body } = await admin.agent.post(`/api/users/${user.id}/password-link`).expect(409);
      expect(body.code).toBe('user_inactive');
    });
  });

  it('offers exactly the four roles', () => {
    expect([...ROLES].sort()).toEqual(['admin', 'buyer', 'designer', 'lead']);
  });
});

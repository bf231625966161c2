import { TestApp } from './create-test-app';
import type { SignedIn } from './create-test-app';
import { createChain, createProject, projectBody } from './factories/chains';

describe('projects', () => {
  let testApp: TestApp;
  let designer: SignedIn;
  let buyer: SignedIn;
  let lead: SignedIn;
  let admin: SignedIn;

  beforeAll(async () => {
    testApp = await TestApp.create();
    designer = await testApp.signedIn('designer');
    buyer = await testApp.signedIn('buyer');
    lead = await testApp.signedIn('lead');
    admin = await testApp.signedIn('admin');
  });
  afterAll(() => testApp.close());

  describe('POST /projects', () => {
    it('stores the project with the default policy and makes its maker a member', async () => {
      const body = projectBody({ code: 'ST-1', description: 'Two\nlines', memberIds: [buyer.user.id] });
      const { body: project } = await designer.agent.post('/api/projects').send(body).expect(201);
      expect(project).toMatchObject({
        code: 'ST-1',
        description: 'Two\nlines',
        open: true,
        currency: 'USD',
        buildQuantity: 250,
        chainCount: 0,
        version: 1,
        policy: { gbwCase: 'minimum', gbwDerating: 0.7, headroomTarget: 3 },
        can: { edit: true, setPolicy: false, createChain: true, delete: true },
      });
      const members = await testApp.rows<{ user_id: string }>(
        'SELECT user_id FROM project_members WHERE project_id = $id ORDER BY user_id',
        { id: project.id },
      );
      expect(members.map((row) => row.user_id)).toEqual([designer.user.id, buyer.user.id].sort());
      const events = await testApp.rows('SELECT action, actor_id FROM audit_events WHERE entity_id = $id', {
        id: project.id,
      });
      expect(events).toEqual([{ action: 'project.created', actor_id: designer.user.id }]);
    });

    it('answers 401 to nobody and 403 to buyers and administrators', async () => {
      await testApp.anonymous().post('/api/projects').send(projectBody()).expect(401);
      await buyer.agent.post('/api/projects').send(projectBody()).expect(403);
      await admin.agent.post('/api/projects').send(projectBody()).expect(403);
    });

    it.each([
      ['a missing name', { name: undefined }, 'name', 'required'],
      ['a name of blanks', { name: '   ' }, 'name', 'required'],
      ['a name of 10,000 characters', { name: 'x'.repeat(10_000) }, 'name', 'too_long'],
      ['a control character', { name: 'a\u0007b' }, 'name', 'control_character'],
      ['a right-to-left override', { name: 'a\u202Etxt.exe' }, 'name', 'control_character_bidi'],
      ['a number for a name', { name: 5 }, 'name', 'not_text'],
      ['a currency of two letters', { currency: 'US' }, 'currency', 'not_a_currency'],
      ['a build of no board', { buildQuantity: 0 }, 'buildQuantity', 'out_of_range'],
      ['a build of 1.5 boards', { buildQuantity: 1.5 }, 'buildQuantity', 'not_an_integer'],
      ['a build quantity as text', { buildQuantity: '250' }, 'buildQuantity', 'not_a_number'],
      ['open as text', { open: 'yes' }, 'open', 'not_a_boolean'],
      ['a field nobody knows', { colour: 'red' }, 'colour', 'unknown_field'],
      ['a member who is no id', { memberIds: ['me'] }, 'memberIds', 'not_an_id'],
      [
        'a member who does not exist',
        { memberIds: ['6f1f2cfe-8b6e-4b79-9f0e-0f7d3a1c2b4d'] },
        'memberIds',
        'user_unknown',
      ],
    ])('refuses %s', async (_case, override, path, code) => {
      const before = await testApp.rows('SELECT COUNT(*) AS n FROM projects');
      const response = await designer.agent.post('/api/projects').send(projectBody(override)).expect(422);
      expect(response.body.code).toBe('invalid');
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path, code })]);
      expect(await testApp.rows('SELECT COUNT(*) AS n FROM projects')).toEqual(before);
    });

    it.each([
      'مستقبل الموجات',
      'Empfänger 📡👩🏽‍🔬',
      '<script>alert(1)</script>',
      '=SUM(A1:A9)',
      "Robert'); DROP TABLE projects;--",
    ])('keeps the name %s as it was typed', async (name) => {
      const project = await createProject(designer.agent, { name });
      const { body } = await designer.agent.get(`/api/projects/${project.id}`).expect(200);
      expect(body.name).toBe(name);
    });
  });

  describe('a closed project', () => {
    it('does not exist for those who are not its members, administrators included', async () => {
      const { id, version } = await createProject(designer.agent, { code: 'SECRET-7', open: false });
      for (const { agent } of [buyer, lead, admin]) {
        await agent.get(`/api/projects/${id}`).expect(404);
        await agent.patch(`/api/projects/${id}`).send({ version, name: 'Mine' }).expect(404);
        await agent.delete(`/api/projects/${id}`).expect(404);
        await agent.get(`/api/projects/${id}/chains`).expect(404);
        const { body } = await agent.get('/api/projects').expect(200);
        expect(JSON.stringify(body)).not.toContain('SECRET-7');
      }
      await designer.agent.get(`/api/projects/${id}`).expect(200);
    });

    it('keeps at least one member', async () => {
      const { id, version } = await createProject(designer.agent, { open: false });
      const response = await designer.agent.patch(`/api/projects/${id}`).send({ version, memberIds: [] }).expect(422);
      expect(response.body.fieldErrors[0]).toMatchObject({ path: 'memberIds', code: 'too_few' });
      expect(await testApp.rows('SELECT user_id FROM project_members WHERE project_id = $id', { id })).toHaveLength(1);
    });
  });

  describe('GET /projects', () => {
    it('lists what one may see with counts and rights', async () => {
      const project = await createProject(designer.agent, { code: 'LIST-1', memberIds: [lead.user.id] });
      await createChain(designer.agent, project.id);
      const { body } = await buyer.agent.get('/api/projects').expect(200);
      expect(body.find((row: { id: string }) => row.id === project.id)).toMatchObject({
        code: 'LIST-1',
        memberCount: 2,
        chainCount: 1,
        can: { edit: false, setPolicy: false, createChain: false, delete: false },
      });
      await testApp.anonymous().get('/api/projects').expect(401);
    });
  });

  describe('PATCH /projects/:id', () => {
    it('changes what is named and leaves the rest', async () => {
      const { id, version } = await createProject(designer.agent, { description: 'kept' });
      const { body } = await designer.agent
        .patch(`/api/projects/${id}`)
        .send({ version, buildQuantity: 1000 })
        .expect(200);
      expect(body).toMatchObject({ buildQuantity: 1000, description: 'kept', version: 2 });
    });

    it('answers a stale version with the row as it is now and stores nothing', async () => {
      const { id, version } = await createProject(designer.agent);
      await designer.agent.patch(`/api/projects/${id}`).send({ version, name: 'First' }).expect(200);
      const response = await lead.agent.patch(`/api/projects/${id}`).send({ version, name: 'Second' }).expect(409);
      expect(response.body).toMatchObject({ code: 'stale_version', current: { name: 'First', version: 2 } });
      expect(await testApp.rows('SELECT name, version FROM projects WHERE id = $id', { id })).toEqual([
        { name: 'First', version: 2 },
      ]);
    });

    it('lets only a lead set the policy', async () => {
      const { id, version } = await createProject(designer.agent);
      const policy = { headroomTarget: 5, temperatureFactor: 0.8 };
      await designer.agent.patch(`/api/projects/${id}`).send({ version, policy }).expect(403);
      await buyer.agent.patch(`/api/projects/${id}`).send({ version, policy }).expect(403);
      const { body } = await lead.agent.patch(`/api/projects/${id}`).send({ version, policy }).expect(200);
      expect(body.policy).toMatchObject({ headroomTarget: 5, temperatureFactor: 0.8, gbwDerating: 0.7 });
    });

    it.each([
      [{ policy: { headroomTarget: 0.5 } }, 'policy.headroomTarget', 'out_of_range'],
      [{ policy: { gbwCase: 'best' } }, 'policy.gbwCase', 'not_a_choice'],
      [{ policy: { mood: 1 } }, 'policy.mood', 'unknown_field'],
      [{ name: null }, 'name', 'required'],
      [{ version: undefined }, 'version', 'required'],
    ])('refuses %j', async (change, path, code) => {
      const { id, version } = await createProject(lead.agent);
      const response = await lead.agent
        .patch(`/api/projects/${id}`)
        .send({ version, ...change })
        .expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path, code })]);
    });
  });

  describe('DELETE /projects/:id', () => {
    it('removes an empty project, refuses one with chains', async () => {
      const empty = await createProject(designer.agent);
      await designer.agent.delete(`/api/projects/${empty.id}`).expect(204);
      await designer.agent.get(`/api/projects/${empty.id}`).expect(404);
      const full = await createProject(designer.agent);
      await createChain(designer.agent, full.id);
      const response = await designer.agent.delete(`/api/projects/${full.id}`).expect(409);
      expect(response.body.code).toBe('in_use');
      await buyer.agent.delete(`/api/projects/${full.id}`).expect(403);
      await testApp.anonymous().delete(`/api/projects/${full.id}`).expect(401);
    });
  });

  it('answers 404 to what is no identifier at all', async () => {
    await designer.agent.get('/api/projects/PW-5').expect(404);
  });
});

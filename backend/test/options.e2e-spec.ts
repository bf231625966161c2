import { randomUUID } from 'node:crypto';
import { TestApp } from './create-test-app';
import type { SignedIn } from './create-test-app';
import { createChain, createProject, invertingStage, rcStage } from './factories/chains';
import type { Row } from './factories/chains';
import { createDevice, currentFeedbackBody } from './factories/devices';

describe('options', () => {
  let testApp: TestApp;
  let designer: SignedIn;
  let buyer: SignedIn;
  let lead: SignedIn;
  let deviceId: string;
  let chain: Row & { readonly options: readonly Row[] };
  let optionId: string;

  beforeAll(async () => {
    testApp = await TestApp.create();
    designer = await testApp.signedIn('designer');
    buyer = await testApp.signedIn('buyer');
    lead = await testApp.signedIn('lead');
    deviceId = (await createDevice(designer.agent)).id;
  });
  afterAll(() => testApp.close());

  beforeEach(async () => {
    const project = await createProject(designer.agent);
    chain = await createChain(designer.agent, project.id);
    optionId = chain.options[0]!.id;
  });

  const save = (stages: readonly unknown[], version = 1) =>
    designer.agent.put(`/api/options/${optionId}`).send({ version, name: 'Baseline', stages });
  const storedStages = () =>
    testApp.rows<{ id: string; position: number }>(
      'SELECT id, position FROM stages WHERE option_id = $optionId ORDER BY position',
      { optionId },
    );

  describe('PUT /options/:id', () => {
    it('saves the stages whole, in order, and gives them back as they were sent', async () => {
      const stages = [
        rcStage({ seriesF: 1e-9, shuntOhm: null }),
        invertingStage(deviceId, { couplingF: 10e-9, gainOhm: 99.5, strayF: 0.5e-12, isolationOhm: 10 }),
        invertingStage(deviceId, { topology: 'non-inverting', wantedGain: null, biasOhm: 1000, couplingF: 1e-9 }),
      ];
      const { body } = await save(stages).expect(200);
      expect(body).toMatchObject({ version: 2, name: 'Baseline', can: { edit: true, delete: false } });
      expect(body.stages).toEqual(stages);
      expect(body.devices.map((device: Row) => device.id)).toEqual([deviceId]);
      const { body: read } = await buyer.agent.get(`/api/options/${optionId}`).expect(200);
      expect(read.stages).toEqual(stages);
      expect(read.can).toEqual({ edit: false, delete: false });
      const [row] = await testApp.rows<{ parameters: string }>(
        'SELECT parameters FROM stages WHERE option_id = $optionId AND position = 1',
        { optionId },
      );
      expect(JSON.parse(row?.parameters ?? '')).toMatchObject({ schemaVersion: 1, gainOhm: 99.5 });
    });

    it('replaces what was there, also in another order', async () => {
      const [first, second] = [rcStage(), rcStage()];
      await save([first, second]).expect(200);
      await save([second, first], 2).expect(200);
      expect((await storedStages()).map((stage) => stage.id)).toEqual([second!.id, first!.id]);
      await save([], 3).expect(200);
      expect(await storedStages()).toEqual([]);
    });

    it('answers a stale version with the option as it is now and stores nothing', async () => {
      const stage = rcStage();
      await save([stage]).expect(200);
      const response = await save([]).expect(409);
      expect(response.body).toMatchObject({ code: 'stale_version', current: { version: 2, stages: [stage] } });
      expect(await storedStages()).toHaveLength(1);
    });

    it('lets one of two simultaneous saves win', async () => {
      const answers = await Promise.all([save([rcStage()]), save([rcStage(), rcStage()])]);
      expect(answers.map((answer) => answer.status).sort()).toEqual([200, 409]);
    });

    it('takes 24 stages and refuses 25', async () => {
      const stages = Array.from({ length: 25 }, () => rcStage());
      const response = await save(stages).expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path: 'stages', code: 'too_many_stages' })]);
      expect(await storedStages()).toEqual([]);
      await save(stages.slice(1)).expect(200);
      expect(await storedStages()).toHaveLength(24);
    });

    it.each([
      ['no Rf', { feedbackOhm: undefined }, 'feedbackOhm', 'required'],
      ['a negative Rf', { feedbackOhm: -1 }, 'feedbackOhm', 'out_of_range'],
      ['Rf as text', { feedbackOhm: '1k' }, 'feedbackOhm', 'not_a_number'],
      ['an unknown device', { deviceId: randomUUID() }, 'deviceId', 'device_unknown'],
      ['no device', { deviceId: undefined }, 'deviceId', 'required'],
      ['an unknown topology', { topology: 'sideways' }, 'topology', 'not_a_choice'],
      ['an unknown kind', { kind: 'magic' }, 'kind', 'not_a_choice'],
      ['an unknown part', { inductorH: 1 }, 'inductorH', 'unknown_field'],
      ['an id that is none', { id: '1' }, 'id', 'not_an_id'],
      ['a name of 10,000 characters', { name: 'n'.repeat(10_000) }, 'name', 'too_long'],
      [
        'a coupled + input without a DC return',
        { topology: 'non-inverting', couplingF: 1e-9 },
        'biasOhm',
        'input_without_dc_return',
      ],
    ])('refuses a stage with %s and stores nothing', async (_case, override, field, code) => {
      const response = await save([rcStage(), invertingStage(deviceId, override)]).expect(422);
      expect(response.body.fieldErrors).toEqual([
        expect.objectContaining({ code, path: expect.stringMatching(new RegExp(`^stages\\.1(\\.${field})?$`)) }),
      ]);
      expect(await storedStages()).toEqual([]);
    });

    it('refuses an inverting node that is fed from 0 Ω', async () => {
      // The stage in front is an ideal amplifier's output, so nothing but Rg is in series.
      const stages = [invertingStage(deviceId), invertingStage(deviceId, { gainOhm: 0 })];
      const response = await save(stages).expect(422);
      expect(response.body.fieldErrors[0]).toMatchObject({
        code: 'inverting_fed_from_zero_ohm',
        path: expect.stringMatching(/^stages\.1/),
      });
    });

    it('refuses a device of the wrong kind', async () => {
      const { body: device } = await designer.agent.post('/api/devices').send(currentFeedbackBody()).expect(201);
      const response = await save([invertingStage(device.id)]).expect(422);
      expect(response.body.fieldErrors[0]).toMatchObject({
        path: 'stages.0.deviceId',
        code: 'device_kind_mismatch',
      });
    });

    it('refuses the same id twice, and what is no stage at all', async () => {
      const stage = rcStage();
      const response = await save([stage, stage]).expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path: 'stages.1.id', code: 'repeated' })]);
      for (const nonsense of [null, 5, 'stage', []]) await save([nonsense]).expect(422);
    });

    it('keeps names with markup, formulas, emoji and right-to-left letters as they are', async () => {
      const names = ['<b>S1</b>', '=1+1', 'مكبر', '🎛️ gain'];
      const { body } = await save(names.map((name) => rcStage({ name }))).expect(200);
      expect(body.stages.map((stage: { name: string }) => stage.name)).toEqual(names);
    });

    it('is for designers and leads who see the project', async () => {
      const body = { version: 1, name: 'Baseline', stages: [] };
      await testApp.anonymous().put(`/api/options/${optionId}`).send(body).expect(401);
      await buyer.agent.put(`/api/options/${optionId}`).send(body).expect(403);
      await designer.agent.put(`/api/options/${randomUUID()}`).send(body).expect(404);
      const hidden = await createProject(lead.agent, { open: false });
      const hiddenChain = await createChain(lead.agent, hidden.id);
      const hiddenOption = `/api/options/${hiddenChain.options[0]!.id}`;
      await designer.agent.get(hiddenOption).expect(404);
      await designer.agent.put(hiddenOption).send(body).expect(404);
      await designer.agent.delete(hiddenOption).query({ version: 1 }).expect(404);
      await designer.agent.post(`/api/chains/${hiddenChain.id}/options`).send({ name: 'A' }).expect(404);
    });
  });

  describe('POST /chains/:id/options', () => {
    it('adds an empty option, or a copy of another with stages of its own', async () => {
      const stage = invertingStage(deviceId);
      await save([stage]).expect(200);
      const path = `/api/chains/${chain.id}/options`;
      const { body: empty } = await designer.agent.post(path).send({ name: 'A' }).expect(201);
      expect(empty).toMatchObject({ name: 'A', position: 1, version: 1, stages: [] });
      const { body: copy } = await lead.agent.post(path).send({ name: 'B', fromOptionId: optionId }).expect(201);
      expect(copy).toMatchObject({ name: 'B', position: 2, stages: [{ ...stage, id: expect.any(String) }] });
      expect(copy.stages[0].id).not.toBe(stage.id);
      const { body: whole } = await buyer.agent.get(`/api/chains/${chain.id}`).expect(200);
      expect(whole.options.map((option: { name: string }) => option.name)).toEqual(['Baseline', 'A', 'B']);
    });

    it('refuses an option of another chain, nobody and buyers', async () => {
      const other = await createChain(designer.agent, (await createProject(designer.agent)).id);
      const path = `/api/chains/${chain.id}/options`;
      const body = { name: 'A', fromOptionId: other.options[0]!.id };
      const response = await designer.agent.post(path).send(body).expect(422);
      expect(response.body.fieldErrors).toEqual([
        expect.objectContaining({ path: 'fromOptionId', code: 'option_unknown' }),
      ]);
      await testApp.anonymous().post(path).send({ name: 'A' }).expect(401);
      await buyer.agent.post(path).send({ name: 'A' }).expect(403);
    });
  });

  describe('DELETE /options/:id', () => {
    it('removes an option but never the last one', async () => {
      const path = `/api/options/${optionId}`;
      const refused = await designer.agent.delete(path).query({ version: 1 }).expect(409);
      expect(refused.body.code).toBe('last_option');
      await designer.agent.post(`/api/chains/${chain.id}/options`).send({ name: 'A' }).expect(201);
      await testApp.anonymous().delete(path).query({ version: 1 }).expect(401);
      await buyer.agent.delete(path).query({ version: 1 }).expect(403);
      await designer.agent.delete(path).query({ version: 4 }).expect(409);
      await designer.agent.delete(path).query({ version: 1 }).expect(204);
      await designer.agent.get(path).expect(404);
    });
  });

  describe('GET /desk', () => {
    it('names the chains that are over, worst first, of visible projects only', async () => {
      const project = await createProject(designer.agent, { code: 'DESK-1' });
      const slow = await createDevice(designer.agent, { gainBandwidthHz: { min: 10e6, typ: 20e6 } });
      const overChain = await createChain(designer.agent, project.id, { name: 'Over' });
      const body = { version: 1, name: 'Baseline', stages: [invertingStage(slow.id)] };
      await designer.agent.put(`/api/options/${overChain.options[0]!.id}`).send(body).expect(200);
      const hidden = await createProject(lead.agent, { code: 'DESK-9', open: false });
      const hiddenChain = await createChain(lead.agent, hidden.id);
      await lead.agent.put(`/api/options/${hiddenChain.options[0]!.id}`).send(body).expect(200);
      const { body: desk } = await buyer.agent.get('/api/desk').expect(200);
      const codes = desk.overChains.map((row: { projectCode: string }) => row.projectCode);
      expect(codes).toContain('DESK-1');
      expect(JSON.stringify(desk)).not.toContain('DESK-9');
      expect(desk.overChains.find((row: { chainId: string }) => row.chainId === overChain.id)).toMatchObject({
        chainName: 'Over',
        optionName: 'Baseline',
        stage: 'S1 Gain',
        lead: expect.stringContaining('S1'),
      });
      const headrooms = desk.overChains.map(
        (row: { worstHeadroom: { value: number | null } }) => row.worstHeadroom.value,
      );
      expect(headrooms).toEqual([...headrooms].sort((a, b) => (a ?? Infinity) - (b ?? Infinity)));
      const { body: leads } = await lead.agent.get('/api/desk').expect(200);
      expect(leads.counts.projects).toBe(desk.counts.projects + 2);
      await testApp.anonymous().get('/api/desk').expect(401);
    });
  });
});

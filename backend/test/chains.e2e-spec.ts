import { randomUUID } from 'node:crypto';
import { TestApp } from './create-test-app';
import type { SignedIn } from './create-test-app';
import { createChain, createProject, invertingStage, rcStage, specification } from './factories/chains';
import { createDevice, voltageFeedbackBody } from './factories/devices';

describe('chains', () => {
  let testApp: TestApp;
  let designer: SignedIn;
  let buyer: SignedIn;
  let lead: SignedIn;
  let admin: SignedIn;
  let projectId: string;

  beforeAll(async () => {
    testApp = await TestApp.create();
    designer = await testApp.signedIn('designer');
    buyer = await testApp.signedIn('buyer');
    lead = await testApp.signedIn('lead');
    admin = await testApp.signedIn('admin');
  });
  afterAll(() => testApp.close());

  beforeEach(async () => {
    projectId = (await createProject(designer.agent)).id;
  });

  const closedProject = () => createProject(lead.agent, { code: 'HIDDEN-1', open: false });

  describe('POST /projects/:projectId/chains', () => {
    it('stores the specification with an empty option, the Baseline', async () => {
      const body = { name: 'Receive chain', specification: specification() };
      const { body: chain } = await designer.agent.post(`/api/projects/${projectId}/chains`).send(body).expect(201);
      expect(chain).toMatchObject({
        name: 'Receive chain',
        projectId,
        projectCode: 'TB-1',
        projectName: 'Test bench',
        version: 1,
        specification: specification(),
        policy: { gbwCase: 'minimum' },
        currency: 'USD',
        buildQuantity: 250,
        options: [{ name: 'Baseline', position: 0, version: 1, summary: { costLimit: null } }],
        can: { edit: true },
      });
      const [row] = await testApp.rows<{ specification: string }>('SELECT specification FROM chains WHERE id = $id', {
        id: chain.id,
      });
      expect(JSON.parse(row?.specification ?? '')).toEqual(specification());
    });

    it('answers 401 to nobody, 403 to buyers and administrators, 404 where the project is hidden', async () => {
      const body = { name: 'Mine', specification: specification() };
      const path = `/api/projects/${projectId}/chains`;
      await testApp.anonymous().post(path).send(body).expect(401);
      await buyer.agent.post(path).send(body).expect(403);
      await admin.agent.post(path).send(body).expect(403);
      const { id } = await closedProject();
      await designer.agent.post(`/api/projects/${id}/chains`).send(body).expect(404);
    });

    it.each([
      ['a reversed band', { band: { lowHz: 7e6, operatingHz: 5e6, highHz: 3e6 } }, 'band_reversed'],
      [
        'an operating frequency outside the band',
        { band: { lowHz: 3e6, operatingHz: 9e6, highHz: 7e6 } },
        'band_reversed',
      ],
    ])('refuses %s', async (_case, override, code) => {
      const body = { name: 'Wrong', specification: specification(override) };
      const response = await designer.agent.post(`/api/projects/${projectId}/chains`).send(body).expect(422);
      expect(response.body.fieldErrors[0]).toMatchObject({ code, path: expect.stringMatching(/^specification\.band/) });
      expect(await testApp.rows('SELECT id FROM chains WHERE project_id = $projectId', { projectId })).toEqual([]);
    });

    it.each([
      ['an unknown source', { source: { kind: 'mains' } }, 'specification.source.kind', 'not_a_choice'],
      ['no source', { source: undefined }, 'specification.source', 'required'],
      [
        'a source of 0 Ω',
        { source: { kind: 'voltage', resistanceOhm: 0, levelKind: 'peak-emf' } },
        'specification.source.resistanceOhm',
        'out_of_range',
      ],
      ['a load without a value', { load: {} }, 'specification.load.resistanceOhm', 'required'],
      [
        'a positive negative rail',
        { supply: { positiveV: 5, negativeV: 5 } },
        'specification.supply.negativeV',
        'out_of_range',
      ],
      [
        'a tolerance of 0 dB',
        { requirements: { gainDb: { target: 60, tolerance: 0 } } },
        'specification.requirements.gainDb.tolerance',
        'out_of_range',
      ],
      [
        'an unknown requirement',
        { requirements: { loudness: 3 } },
        'specification.requirements.loudness',
        'unknown_field',
      ],
    ])('refuses %s', async (_case, override, path, code) => {
      const body = { name: 'Wrong', specification: specification(override) };
      const response = await designer.agent.post(`/api/projects/${projectId}/chains`).send(body).expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path, code })]);
    });

    it('takes an open load', async () => {
      const chain = await createChain(designer.agent, projectId, {
        specification: specification({ load: { resistanceOhm: null } }),
      });
      const { body } = await designer.agent.get(`/api/chains/${chain.id}`).expect(200);
      expect(body.specification.load).toEqual({ resistanceOhm: null });
    });
  });

  describe('GET /projects/:projectId/chains and /chains/:id', () => {
    it('lists chains with the figures of their options', async () => {
      const device = await createDevice(designer.agent);
      const quote = { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 620_000 }] };
      await buyer.agent.put(`/api/devices/${device.id}/quote`).send(quote).expect(200);
      const chain = await createChain(designer.agent, projectId);
      const option = chain.options[0]!;
      const save = { version: 1, name: 'Baseline', stages: [invertingStage(device.id)] };
      await designer.agent.put(`/api/options/${option.id}`).send(save).expect(200);
      const { body } = await buyer.agent.get(`/api/projects/${projectId}/chains`).expect(200);
      expect(body).toHaveLength(1);
      // 75 MHz for a noise gain of 1 + 1000/(50 + 100) = 7.667 at 7 MHz: × 1.398, by hand.
      expect(body[0]).toMatchObject({
        name: 'Receive chain',
        specificationText: '20 ±1 dB at 5 MHz · 3–7 MHz · ±5 V',
        summary: {
          worstHeadroomStage: 'S1 Gain',
          worstHeadroom: { value: expect.closeTo(1.398, 2), unit: 'ratio' },
          cost: { amountMicros: 620_000, currency: 'USD' },
          costLimit: null,
        },
        options: [{ id: option.id, name: 'Baseline' }],
        can: { edit: false },
      });
      const { body: one } = await buyer.agent.get(`/api/chains/${chain.id}`).expect(200);
      expect(one.options[0].summary).toEqual(body[0].summary);
    });

    it('keep the figures fresh when a quote, a device, the specification or the policy changes', async () => {
      const device = await createDevice(designer.agent);
      const chain = await createChain(designer.agent, projectId);
      const save = { version: 1, name: 'Baseline', stages: [invertingStage(device.id)] };
      await designer.agent.put(`/api/options/${chain.options[0]!.id}`).send(save).expect(200);
      const summary = async () => (await designer.agent.get(`/api/chains/${chain.id}`)).body.options[0].summary;
      expect((await summary()).cost.amountMicros).toBeNull();
      const quote = { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 1_000_000 }] };
      await buyer.agent.put(`/api/devices/${device.id}/quote`).send(quote).expect(200);
      expect((await summary()).cost.amountMicros).toBe(1_000_000);
      await buyer.agent.delete(`/api/devices/${device.id}/quote`).expect(204);
      expect((await summary()).cost).toMatchObject({ amountMicros: null, reason: expect.any(String) });
      const before = (await summary()).worstHeadroom.value;
      const values = voltageFeedbackBody({ partNumber: device.partNumber });
      const faster = { ...values, version: 1, gainBandwidthHz: { min: 150e6, typ: 200e6 } };
      await designer.agent.put(`/api/devices/${device.id}`).send(faster).expect(200);
      expect((await summary()).worstHeadroom.value).toBeCloseTo(2 * before, 6);
      const costLimit = { version: 1, specification: specification({ requirements: { costMicros: 5_000_000 } }) };
      await designer.agent.patch(`/api/chains/${chain.id}`).send(costLimit).expect(200);
      expect((await summary()).costLimit).toEqual({ amountMicros: 5_000_000, currency: 'USD' });
      await lead.agent.patch(`/api/projects/${projectId}`).send({ version: 1, policy: { gbwCase: 'typical' } });
      expect((await summary()).worstHeadroom.value).toBeCloseTo((200 / 150) * 2 * before, 6);
    });

    it('say what is missing instead of failing when a stage does not fit the specification any more', async () => {
      const chain = await createChain(designer.agent, projectId);
      const device = await createDevice(designer.agent);
      const save = { version: 1, name: 'Baseline', stages: [invertingStage(device.id)] };
      await designer.agent.put(`/api/options/${chain.options[0]!.id}`).send(save).expect(200);
      const { body } = await designer.agent.get(`/api/chains/${chain.id}`).expect(200);
      expect(body.options[0].summary).not.toHaveProperty('reason');
    });

    it('are hidden with their project', async () => {
      const { id } = await closedProject();
      const chain = await createChain(lead.agent, id);
      await designer.agent.get(`/api/chains/${chain.id}`).expect(404);
      await admin.agent.get(`/api/chains/${chain.id}`).expect(404);
      await designer.agent.get(`/api/projects/${id}/chains`).expect(404);
      await testApp.anonymous().get(`/api/chains/${chain.id}`).expect(401);
      await testApp.anonymous().get(`/api/projects/${id}/chains`).expect(401);
    });
  });

  describe('PATCH and DELETE /chains/:id', () => {
    it('rename, with 409 for a stale version and nothing stored', async () => {
      const chain = await createChain(designer.agent, projectId);
      const path = `/api/chains/${chain.id}`;
      const { body } = await lead.agent.patch(path).send({ version: 1, name: 'Renamed' }).expect(200);
      expect(body).toMatchObject({ name: 'Renamed', version: 2 });
      const stale = await designer.agent.patch(path).send({ version: 1, name: 'Late' }).expect(409);
      expect(stale.body).toMatchObject({ code: 'stale_version', current: { name: 'Renamed', version: 2 } });
      expect(await testApp.rows('SELECT name FROM chains WHERE id = $id', { id: chain.id })).toEqual([
        { name: 'Renamed' },
      ]);
      await buyer.agent.patch(path).send({ version: 2, name: 'Bought' }).expect(403);
      await testApp.anonymous().patch(path).send({ version: 2, name: 'Nobody' }).expect(401);
      const reversed = specification({ band: { lowHz: 7e6, operatingHz: 5e6, highHz: 3e6 } });
      await designer.agent.patch(path).send({ version: 2, specification: reversed }).expect(422);
    });

    it('remove the chain with its options and stages', async () => {
      const chain = await createChain(designer.agent, projectId);
      const option = chain.options[0]!;
      await designer.agent
        .put(`/api/options/${option.id}`)
        .send({ version: 1, name: 'Baseline', stages: [rcStage()] })
        .expect(200);
      await buyer.agent.delete(`/api/chains/${chain.id}`).query({ version: 1 }).expect(403);
      await designer.agent.delete(`/api/chains/${chain.id}`).query({ version: 3 }).expect(409);
      await designer.agent.delete(`/api/chains/${chain.id}`).query({ version: 1 }).expect(204);
      await designer.agent.get(`/api/options/${option.id}`).expect(404);
      expect(await testApp.rows('SELECT id FROM stages WHERE option_id = $id', { id: option.id })).toEqual([]);
    });

    it('of a hidden or absent chain are 404', async () => {
      const { id } = await closedProject();
      const chain = await createChain(lead.agent, id);
      for (const chainId of [chain.id, randomUUID()]) {
        await designer.agent.patch(`/api/chains/${chainId}`).send({ version: 1, name: 'x' }).expect(404);
        await designer.agent.delete(`/api/chains/${chainId}`).query({ version: 1 }).expect(404);
      }
    });
  });
});

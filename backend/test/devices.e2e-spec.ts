import { randomUUID } from 'node:crypto';
import { TestApp } from './create-test-app';
import type { SignedIn } from './create-test-app';
import { createChain, createProject, invertingStage } from './factories/chains';
import { createDevice, currentFeedbackBody, voltageFeedbackBody } from './factories/devices';

describe('devices', () => {
  let testApp: TestApp;
  let designer: SignedIn;
  let colleague: SignedIn;
  let buyer: SignedIn;
  let lead: SignedIn;
  let admin: SignedIn;

  beforeAll(async () => {
    testApp = await TestApp.create();
    designer = await testApp.signedIn('designer');
    colleague = await testApp.signedIn('designer');
    buyer = await testApp.signedIn('buyer');
    lead = await testApp.signedIn('lead');
    admin = await testApp.signedIn('admin');
  });
  afterAll(() => testApp.close());

  const countDevices = () => testApp.rows<{ n: number }>('SELECT COUNT(*) AS n FROM devices');

  describe('POST /devices', () => {
    it('stores a voltage-feedback amplifier with its conditions and pages', async () => {
      const body = voltageFeedbackBody({
        datasheet: { revision: 'C, 2025-03', title: 'Precision amplifier' },
        lifecycleDate: '2026-01-31',
        notes: 'Samples in drawer 4.',
      });
      const { body: device } = await designer.agent.post('/api/devices').send(body).expect(201);
      expect(device).toEqual({
        ...body,
        id: expect.any(String),
        version: 1,
        quoteVersion: 0,
        verified: false,
        enteredBy: { id: designer.user.id, name: designer.user.name },
        verifiedBy: null,
        updatedAt: expect.any(String),
        can: { edit: true, delete: true, verify: false, editQuote: true },
      });
      const [row] = await testApp.rows<{ guaranteed_gbw_hz: number; parameters: string }>(
        'SELECT guaranteed_gbw_hz, parameters FROM devices WHERE id = $id',
        { id: device.id },
      );
      expect(row?.guaranteed_gbw_hz).toBe(75e6);
      expect(JSON.parse(row?.parameters ?? '')).toMatchObject({ gainBandwidthHz: body.gainBandwidthHz });
    });

    it('stores a current-feedback amplifier and a matched block', async () => {
      const amplifier = currentFeedbackBody();
      await designer.agent.post('/api/devices').send(amplifier).expect(201);
      const block = {
        kind: 'matched-block',
        partNumber: 'TSTB-1',
        grade: 'rf',
        channels: 1,
        impedanceOhm: 50,
        gainDb: { typ: -3 },
      };
      const { body } = await designer.agent.post('/api/devices').send(block).expect(201);
      expect(body).toMatchObject(block);
    });

    it('is for designers and leads', async () => {
      await testApp.anonymous().post('/api/devices').send(voltageFeedbackBody()).expect(401);
      await buyer.agent.post('/api/devices').send(voltageFeedbackBody()).expect(403);
      await admin.agent.post('/api/devices').send(voltageFeedbackBody()).expect(403);
      await lead.agent.post('/api/devices').send(voltageFeedbackBody()).expect(201);
    });

    it.each([
      ['min above typ', { gainBandwidthHz: { min: 120e6, typ: 100e6 } }, 'gainBandwidthHz.min', 'min_above_typ'],
      ['typ above max', { slewRateVPerS: { typ: 9e6, max: 8e6 } }, 'slewRateVPerS.typ', 'typ_above_max'],
      ['min above max', { slewRateVPerS: { min: 9e6, max: 8e6 } }, 'slewRateVPerS.min', 'min_above_max'],
      ['phase margin 0°', { phaseMarginDeg: 0 }, 'phaseMarginDeg', 'phase_margin_out_of_range'],
      ['phase margin 120°', { phaseMarginDeg: 120 }, 'phaseMarginDeg', 'phase_margin_out_of_range'],
      ['no GBW', { gainBandwidthHz: undefined }, 'gainBandwidthHz', 'required'],
      ['a GBW without any value', { gainBandwidthHz: { page: '4' } }, 'gainBandwidthHz', 'required'],
      ['a GBW with its unit as text', { gainBandwidthHz: { typ: '100 MHz' } }, 'gainBandwidthHz.typ', 'not_a_number'],
      ['NaN as text', { gainBandwidthHz: { typ: 'NaN' } }, 'gainBandwidthHz.typ', 'not_a_number'],
      ['a list for a value', { gainBandwidthHz: [{ typ: 1e6 }] }, 'gainBandwidthHz', 'not_an_object'],
      ['a GBW of 0', { gainBandwidthHz: { typ: 0 } }, 'gainBandwidthHz.typ', 'out_of_range'],
      ['a GBW of 1e20 Hz', { gainBandwidthHz: { typ: 1e20 } }, 'gainBandwidthHz.typ', 'out_of_range'],
      ['a minimum stable gain below 1', { minimumStableGain: 0.5 }, 'minimumStableGain', 'out_of_range'],
      ['a negative noise', { voltageNoiseVPerRtHz: { typ: -1e-9 } }, 'voltageNoiseVPerRtHz.typ', 'out_of_range'],
      ['an unknown kind', { kind: 'transistor' }, 'kind', 'not_a_choice'],
      ['an unknown grade', { grade: 'military' }, 'grade', 'not_a_choice'],
      ['a field of another kind', { referenceNoiseGain: 2 }, 'referenceNoiseGain', 'unknown_field'],
      ['a quote on the side', { quote: { currency: 'USD', breaks: [] } }, 'quote', 'unknown_field'],
      ['a date that does not exist', { lifecycleDate: '2026-02-30' }, 'lifecycleDate', 'not_a_date'],
      ['an unknown column', { gainBandwidthHz: { typ: 1e6, mean: 1e6 } }, 'gainBandwidthHz.mean', 'unknown_field'],
    ])('refuses %s', async (_case, override, path, code) => {
      const before = await countDevices();
      const response = await designer.agent.post('/api/devices').send(voltageFeedbackBody(override)).expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path, code })]);
      expect(await countDevices()).toEqual(before);
    });

    it('refuses 1e400 with its field', async () => {
      const response = await designer.agent
        .post('/api/devices')
        .set('Content-Type', 'application/json')
        .send(JSON.stringify(voltageFeedbackBody()).replace('"typ":100000000', '"typ":1e400'))
        .expect(422);
      expect(response.body.fieldErrors).toEqual([
        expect.objectContaining({ path: 'gainBandwidthHz.typ', code: 'not_finite' }),
      ]);
    });

    it('takes −0 as 0', async () => {
      const { body } = await designer.agent
        .post('/api/devices')
        .set('Content-Type', 'application/json')
        .send(JSON.stringify(voltageFeedbackBody({ currentNoiseCornerHz: 77 })).replace('77', '-0'))
        .expect(201);
      expect(Object.is(body.currentNoiseCornerHz, 0)).toBe(true);
    });

    it('refuses the same part of the same maker, however it is capitalised', async () => {
      const device = await createDevice(designer.agent);
      const again = voltageFeedbackBody({ partNumber: device.partNumber.toLowerCase() });
      const response = await designer.agent.post('/api/devices').send(again).expect(409);
      expect(response.body).toMatchObject({ code: 'already_exists', fieldErrors: [{ path: 'partNumber' }] });
      await createDevice(designer.agent, { partNumber: device.partNumber, maker: 'Another Maker' });
    });
  });

  describe('GET /devices', () => {
    const search = async (query: Record<string, unknown>) => {
      const { body } = await buyer.agent
        .get('/api/devices')
        .query({ search: 'FIND-', ...query })
        .expect(200);
      return {
        parts: body.items.map((item: { partNumber: string }) => item.partNumber) as string[],
        total: body.total as number,
      };
    };

    beforeAll(async () => {
      const slow = await createDevice(designer.agent, { partNumber: 'FIND-SLOW', gainBandwidthHz: { min: 5e6 } });
      await createDevice(designer.agent, { partNumber: 'FIND-TYP', gainBandwidthHz: { typ: 100e6 } });
      const fast = await createDevice(designer.agent, {
        partNumber: 'FIND-FAST',
        gainBandwidthHz: { min: 200e6, typ: 300e6 },
        grade: 'rf',
        lifecycle: 'not-recommended',
      });
      await designer.agent
        .post('/api/devices')
        .send(currentFeedbackBody({ partNumber: 'FIND-CURRENT' }))
        .expect(201);
      const quote = (unitPriceMicros: number) => ({ currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros }] });
      await buyer.agent.put(`/api/devices/${slow.id}/quote`).send(quote(500_000)).expect(200);
      await buyer.agent.put(`/api/devices/${fast.id}/quote`).send(quote(4_200)).expect(200);
      await colleague.agent.post(`/api/devices/${fast.id}/verification`).send({ version: 1 }).expect(200);
    });

    it('needs a session', () => testApp.anonymous().get('/api/devices').expect(401));

    it('searches, filters and sorts', async () => {
      expect(await search({})).toEqual({ parts: ['FIND-CURRENT', 'FIND-FAST', 'FIND-SLOW', 'FIND-TYP'], total: 4 });
      expect((await search({ kind: 'current-feedback' })).parts).toEqual(['FIND-CURRENT']);
      expect((await search({ grade: 'rf', kind: 'voltage-feedback' })).parts).toEqual(['FIND-FAST']);
      expect((await search({ lifecycle: 'not-recommended' })).parts).toEqual(['FIND-FAST']);
      expect((await search({ verified: true })).parts).toEqual(['FIND-FAST']);
      expect((await search({ verified: false })).total).toBe(3);
      expect((await search({ maximumPriceMicros: 10_000 })).parts).toEqual(['FIND-FAST']);
      expect((await search({ sort: 'price' })).parts.slice(0, 2)).toEqual(['FIND-FAST', 'FIND-SLOW']);
      expect((await search({ sort: 'gbw', order: 'desc' })).parts.slice(0, 3)).toEqual([
        'FIND-FAST',
        'FIND-TYP',
        'FIND-SLOW',
      ]);
    });

    it('does not take a typical GBW for a minimum: 100 MHz typical counts as 70 MHz', async () => {
      expect((await search({ minimumGbwHz: 71e6 })).parts).toEqual(['FIND-FAST']);
      expect((await search({ minimumGbwHz: 69e6 })).parts).toEqual(['FIND-FAST', 'FIND-TYP']);
    });

    it('pages', async () => {
      expect(await search({ page: 2, pageSize: 3 })).toEqual({ parts: ['FIND-TYP'], total: 4 });
    });

    it('takes signs of patterns as they stand', async () => {
      const { body } = await buyer.agent.get('/api/devices').query({ search: 'FIND_%' }).expect(200);
      expect(body.total).toBe(0);
    });

    it.each([
      [{ page: 0 }, 'page', 'out_of_range'],
      [{ pageSize: 'all' }, 'pageSize', 'not_a_number'],
      [{ sort: 'colour' }, 'sort', 'not_a_choice'],
      [{ verified: 'maybe' }, 'verified', 'not_a_boolean'],
      [{ colour: 'red' }, 'colour', 'unknown_field'],
    ])('refuses %j', async (query, path, code) => {
      const response = await buyer.agent.get('/api/devices').query(query).expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path, code })]);
    });
  });

  describe('PUT /devices/:id', () => {
    it('replaces the values, removes the verification and keeps who entered them', async () => {
      const device = await createDevice(designer.agent);
      await colleague.agent.post(`/api/devices/${device.id}/verification`).send({ version: 1 }).expect(200);
      const body = {
        ...voltageFeedbackBody({ partNumber: device.partNumber, slewRateVPerS: { typ: 60e6 } }),
        version: 2,
      };
      const { body: changed } = await lead.agent.put(`/api/devices/${device.id}`).send(body).expect(200);
      expect(changed).toMatchObject({
        version: 3,
        slewRateVPerS: { typ: 60e6 },
        verified: false,
        verifiedBy: null,
        enteredBy: { id: designer.user.id },
        can: { verify: false },
      });
    });

    it('keeps the verification when only notes and lifecycle change', async () => {
      const original = voltageFeedbackBody();
      const { body: device } = await designer.agent.post('/api/devices').send(original).expect(201);
      await colleague.agent.post(`/api/devices/${device.id}/verification`).send({ version: 1 }).expect(200);
      const body = { ...original, notes: 'Looked up again.', lifecycle: 'last-time-buy', version: 2 };
      const { body: changed } = await designer.agent.put(`/api/devices/${device.id}`).send(body).expect(200);
      expect(changed).toMatchObject({ verified: true, lifecycle: 'last-time-buy', notes: 'Looked up again.' });
    });

    it('answers a stale version with the current row and stores nothing', async () => {
      const device = await createDevice(designer.agent);
      const body = { ...voltageFeedbackBody({ partNumber: device.partNumber }), version: 7 };
      const response = await designer.agent.put(`/api/devices/${device.id}`).send(body).expect(409);
      expect(response.body).toMatchObject({ code: 'stale_version', current: { id: device.id, version: 1 } });
      expect(await testApp.rows('SELECT version FROM devices WHERE id = $id', { id: device.id })).toEqual([
        { version: 1 },
      ]);
    });

    it('is not for buyers, and the kind stays', async () => {
      const device = await createDevice(designer.agent);
      const body = { ...voltageFeedbackBody({ partNumber: device.partNumber }), version: 1 };
      await testApp.anonymous().put(`/api/devices/${device.id}`).send(body).expect(401);
      await buyer.agent.put(`/api/devices/${device.id}`).send(body).expect(403);
      await designer.agent.put(`/api/devices/${randomUUID()}`).send(body).expect(404);
      const other = { ...currentFeedbackBody({ partNumber: device.partNumber }), version: 1 };
      const response = await designer.agent.put(`/api/devices/${device.id}`).send(other).expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path: 'kind', code: 'kind_fixed' })]);
    });
  });

  describe('verification', () => {
    it('takes another person than who entered or last edited the values', async () => {
      const device = await createDevice(designer.agent);
      const path = `/api/devices/${device.id}/verification`;
      await testApp.anonymous().post(path).send({ version: 1 }).expect(401);
      await designer.agent.post(path).send({ version: 1 }).expect(403);
      await buyer.agent.post(path).send({ version: 1 }).expect(403);
      await colleague.agent.post(path).send({ version: 9 }).expect(409);
      const { body } = await colleague.agent.post(path).send({ version: 1 }).expect(200);
      expect(body).toMatchObject({ verified: true, verifiedBy: { id: colleague.user.id }, version: 2 });
      await buyer.agent.delete(path).query({ version: 2 }).expect(403);
      const { body: removed } = await designer.agent.delete(path).query({ version: 2 }).expect(200);
      expect(removed).toMatchObject({ verified: false, verifiedBy: null, version: 3 });
    });
  });

  describe('DELETE /devices/:id', () => {
    it('removes a device that nobody uses, with its quote', async () => {
      const device = await createDevice(designer.agent);
      const quote = { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 1 }] };
      await buyer.agent.put(`/api/devices/${device.id}/quote`).send(quote).expect(200);
      await testApp.anonymous().delete(`/api/devices/${device.id}`).query({ version: 1 }).expect(401);
      await buyer.agent.delete(`/api/devices/${device.id}`).query({ version: 1 }).expect(403);
      await designer.agent.delete(`/api/devices/${device.id}`).expect(422);
      await designer.agent.delete(`/api/devices/${device.id}`).query({ version: 2 }).expect(409);
      await designer.agent.delete(`/api/devices/${device.id}`).query({ version: 1 }).expect(204);
      await designer.agent.get(`/api/devices/${device.id}`).expect(404);
      expect(await testApp.rows('SELECT id FROM quotes WHERE device_id = $id', { id: device.id })).toEqual([]);
    });

    it('says where a device is used, and only counts what is hidden from whoever asks', async () => {
      const device = await createDevice(designer.agent);
      for (const [code, open] of [['OPEN-1', true] as const, ['CLOSED-1', false] as const]) {
        const project = await createProject(designer.agent, { code, open });
        const chain = await createChain(designer.agent, project.id);
        const option = chain.options[0]!;
        const body = { version: option.version, name: 'Baseline', stages: [invertingStage(device.id)] };
        await designer.agent.put(`/api/options/${option.id}`).send(body).expect(200);
      }
      const own = await designer.agent.delete(`/api/devices/${device.id}`).query({ version: 1 }).expect(409);
      expect(own.body).toMatchObject({ code: 'in_use', hiddenCount: 0 });
      expect(own.body.where).toHaveLength(2);
      const others = await colleague.agent.delete(`/api/devices/${device.id}`).query({ version: 1 }).expect(409);
      expect(others.body.where).toEqual([
        expect.objectContaining({
          project: 'OPEN-1 Test bench',
          chain: 'Receive chain',
          option: 'Baseline',
          stage: 'S1 Gain',
        }),
      ]);
      expect(others.body.hiddenCount).toBe(1);
      expect(JSON.stringify(others.body)).not.toContain('CLOSED-1');
      const { body: uses } = await buyer.agent.get(`/api/devices/${device.id}/uses`).expect(200);
      expect(uses).toMatchObject({ where: [{ project: 'OPEN-1 Test bench' }], hiddenCount: 1 });
      await testApp.anonymous().get(`/api/devices/${device.id}/uses`).expect(401);
    });
  });
});

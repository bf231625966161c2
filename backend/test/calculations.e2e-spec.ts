import { randomUUID } from 'node:crypto';
import { TestApp } from './create-test-app';
import type { SignedIn } from './create-test-app';
import { createDevice, voltageFeedbackBody } from './factories/devices';
import { HAND_DEVICES, handReceiver } from './factories/hand-receiver';

describe('calculations', () => {
  let testApp: TestApp;
  let designer: SignedIn;
  let buyer: SignedIn;

  beforeAll(async () => {
    testApp = await TestApp.create();
    designer = await testApp.signedIn('designer');
    buyer = await testApp.signedIn('buyer');
  });
  afterAll(() => testApp.close());

  const calculate = (body: object) => buyer.agent.post('/api/calculations').send(body);
  const withStage = (index: number, change: object) => {
    const body = handReceiver();
    return { ...body, stages: body.stages.map((stage, at) => (at === index ? { ...stage, ...change } : stage)) };
  };

  describe('POST /calculations', () => {
    it('gives the figures of the receiver as computed by hand', async () => {
      const { body } = await calculate(handReceiver()).expect(200);
      const { report } = body;
      const second = report.stages[1].cases.minimum.figures;
      // By hand: 75 MHz / (11 · 7 MHz) = 0.974; 75 / 11 = 6.818 MHz; droop −10·log(1 + (f/6.818 MHz)²).
      expect(second.noiseGain.value).toBeCloseTo(11, 9);
      expect(second.headroomTop.value).toBeCloseTo(0.974, 3);
      expect(second.headroomOperating.value).toBeCloseTo(1.364, 3);
      expect(second.cornerFirstOrder.value).toBeCloseTo(6.818e6, -3);
      expect(second.droopOperating.value).toBeCloseTo(-1.869, 3);
      const chain = report.cases.minimum.figures;
      expect(chain.gainOperating.value).toBeCloseTo(58.08, 2);
      expect(chain.flatness.value).toBeCloseTo(2.44, 2);
      expect(chain.cornerUpper.value / 1e6).toBeCloseTo(6.67, 2);
      expect(chain.supplyCurrent.value).toBeCloseTo(38e-3, 9);
      expect(report.cases.typical.figures.flatness.value).toBeCloseTo(1.62, 2);
      expect(report.cost).toEqual({ amountMicros: 8_120_000, currency: 'USD' });
      expect(report.verdict).toMatchObject({ verdict: 'over', stageId: report.stages[1].stageId });
      expect(body.curves).toBeNull();
      expect(body.working).toBeNull();
    });

    it('marks a quote whose last day has passed, and only that one', async () => {
      const until = (validUntil: string) => ({
        devices: HAND_DEVICES.map((device) => ({ ...device, quote: { ...device.quote, validUntil } })),
      });
      const marksOf = async (validUntil: string) => {
        const { body } = await calculate(handReceiver(until(validUntil))).expect(200);
        return body.report.stages[1].marks.map((mark: { kind: string }) => mark.kind);
      };
      expect(await marksOf('2020-01-31')).toContain('quote-lapsed');
      expect(await marksOf('2999-01-31')).not.toContain('quote-lapsed');
    });

    it('includes curves and one working on request', async () => {
      const stages = handReceiver().stages;
      const include = {
        curves: { fromHz: 1e5, toHz: 1e9, points: 101 },
        working: { stageId: stages[1]!.id, figure: 'headroom', gbwCase: 'minimum' },
      };
      const { body } = await calculate(handReceiver({ stages, include })).expect(200);
      expect(body.curves.frequenciesHz).toHaveLength(101);
      expect(body.curves.frequenciesHz[0]).toBeCloseTo(1e5, 3);
      expect(body.curves.chain.minimum.gainDb).toHaveLength(101);
      expect(body.working).toMatchObject({ gbwCase: 'minimum', title: expect.any(String), source: expect.any(String) });
      expect(body.working.steps.length).toBeGreaterThan(0);
    });

    it('takes devices of the library by their id, and margins that the request sets', async () => {
      const { id } = await createDevice(designer.agent, { gainBandwidthHz: { typ: 100e6 } });
      const stages = handReceiver().stages.slice(1, 2);
      const body = handReceiver({ stages: [{ ...stages[0], deviceId: id }], policy: { gbwDerating: 0.5 } });
      const { body: answer } = await calculate(body).expect(200);
      expect(answer.report.stages[0].cases.minimum.figures.gbwHave).toMatchObject({ value: 50e6, assumed: true });
    });

    it('never writes NaN or infinity, and gives a reason for every missing figure', async () => {
      const bare = { id: 'bare', kind: 'voltage-feedback', partNumber: 'BARE-1', grade: 'rf', channels: 1 };
      const devices = [{ ...bare, gainBandwidthHz: { typ: 1e6 } }];
      const stages = handReceiver().stages.map((stage) => ({ ...stage, kind: 'voltage-feedback', deviceId: 'bare' }));
      const response = await calculate(handReceiver({ devices, stages })).expect(200);
      expect(response.text).not.toMatch(/NaN|Infinity/);
      const missing: unknown[] = [];
      JSON.parse(response.text, (_key, value: unknown) => {
        const figure = value as { value?: unknown; unit?: unknown; reason?: unknown } | null;
        if (figure && figure.value === null && 'unit' in figure) missing.push(figure.reason);
        return value;
      });
      expect(missing.length).toBeGreaterThan(0);
      for (const reason of missing) expect(reason).toEqual(expect.stringMatching(/\w/));
    });

    it('takes a chain without stages', async () => {
      const { body } = await calculate(handReceiver({ stages: [] })).expect(200);
      expect(body.report.stages).toEqual([]);
    });

    it('needs a session and the CSRF header', async () => {
      await testApp.anonymous().post('/api/calculations').send(handReceiver()).expect(401);
      const response = await buyer.agent
        .post('/api/calculations')
        .set('X-Requested-With', '')
        .send(handReceiver())
        .expect(403);
      expect(response.body.code).toBe('csrf_header_missing');
    });

    it.each([
      [
        '25 stages',
        () => handReceiver({ stages: Array(25).fill(handReceiver().stages[0]) }),
        'stages',
        'too_many_stages',
      ],
      ['Rf missing', () => withStage(1, { feedbackOhm: undefined }), 'stages.1.feedbackOhm', 'required'],
      [
        'Rf of 0 Ω in an inverting stage',
        () => withStage(1, { feedbackOhm: 0 }),
        'stages.1.feedbackOhm',
        'feedback_resistor_missing',
      ],
      [
        'an inverting node fed from 0 Ω',
        () => withStage(1, { gainOhm: 0 }),
        'stages.1.gainOhm',
        'inverting_fed_from_zero_ohm',
      ],
      ['no DC return', () => withStage(0, { couplingF: 1e-9 }), 'stages.0.biasOhm', 'input_without_dc_return'],
      ['an unknown device', () => withStage(0, { deviceId: randomUUID() }), 'stages.0.deviceId', 'device_unknown'],
      [
        'a device id that is no id',
        () => withStage(2, { deviceId: "x' OR 1=1" }),
        'stages.2.deviceId',
        'device_unknown',
      ],
      [
        'the wrong kind of device',
        () => withStage(1, { deviceId: 'hand-driver' }),
        'stages.1.deviceId',
        'device_kind_mismatch',
      ],
      [
        'an inline phase margin of 120°',
        () => handReceiver({ devices: [{ ...HAND_DEVICES[0], phaseMarginDeg: 120 }, ...HAND_DEVICES.slice(1)] }),
        'devices.0.phaseMarginDeg',
        'phase_margin_out_of_range',
      ],
      [
        'an inline minimum above typical',
        () => handReceiver({ devices: [{ ...HAND_DEVICES[0], gainBandwidthHz: { min: 2e9, typ: 1e9 } }] }),
        'devices.0.gainBandwidthHz.min',
        'min_above_typ',
      ],
      [
        'a reversed band',
        () => ({
          ...handReceiver(),
          specification: { ...handReceiver().specification, band: { lowHz: 7e6, operatingHz: 5e6, highHz: 3e6 } },
        }),
        'specification.band',
        'band_reversed',
      ],
      ['an unknown field', () => handReceiver({ colour: 'red' }), 'colour', 'unknown_field'],
      ['a wrong unit', () => handReceiver({ buildQuantity: '250 pcs' }), 'buildQuantity', 'not_a_number'],
      [
        'a figure nobody has',
        () => handReceiver({ include: { working: { stageId: null, figure: 'luck', gbwCase: 'minimum' } } }),
        'include.working.figure',
        'required',
      ],
      [
        'the working of a stage that is not there',
        () => handReceiver({ include: { working: { stageId: randomUUID(), figure: 'headroom', gbwCase: 'minimum' } } }),
        'include.working.stageId',
        'required',
      ],
      ['stages that are no list', () => handReceiver({ stages: {} }), 'stages', 'not_a_list'],
      [
        'one point of a curve',
        () => handReceiver({ include: { curves: { fromHz: 1, toHz: 2, points: 1 } } }),
        'include.curves.points',
        'out_of_range',
      ],
      [
        'a curve that runs backwards',
        () => handReceiver({ include: { curves: { fromHz: 1e6, toHz: 1e3, points: 11 } } }),
        'include.curves.toHz',
        'band_reversed',
      ],
    ])('refuses %s', async (_case, body, path, code) => {
      const response = await calculate(body()).expect(422);
      expect(response.body).toMatchObject({ code: 'invalid', requestId: expect.any(String) });
      expect(response.body.fieldErrors).toContainEqual(
        expect.objectContaining({ code, path: expect.stringContaining(path), message: expect.stringMatching(/\w/) }),
      );
      for (const { path: named } of response.body.fieldErrors) expect(named).not.toMatch(/undefined/);
    });

    it('refuses what is no JSON with 400, 1e400 with its field, and a body of 2 MB with 413', async () => {
      const send = (text: string) =>
        buyer.agent.post('/api/calculations').set('Content-Type', 'application/json').send(text);
      await send('{"specification":').expect(400);
      const huge = await send(JSON.stringify(handReceiver()).replace('"buildQuantity":250', '"buildQuantity":1e400'));
      expect(huge.status).toBe(422);
      expect(huge.body.fieldErrors).toEqual([expect.objectContaining({ path: 'buildQuantity', code: 'not_finite' })]);
      await send(JSON.stringify({ ...handReceiver(), note: 'x'.repeat(2_000_000) })).expect(413);
    });

    it('calculates −0 as 0', async () => {
      const text = JSON.stringify(withStage(0, { isolationOhm: 77 })).replace('"isolationOhm":77', '"isolationOhm":-0');
      const { body } = await buyer.agent
        .post('/api/calculations')
        .set('Content-Type', 'application/json')
        .send(text)
        .expect(200);
      expect(body.report.stages).toHaveLength(4);
    });

    it('stores nothing', async () => {
      const events = await testApp.rows('SELECT COUNT(*) AS n FROM audit_events');
      await calculate(handReceiver()).expect(200);
      expect(await testApp.rows('SELECT COUNT(*) AS n FROM audit_events')).toEqual(events);
    });
  });

  describe('POST /calculations/candidates', () => {
    const tryDevices = (body: object) => buyer.agent.post('/api/calculations/candidates').send(body);

    it('tries the devices of the library and those sent along in the very stage', async () => {
      const fast = await createDevice(designer.agent, {
        ...voltageFeedbackBody(),
        gainBandwidthHz: { min: 500e6, typ: 600e6 },
        slewRateVPerS: { min: 500e6 },
        outputResistanceOhm: { typ: 0 },
      });
      const slow = await createDevice(designer.agent, { gainBandwidthHz: { min: 20e6, typ: 30e6 } });
      const stages = handReceiver().stages;
      const { body } = await tryDevices({ ...handReceiver({ stages }), stageId: stages[1]!.id }).expect(200);
      expect(body.stageId).toBe(stages[1]!.id);
      expect(body.needs.map((need: { text: string }) => need.text)).toContainEqual(expect.stringContaining('231 MHz'));
      const byId = new Map(
        body.candidates.map((candidate: { deviceId: string }) => [candidate.deviceId, candidate]),
      ) as Map<string, Record<string, unknown>>;
      // By hand: 500 MHz / 77 MHz = 6.494; 20 / 77 = 0.2597.
      expect(byId.get(fast.id)).toMatchObject({ current: false, headroom: { value: expect.closeTo(6.494, 3) } });
      expect(byId.get(slow.id)).toMatchObject({ verdict: 'over', headroom: { value: expect.closeTo(0.2597, 4) } });
      expect(byId.get('hand-gain')).toMatchObject({ current: true, verdict: 'over' });
      expect(byId.has('hand-driver')).toBe(false);
      expect(JSON.stringify(body)).not.toMatch(/NaN|Infinity/);
    });

    it('keeps one order however many threads share the devices', async () => {
      const stages = handReceiver().stages;
      const many = Array.from({ length: 130 }, (_, index) => ({
        ...HAND_DEVICES[1]!,
        id: `many-${index}`,
        partNumber: `MANY-${index}`,
        gainBandwidthHz: { min: (50 + 10 * ((index * 37) % 130)) * 1e6 },
        quote: { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 10_000 * (1 + ((index * 53) % 130)) }] },
      }));
      const request = handReceiver({ stages, devices: [...HAND_DEVICES, ...many] });
      const { body } = await tryDevices({ ...request, stageId: stages[1]!.id }).expect(200);
      const tried = body.candidates.filter(({ deviceId }: { deviceId: string }) => deviceId.startsWith('many-'));
      expect(new Set(tried.map(({ deviceId }: { deviceId: string }) => deviceId)).size).toBe(130);
      const order = ['clear', 'tight', 'unknown', 'over'];
      const keys = body.candidates.map(
        ({ verdict, unitCost }: { verdict: string; unitCost: { amountMicros: number | null } }) =>
          order.indexOf(verdict) * 1e12 + (unitCost.amountMicros ?? 1e11),
      );
      expect(keys).toEqual([...keys].sort((a: number, b: number) => a - b));
      expect(new Set(body.candidates.map(({ verdict }: { verdict: string }) => verdict)).size).toBeGreaterThan(1);
    });

    it('keeps to the devices that are named', async () => {
      const { id } = await createDevice(designer.agent);
      const stages = handReceiver().stages;
      const body = { ...handReceiver({ stages }), stageId: stages[1]!.id, deviceIds: [id] };
      const { body: answer } = await tryDevices(body).expect(200);
      expect(answer.candidates.map((candidate: { deviceId: string }) => candidate.deviceId)).toEqual([id]);
    });

    it('refuses a stage that is not there or takes no device, and an input that cannot be calculated', async () => {
      const response = await tryDevices({ ...handReceiver(), stageId: randomUUID() }).expect(422);
      expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path: 'stageId', code: 'stage_unknown' })]);
      const wrong = withStage(0, { couplingF: 1e-9 });
      const refused = await tryDevices({ ...wrong, stageId: wrong.stages[1]!.id }).expect(422);
      expect(refused.body.fieldErrors).toContainEqual(expect.objectContaining({ code: 'input_without_dc_return' }));
      await testApp.anonymous().post('/api/calculations/candidates').send(handReceiver()).expect(401);
    });
  });
});

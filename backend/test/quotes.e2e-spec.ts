import { randomUUID } from 'node:crypto';
import { TestApp } from './create-test-app';
import type { SignedIn } from './create-test-app';
import { createDevice } from './factories/devices';

const quote = (overrides: Record<string, unknown> = {}) => ({
  currency: 'USD',
  breaks: [
    { quantity: 1, unitPriceMicros: 1_350_000 },
    { quantity: 10, unitPriceMicros: 1_120_000 },
    { quantity: 250, unitPriceMicros: 620_000 },
  ],
  reference: 'Q-4711',
  validUntil: '2027-06-30',
  supplier: 'Invented Components',
  ...overrides,
});

describe('quotes', () => {
  let testApp: TestApp;
  let designer: SignedIn;
  let buyer: SignedIn;
  let lead: SignedIn;
  let admin: SignedIn;
  let path: string;
  let deviceId: string;

  beforeAll(async () => {
    testApp = await TestApp.create();
    designer = await testApp.signedIn('designer');
    buyer = await testApp.signedIn('buyer');
    lead = await testApp.signedIn('lead');
    admin = await testApp.signedIn('admin');
  });
  afterAll(() => testApp.close());

  beforeEach(async () => {
    deviceId = (await createDevice(designer.agent)).id;
    path = `/api/devices/${deviceId}/quote`;
  });

  it('is stored with its breaks in exact millionths and shown with the device', async () => {
    const exact = quote({ breaks: [{ quantity: 1, unitPriceMicros: 4200 }] });
    const { body } = await buyer.agent.put(path).send(exact).expect(200);
    expect(body.quote).toEqual(exact);
    const { body: device } = await designer.agent.get(`/api/devices/${deviceId}`).expect(200);
    expect(device.quote).toEqual(exact);
    expect(device.version).toBe(1);
  });

  it('is replaced as a whole', async () => {
    await buyer.agent.put(path).send(quote()).expect(200);
    const { reference, validUntil, supplier, ...bare } = quote({ breaks: [{ quantity: 5, unitPriceMicros: 1 }] });
    const { body } = await lead.agent.put(path).send(bare).expect(200);
    expect(body.quote).toEqual(bare);
    const events = await testApp.rows<{ action: string }>(
      "SELECT action FROM audit_events WHERE entity = 'quote' AND entity_id = $deviceId ORDER BY id",
      { deviceId },
    );
    expect(events.map((event) => event.action)).toEqual(['quote.created', 'quote.updated']);
    expect([reference, validUntil, supplier]).toEqual(['Q-4711', '2027-06-30', 'Invented Components']);
  });

  it('answers a stale version with the device as it is now and stores nothing', async () => {
    const { body: first } = await buyer.agent
      .put(path)
      .send({ ...quote(), version: 0 })
      .expect(200);
    expect(first.quoteVersion).toBe(1);
    const late = { ...quote({ reference: 'late' }), version: 0 };
    const response = await lead.agent.put(path).send(late).expect(409);
    expect(response.body).toMatchObject({ code: 'stale_version', current: { quoteVersion: 1, quote: quote() } });
    await lead.agent.delete(path).query({ version: 7 }).expect(409);
    const { body: still } = await buyer.agent.get(`/api/devices/${deviceId}`).expect(200);
    expect(still.quote).toEqual(quote());
    await lead.agent.delete(path).query({ version: 1 }).expect(204);
  });

  it('is for designers, buyers and leads', async () => {
    await testApp.anonymous().put(path).send(quote()).expect(401);
    await admin.agent.put(path).send(quote()).expect(403);
    await designer.agent.put(path).send(quote()).expect(200);
    await testApp.anonymous().delete(path).expect(401);
    await admin.agent.delete(path).expect(403);
    await buyer.agent.delete(path).expect(204);
    await buyer.agent.delete(path).expect(404);
    await buyer.agent.put(`/api/devices/${randomUUID()}/quote`).send(quote()).expect(404);
  });

  it.each([
    ['a price of 0', [{ quantity: 1, unitPriceMicros: 0 }], 'breaks.0.unitPriceMicros', 'out_of_range'],
    ['half a millionth', [{ quantity: 1, unitPriceMicros: 0.5 }], 'breaks.0.unitPriceMicros', 'not_an_integer'],
    ['a price as text', [{ quantity: 1, unitPriceMicros: '4.10' }], 'breaks.0.unitPriceMicros', 'not_a_number'],
    ['a quantity of 0', [{ quantity: 0, unitPriceMicros: 1 }], 'breaks.0.quantity', 'out_of_range'],
    ['no break', [], 'breaks', 'too_few'],
    ['a list in the list', [[]], 'breaks', 'not_an_object'],
    ['an empty entry', [null], 'breaks.0', 'required'],
    [
      'falling quantities',
      [
        { quantity: 10, unitPriceMicros: 2 },
        { quantity: 1, unitPriceMicros: 3 },
      ],
      'breaks',
      'breaks_not_ascending',
    ],
    [
      'a repeated quantity',
      [
        { quantity: 10, unitPriceMicros: 2 },
        { quantity: 10, unitPriceMicros: 1 },
      ],
      'breaks',
      'breaks_not_ascending',
    ],
  ])('refuses %s and keeps the quote that was there', async (_case, breaks, field, code) => {
    await buyer.agent.put(path).send(quote()).expect(200);
    const response = await buyer.agent.put(path).send(quote({ breaks })).expect(422);
    expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path: field, code })]);
    const { body } = await buyer.agent.get(`/api/devices/${deviceId}`).expect(200);
    expect(body.quote).toEqual(quote());
  });

  it.each(['UDS', 'usd', 'US$'])('refuses %s, which is no currency of ISO 4217', async (currency) => {
    const response = await buyer.agent.put(path).send(quote({ currency })).expect(422);
    expect(response.body.fieldErrors).toEqual([expect.objectContaining({ path: 'currency', code: 'not_a_currency' })]);
  });

  it('refuses a currency that is none and a day that does not exist', async () => {
    const response = await buyer.agent
      .put(path)
      .send(quote({ currency: 'dollars', validUntil: '2026-02-30' }))
      .expect(422);
    expect(response.body.fieldErrors.map(({ code }: { code: string }) => code)).toEqual([
      'not_a_currency',
      'not_a_date',
    ]);
  });
});

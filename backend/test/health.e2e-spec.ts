import { TestApp } from './create-test-app';

describe('GET /api/health', () => {
  let testApp: TestApp;

  beforeAll(async () => {
    testApp = await TestApp.create();
  });
  afterAll(() => testApp.close());

  it('answers without a session and is not cached', async () => {
    const response = await testApp.anonymous().get('/api/health').expect(200);
    expect(response.body).toEqual({ status: 'ok', database: 'ok', version: expect.stringMatching(/^\d+\.\d+\.\d+$/) });
    expect(response.headers['cache-control']).toBe('no-store');
    expect(response.headers['x-request-id']).toMatch(/^[0-9a-f-]{36}$/);
  });
});

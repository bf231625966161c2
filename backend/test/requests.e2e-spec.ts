import { request as httpRequest } from 'node:http';
import type { AddressInfo } from 'node:net';
import { Logger } from '@nestjs/common';
import { UsersService } from '../src/users/users.service';
import { type SignedIn, TestApp } from './create-test-app';

/** Sends bytes as they are, past every client library's own ideas of JSON. */
function sendRaw(testApp: TestApp, path: string, body: string | Buffer, headers: Record<string, string> = {}) {
  const { port } = testApp.server.address() as AddressInfo;
  return new Promise<{ status: number; body: { code: string; fieldErrors?: { path: string; code: string }[] } }>(
    (resolve, reject) => {
      const request = httpRequest(
        {
          port,
          host: '127.0.0.1',
          path,
          method: 'POST',
          headers: { 'X-Requested-With': 'bandledger', 'Content-Type': 'application/json', ...headers },
        },
        (response) => {
          let text = '';
          response.on('data', (chunk: Buffer) => (text += chunk.toString()));
          response.on('end', () => resolve({ status: response.statusCode ?? 0, body: JSON.parse(text) }));
        },
      );
      request.on('error', reject);
      request.end(body);
    },
  );
}

describe('requests that cannot be served', () => {
  let testApp: TestApp;
  let admin: SignedIn;

  beforeAll(async () => {
    testApp = await TestApp.create();
    admin = await testApp.signedIn('admin');
  });
  afterAll(() => testApp.close());

  it.each(['{"email": ', '{"version": NaN}', '{"version": Infinity}', "{'email': 1}", '"text"', '\u0000'])(
    'answers 400 to unreadable JSON: %j',
    async (body) => {
      const response = await sendRaw(testApp, '/api/session', body);
      expect(response).toMatchObject({ status: 400, body: { code: 'unreadable_json' } });
    },
  );

  it('answers 413 to a body of 2 MB', async () => {
    const body = JSON.stringify({ email: 'x'.repeat(2_000_000) });
    expect(await sendRaw(testApp, '/api/session', body)).toMatchObject({
      status: 413,
      body: { code: 'body_too_large' },
    });
  });

  it('answers 400 to a body in an encoding that it is not in', async () => {
    const response = await sendRaw(testApp, '/api/session', 'not gzip', { 'Content-Encoding': 'gzip' });
    expect(response).toMatchObject({ status: 400, body: { code: 'unreadable' } });
  });

  it('answers 422 with the path to 1e400, which JSON.parse makes Infinity', async () => {
    const body = '{"email": "a@example.org", "password": {"deep": [0, 1e400]}}';
    const response = await sendRaw(testApp, '/api/session', body);
    expect(response).toMatchObject({
      status: 422,
      body: { code: 'invalid', fieldErrors: [{ path: 'password.deep.1', code: 'not_finite' }] },
    });
  });

  it('answers 422 to NaN as text', async () => {
    const { body } = await admin.agent.patch(`/api/users/${admin.user.id}`).send({ version: 'NaN' }).expect(422);
    expect(body.fieldErrors).toEqual([{ path: 'version', code: 'not_a_number', message: expect.any(String) }]);
  });

  it.each(['[]', '[{"email": "a"}]', 'null'])('answers 4xx to a body that is no object: %s', async (body) => {
    const response = await sendRaw(testApp, '/api/session', body);
    expect([400, 422]).toContain(response.status);
  });

  it('answers 422 to absurd depth instead of exhausting the stack', async () => {
    const body = `{"email": ${'['.repeat(100_000)}${']'.repeat(100_000)}}`;
    const response = await sendRaw(testApp, '/api/session', body);
    expect(response).toMatchObject({ status: 422, body: { fieldErrors: [{ code: 'too_deep' }] } });
  });

  it('refuses keys that reach for a prototype', async () => {
    const response = await sendRaw(testApp, '/api/session', '{"__proto__": {"roles": ["admin"]}}');
    expect(response).toMatchObject({
      status: 422,
      body: { fieldErrors: [{ path: '__proto__', code: 'unknown_field' }] },
    });
  });

  it('answers 422 where the body is missing or in another format', async () => {
    await testApp.anonymous().post('/api/session').expect(422);
    await testApp.anonymous().post('/api/session').type('form').send('email=a&password=b').expect(422);
  });

  it.each(['/api/nothing', '/api', '/api/users/', '/api/%E0%A4%A'])('answers %s in the one shape', async (path) => {
    const response = await testApp.anonymous().get(path);
    expect(response.status).toBeGreaterThanOrEqual(400);
    expect(response.status).toBeLessThan(500);
    expect(response.body).toEqual({
      code: expect.any(String),
      message: expect.any(String),
      requestId: response.headers['x-request-id'],
    });
  });

  it('keeps what went wrong inside to itself, and to the log with the id of the request', async () => {
    jest.spyOn(testApp.app.get(UsersService), 'findAll').mockRejectedValueOnce(new Error('a detail of the inside'));
    const log = jest.spyOn(Logger.prototype, 'error').mockImplementation(() => undefined);
    const { body, status } = await admin.agent.get('/api/users');
    expect({ status, code: body.code }).toEqual({ status: 500, code: 'internal' });
    expect(JSON.stringify(body)).not.toContain('detail');
    expect(log).toHaveBeenCalledWith(expect.stringContaining('a detail of the inside'));
    expect(log).toHaveBeenCalledWith(expect.stringContaining(body.requestId as string));
    jest.restoreAllMocks();
  });

  it('gives every request an id of its own, whatever the client sent', async () => {
    const ask = () => testApp.anonymous().get('/api/health').set('X-Request-Id', 'mine');
    const [first, second] = [await ask(), await ask()];
    expect(first.headers['x-request-id']).not.toBe(second.headers['x-request-id']);
    expect(first.headers['x-request-id']).not.toBe('mine');
  });

  it('keeps scripts, frames and objects of others out', async () => {
    const { headers } = await testApp.anonymous().get('/api/health');
    expect(headers['content-security-policy']).toContain("script-src 'self';");
    expect(headers['content-security-policy']).toContain("frame-ancestors 'none'");
    expect(headers['content-security-policy']).not.toContain('upgrade-insecure-requests');
    expect(headers['strict-transport-security']).toBeUndefined();
    expect(headers['x-powered-by']).toBeUndefined();
    expect(headers['x-content-type-options']).toBe('nosniff');
  });
});

import { mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import request from 'supertest';
import { TestApp } from './create-test-app';

const PAGE = '<!doctype html><title>Bandledger</title>';

describe('the screens', () => {
  let frontendDir: string;
  let testApp: TestApp;

  beforeAll(async () => {
    frontendDir = mkdtempSync(path.join(tmpdir(), 'bandledger-frontend-'));
    mkdirSync(path.join(frontendDir, 'assets'));
    writeFileSync(path.join(frontendDir, 'index.html'), PAGE);
    writeFileSync(path.join(frontendDir, 'assets', 'index-abc123.js'), 'export {};');
    writeFileSync(path.join(frontendDir, 'assets', 'large-abc123.js'), 'export const x = 1;\n'.repeat(500));
    writeFileSync(path.join(frontendDir, '.hidden'), 'hidden');
    testApp = await TestApp.create({ FRONTEND_DIR: frontendDir });
  });
  afterAll(async () => {
    await testApp.close();
    rmSync(frontendDir, { recursive: true, force: true });
  });

  const get = (address: string, accept = 'text/html') => request(testApp.server).get(address).set('Accept', accept);

  it.each(['/', '/projects/1/chains/2', '/welcome/x3v', '/sign-in?next=%2Fdesk'])(
    'come for %s, fresh',
    async (address) => {
      const response = await get(address).expect(200);
      expect(response.text).toBe(PAGE);
      expect(response.headers['cache-control']).toBe('no-cache');
      expect(response.headers['content-security-policy']).toContain("script-src 'self'");
      expect(response.headers['set-cookie']).toBeUndefined();
    },
  );

  it('have hashed files that may be kept for ever', async () => {
    const response = await get('/assets/index-abc123.js', '*/*').expect(200);
    expect(response.headers['cache-control']).toBe('public, max-age=31536000, immutable');
    expect(response.headers['content-type']).toMatch(/javascript/);
  });

  it('come compressed to who takes it; answers of the API do not', async () => {
    const large = await get('/assets/large-abc123.js', '*/*').set('Accept-Encoding', 'gzip').expect(200);
    expect(large.headers['content-encoding']).toBe('gzip');
    const plain = await get('/assets/large-abc123.js', '*/*').set('Accept-Encoding', 'identity').expect(200);
    expect(plain.headers['content-encoding']).toBeUndefined();
    const health = await get('/api/health', 'application/json').set('Accept-Encoding', 'gzip').expect(200);
    expect(health.headers['content-encoding']).toBeUndefined();
  });

  it.each([
    ['a missing file', '/assets/index-old.js', 'text/html'],
    ['an unknown address of the API', '/api/nothing', 'text/html'],
    ['the API itself', '/api', 'text/html'],
    ['a request for JSON', '/projects', 'application/json'],
    ['a hidden file', '/.hidden', 'text/html'],
    ['a way out of the folder', '/..%2f..%2fpackage.json', 'text/html'],
  ])('do not come for %s', async (_what, address, accept) => {
    const response = await get(address, accept);
    expect(response.status).toBe(404);
    expect(response.body.code).toBe('not_found');
  });

  it('do not come for a writing request', async () => {
    await request(testApp.server).post('/projects').set('Accept', 'text/html').expect(404);
  });

  it('say so when they have not been built', async () => {
    rmSync(path.join(frontendDir, 'index.html'));
    const response = await get('/').expect(503);
    expect(response.text).toContain('npm run build');
    writeFileSync(path.join(frontendDir, 'index.html'), PAGE);
  });
});

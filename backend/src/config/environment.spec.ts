import { readFileSync } from 'node:fs';
import path from 'node:path';
import { ConfigError, demoRefusal, httpAddress, isLoopback, readEnvironment } from './environment';

const REPOSITORY = path.resolve(__dirname, '../../..');
const EXAMPLE = readFileSync(path.join(REPOSITORY, '.env.example'), 'utf8');

/** The example's lines that set something, as an environment. */
function exampleSettings(): Record<string, string> {
  const lines = EXAMPLE.split('\n').filter((line) => /^[A-Z_]+=/.test(line));
  return Object.fromEntries(lines.map((line) => line.split('=') as [string, string]));
}

describe('readEnvironment(env)', () => {
  it('has a default for everything', () => {
    expect(readEnvironment({})).toMatchObject({
      host: '127.0.0.1',
      port: 4180,
      publicUrl: 'http://127.0.0.1:4180',
      dataDir: path.join(REPOSITORY, 'data'),
      demo: 'auto',
      sessionSecret: null,
      setupToken: null,
      scryptCost: 16,
    });
  });

  it('has just the defaults that .env.example states', () => {
    expect(readEnvironment(exampleSettings())).toEqual(readEnvironment({}));
  });

  it('reads no variable that .env.example leaves out', () => {
    const source = readFileSync(path.join(__dirname, 'environment.ts'), 'utf8');
    const read = [...source.matchAll(/env, '([A-Z_]+)'/g)].map(([, name]) => name ?? '');
    const documented = [...EXAMPLE.matchAll(/^#?([A-Z_]+)=/gm)].map(([, name]) => name ?? '');
    expect([...new Set(read)].sort()).toEqual(documented.sort());
  });

  it('takes empty text for "not set" and trims', () => {
    expect(readEnvironment({ PORT: '', HOST: ' ', SETUP_TOKEN: '' })).toEqual(readEnvironment({}));
    expect(readEnvironment({ PORT: ' 8080 ', DEMO: 'OFF' })).toMatchObject({ port: 8080, demo: 'off' });
  });

  it('makes the public address from host and port', () => {
    expect(readEnvironment({ HOST: '::1', PORT: '80' }).publicUrl).toBe('http://[::1]:80');
    expect(readEnvironment({ HOST: '0.0.0.0' }).publicUrl).toBe('http://localhost:4180');
    expect(readEnvironment({ PUBLIC_URL: 'https://Budget.example.org/' }).publicUrl).toBe('https://budget.example.org');
  });

  it.each([
    [{ PORT: '65536' }, 'PORT'],
    [{ PORT: '-1' }, 'PORT'],
    [{ PORT: '1e3' }, 'PORT'],
    [{ PORT: '80.5' }, 'PORT'],
    [{ HOST: 'two words' }, 'HOST'],
    [{ DEMO: 'yes' }, 'DEMO'],
    [{ PUBLIC_URL: 'budget.example.org' }, 'PUBLIC_URL'],
    [{ PUBLIC_URL: 'ftp://budget.example.org' }, 'PUBLIC_URL'],
    [{ PUBLIC_URL: 'https://example.org/budget' }, 'PUBLIC_URL'],
    [{ SESSION_SECRET: 'short' }, 'SESSION_SECRET'],
    [{ SETUP_TOKEN: 'short' }, 'SETUP_TOKEN'],
    [{ LOG_LEVEL: 'verbose' }, 'LOG_LEVEL'],
    [{ SCRYPT_COST: '9' }, 'SCRYPT_COST'],
    [{ SCRYPT_COST: '21' }, 'SCRYPT_COST'],
    [{ SESSION_IDLE_HOURS: '0' }, 'SESSION_IDLE_HOURS'],
    [{ LINK_VALID_HOURS: 'NaN' }, 'LINK_VALID_HOURS'],
    [{ TRUST_PROXY_HOPS: 'true' }, 'TRUST_PROXY_HOPS'],
    [{ RATE_GENERAL_PER_MINUTE: '0' }, 'RATE_GENERAL_PER_MINUTE'],
    [{ RATE_CALCULATIONS_PER_MINUTE: '' + 1e7 }, 'RATE_CALCULATIONS_PER_MINUTE'],
    [{ SIGN_IN_WINDOW_MINUTES: '0' }, 'SIGN_IN_WINDOW_MINUTES'],
    [{ SIGN_IN_FAILURES_PER_ACCOUNT: 'ten' }, 'SIGN_IN_FAILURES_PER_ACCOUNT'],
    [{ SIGN_IN_FAILURES_PER_ADDRESS: '0' }, 'SIGN_IN_FAILURES_PER_ADDRESS'],
  ])('refuses %j in one line that names the variable', (env, name) => {
    const read = () => readEnvironment(env as Record<string, string>);
    expect(read).toThrow(ConfigError);
    expect(read).toThrow(new RegExp(`^${name} must [^\\n]*\\.$`));
  });

  it('does not repeat a secret that it refuses', () => {
    expect(() => readEnvironment({ SESSION_SECRET: 'my-dear-secret' })).toThrow(
      expect.objectContaining({ message: expect.not.stringContaining('my-dear-secret') }),
    );
  });
});

describe('demoRefusal({host, publicUrl})', () => {
  it.each([
    ['127.0.0.1', 'http://127.0.0.1:4180', false],
    ['::1', 'http://[::1]:4180', false],
    ['localhost', 'http://localhost:4180', false],
    ['0.0.0.0', 'http://localhost:4180', true],
    ['192.168.1.2', 'http://localhost:4180', true],
    ['127.0.0.1', 'https://budget.example.org', true],
  ])('for %s under %s refuses: %s', (host, publicUrl, refused) => {
    expect(demoRefusal({ host, publicUrl }) !== null).toBe(refused);
  });

  it('holds for DEMO=on already while the environment is read', () => {
    expect(() => readEnvironment({ DEMO: 'on', HOST: '0.0.0.0' })).toThrow('Demo mode refuses HOST=0.0.0.0');
  });
});

describe('isLoopback(host)', () => {
  it.each(['localhost', '127.0.0.1', '127.8.9.10', '::1', '[::1]'])('accepts %s', (host) => {
    expect(isLoopback(host)).toBe(true);
  });
  it.each(['', '0.0.0.0', '::', '127.0.0.1.example.org', 'localhost.example.org', '10.0.0.1'])('refuses %j', (host) => {
    expect(isLoopback(host)).toBe(false);
  });
});

describe('httpAddress(host, port)', () => {
  it('brackets IPv6', () => {
    expect(httpAddress('::1', 4180)).toBe('http://[::1]:4180');
    expect(httpAddress('127.0.0.1', 4180)).toBe('http://127.0.0.1:4180');
  });
});

import { type ChildProcess, spawn } from 'node:child_process';
import { once } from 'node:events';
import { existsSync, mkdtempSync, rmSync, statSync } from 'node:fs';
import { type IncomingMessage, request as httpRequest } from 'node:http';
import { createServer } from 'node:net';
import type { AddressInfo } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';

/** The compiled server, as it is started in earnest; built before the tests run. */
const MAIN = path.resolve(__dirname, '../dist/main.js');

interface Outcome {
  readonly code: number | null;
  readonly signal: string | null;
  readonly stdout: string;
  readonly stderr: string;
}

describe('the server process', () => {
  let folder: string;
  const running = new Set<ChildProcess>();

  beforeEach(() => {
    folder = mkdtempSync(path.join(tmpdir(), 'bandledger-process-'));
  });
  afterEach(() => {
    for (const child of running) child.kill('SIGKILL');
    running.clear();
    rmSync(folder, { recursive: true, force: true });
  });

  function start(environment: Record<string, string> = {}) {
    expect(existsSync(MAIN)).toBe(true);
    const child = spawn(process.execPath, [MAIN], {
      cwd: folder,
      env: { PATH: process.env.PATH, DATA_DIR: path.join(folder, 'data'), DEMO: 'off', PORT: '0', ...environment },
    });
    running.add(child);
    let stdout = '';
    let stderr = '';
    child.stderr.on('data', (chunk: Buffer) => (stderr += chunk.toString()));
    const ready = new Promise<string>((resolve) => {
      child.stdout.on('data', (chunk: Buffer) => {
        stdout += chunk.toString();
        const address = /^Bandledger is at (\S+)$/m.exec(stdout)?.[1];
        if (address !== undefined) resolve(address);
      });
    });
    const ended = once(child, 'close').then(([code, signal]): Outcome => {
      running.delete(child);
      return { code: code as number | null, signal: signal as string | null, stdout, stderr };
    });
    return { child, ready, ended };
  }

  const oneLine = (text: string) => text.trimEnd().split('\n');

  it('says where it is, serves, and gives everything back soon after Ctrl-C', async () => {
    const { child, ready, ended } = start({ SETUP_TOKEN: 'a-token-for-the-tests' });
    const address = await ready;
    expect((await fetch(`${address}/api/health`)).status).toBe(200);
    const modes = ['bandledger.sqlite', 'sessions.sqlite', 'session-secret'].map(
      (file) => statSync(path.join(folder, 'data', file)).mode & 0o077,
    );
    expect(modes).toEqual([0, 0, 0]);
    const stoppedAt = Date.now();
    child.kill('SIGINT');
    const { code, signal, stdout, stderr } = await ended;
    // Five times the two seconds that are promised: other tests run beside this one.
    expect(Date.now() - stoppedAt).toBeLessThan(10_000);
    expect({ code, signal, stderr }).toEqual({ code: 0, signal: null, stderr: '' });
    expect(oneLine(stdout)).toEqual([`Bandledger is at ${address}`]);
    expect(existsSync(path.join(folder, 'data', 'server.pid'))).toBe(false);
    expect(existsSync(path.join(folder, 'data', 'bandledger.sqlite-wal'))).toBe(false);
  });

  it('stops on SIGTERM although a client keeps its connection open', async () => {
    const { child, ready, ended } = start();
    const response = await fetch(`${await ready}/api/health`, { headers: { Connection: 'keep-alive' } });
    expect(response.status).toBe(200);
    child.kill('SIGTERM');
    expect(await ended).toMatchObject({ code: 0, signal: null });
  });

  it('answers a request that is under way before it stops', async () => {
    const { child, ready, ended } = start();
    const url = `${await ready}/api/session`;
    const headers = { 'Content-Type': 'application/json', 'X-Requested-With': 'bandledger', Expect: '100-continue' };
    const request = httpRequest(url, { method: 'POST', headers });
    const answered = once(request, 'response') as Promise<[IncomingMessage]>;
    request.flushHeaders();
    await once(request, 'continue');
    child.kill('SIGTERM');
    const stillListening = () =>
      fetch(url).then(
        () => true,
        () => false,
      );
    while (await stillListening());
    request.end('{}');
    const [response] = await answered;
    expect(response.resume().statusCode).toBe(422);
    expect(await ended).toMatchObject({ code: 0, signal: null, stderr: '' });
  });

  it('prints the set-up token once for a team without people, and it opens the set-up', async () => {
    const { child, ready, ended } = start({ SCRYPT_COST: '10' });
    const address = await ready;
    child.kill('SIGTERM');
    const { stdout } = await ended;
    const [tokenLine, addressLine] = oneLine(stdout);
    expect(tokenLine).toMatch(/: [\w-]{24}$/);
    expect(addressLine).toBe(`Bandledger is at ${address}`);
  });

  it('lets a second server wait outside with one line and exit code 1', async () => {
    const first = start();
    await first.ready;
    const { code, stdout, stderr } = await start().ended;
    expect({ code, stdout }).toEqual({ code: 1, stdout: '' });
    expect(oneLine(stderr)).toEqual([expect.stringContaining('is in use by another Bandledger server')]);
    first.child.kill('SIGTERM');
    expect((await first.ended).code).toBe(0);
  });

  it('takes the folder of a server that was killed', async () => {
    const first = start();
    await first.ready;
    first.child.kill('SIGKILL');
    await first.ended;
    const second = start();
    await second.ready;
    second.child.kill('SIGTERM');
    expect((await second.ended).code).toBe(0);
  });

  it('says in one line that the port is taken', async () => {
    const other = createServer().listen(0, '127.0.0.1');
    await once(other, 'listening');
    const { port } = other.address() as AddressInfo;
    const { code, stderr } = await start({ PORT: String(port) }).ended;
    other.close();
    expect(code).toBe(1);
    expect(oneLine(stderr)).toEqual([expect.stringContaining(`Port ${port} on 127.0.0.1 is in use already`)]);
  });

  it.each([
    [{ PORT: 'http' }, 'PORT must be a whole number from 0 to 65535, not "http".'],
    [{ DEMO: 'maybe' }, 'DEMO must be one of auto, on, off, not "maybe".'],
    [{ DEMO: 'on', HOST: '0.0.0.0' }, 'Demo mode refuses HOST=0.0.0.0'],
    [{ DATA_DIR: '/proc/none/data' }, 'The data folder /proc/none/data cannot be made'],
    [{ HOST: '203.0.113.1' }, 'HOST=203.0.113.1 is no address of this machine.'],
  ])('says in one line what is wrong with %j', async (environment, message) => {
    const { code, stdout, stderr } = await start(environment as Record<string, string>).ended;
    expect({ code, stdout: stdout.includes('Bandledger is at') }).toEqual({ code: 1, stdout: false });
    expect(oneLine(stderr)).toEqual([expect.stringContaining(message)]);
  });
});

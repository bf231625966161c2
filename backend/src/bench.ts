import 'reflect-metadata';
import { mkdtempSync, rmSync } from 'node:fs';
import type { AddressInfo, Server } from 'node:net';
import { tmpdir } from 'node:os';
import path from 'node:path';
import {
  BenchClient,
  type Measured,
  measureEngine,
  measurePicker,
  measurePreview,
  measureSave,
} from './bench-measures';
import { bootApp } from './boot';
import { readEnvironment } from './config/environment';

/** The measurements that need a running server, on a demo of their own. */
async function measureServer(): Promise<Measured[]> {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'bandledger-bench-'));
  const booted = await bootApp(
    readEnvironment({
      DATA_DIR: dataDir,
      DEMO: 'on',
      LOG_LEVEL: 'error',
      SCRYPT_COST: '10',
      RATE_GENERAL_PER_MINUTE: '100000',
    }),
  );
  try {
    await booted.app.listen(0, '127.0.0.1');
    const { port } = (booted.app.getHttpServer() as Server).address() as AddressInfo;
    const client = new BenchClient(`http://127.0.0.1:${port}`);
    await client.signInAsDemoDesigner();
    return [await measurePreview(client), await measureSave(client), await measurePicker(client)];
  } finally {
    await booted.close();
    rmSync(dataDir, { recursive: true, force: true });
  }
}

/** Prints the measurements as one line of JSON, for `npm run bench`. */
async function main(): Promise<void> {
  const measured = [...(await measureEngine()), ...(await measureServer())];
  process.stdout.write(`${JSON.stringify(measured)}\n`);
  process.exit(0);
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.stack : String(error)}\n`);
  process.exit(1);
});

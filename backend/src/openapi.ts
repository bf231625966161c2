import 'reflect-metadata';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import path from 'node:path';
import { bootApp } from './boot';
import { readEnvironment } from './config/environment';
import { createApiDocument } from './api-document';

/** Writes backend/openapi.json (or the file named) from the running application, in an empty folder of its own. */
async function main(): Promise<void> {
  const dataDir = mkdtempSync(path.join(tmpdir(), 'bandledger-openapi-'));
  try {
    const booted = await bootApp(readEnvironment({ DATA_DIR: dataDir, DEMO: 'off', LOG_LEVEL: 'error' }));
    const document = createApiDocument(booted.app);
    await booted.close();
    writeFileSync(
      process.argv[2] ?? path.resolve(__dirname, '../openapi.json'),
      `${JSON.stringify(document, null, 2)}\n`,
    );
  } finally {
    rmSync(dataDir, { recursive: true, force: true });
  }
}

main().catch((error: unknown) => {
  process.stderr.write(`${error instanceof Error ? error.stack : String(error)}\n`);
  process.exit(1);
});

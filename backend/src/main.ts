import 'reflect-metadata';
import type { AddressInfo, Server } from 'node:net';
import { bootApp, type BootedApp } from './boot';
import { type AppConfig, ConfigError, httpAddress, readProcessEnvironment } from './config/environment';
import { StartError } from './database/start-error';
import { AccountsService } from './users/accounts.service';

/** A stop that hangs (a client that will not let go) ends anyway after this long. */
const STOP_WITHIN_MS = 1800;

function explainListenError(error: NodeJS.ErrnoException, { host, port }: AppConfig): Error {
  if (error.code === 'EADDRINUSE') {
    return new StartError(`Port ${port} on ${host} is in use already; stop the other program or set PORT.`);
  }
  if (error.code === 'EACCES')
    return new StartError(`Port ${port} may not be opened by this user; set PORT above 1023.`);
  if (error.code === 'EADDRNOTAVAIL' || error.code === 'ENOTFOUND') {
    return new StartError(`HOST=${host} is no address of this machine.`);
  }
  return error;
}

/** On the socket itself: Nest's own listen would log the error a second time, in its own words. */
async function listen({ app }: BootedApp, config: AppConfig): Promise<number> {
  const server = app.getHttpServer() as Server;
  await new Promise<void>((resolve, reject) => {
    server.once('error', (error) => reject(explainListenError(error, config)));
    server.listen(config.port, config.host, resolve);
  });
  return (server.address() as AddressInfo).port;
}

function stopOnSignal(booted: BootedApp): void {
  let stopping = false;
  const stop = (): void => {
    if (stopping) return;
    stopping = true;
    setTimeout(() => process.exit(0), STOP_WITHIN_MS).unref();
    booted.close().then(
      () => process.exit(0),
      (error: unknown) => fail(error),
    );
  };
  process.on('SIGINT', stop);
  process.on('SIGTERM', stop);
}

function fail(error: unknown): never {
  const expected = error instanceof ConfigError || error instanceof StartError;
  process.stderr.write(`${expected ? error.message : error instanceof Error ? error.stack : String(error)}\n`);
  process.exit(1);
}

async function main(): Promise<void> {
  // Password hashes and session data are for the user that runs the server alone.
  process.umask(0o077);
  const config = readProcessEnvironment();
  const booted = await bootApp(config);
  stopOnSignal(booted);
  try {
    const port = await listen(booted, config);
    const { setupToken } = booted.runtime;
    if (setupToken !== null && config.setupToken === null && !(await booted.app.get(AccountsService).exist())) {
      process.stdout.write(`Set-up token for the first administrator, good until it is used: ${setupToken}\n`);
    }
    process.stdout.write(`Bandledger is at ${config.port === 0 ? httpAddress(config.host, port) : config.publicUrl}\n`);
  } catch (error) {
    await booted.close();
    throw error;
  }
}

main().catch(fail);

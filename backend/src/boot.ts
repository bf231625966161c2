import { randomBytes } from 'node:crypto';
import type { Server } from 'node:http';
import type { LogLevel as NestLogLevel } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module';
import type { AppConfig, LogLevel } from './config/environment';
import { Runtime } from './config/runtime';
import { configureApp } from './configure-app';
import { databaseFile, prepareDataFolder, sessionSecretOf } from './database/data-folder';
import { seedDemo } from './database/demo/seed-demo';
import { settleDataKind } from './database/data-kind';
import { migrateDatabase } from './database/migrator';
import { acquireServerLock, type ServerLock } from './database/server-lock';
import { AccountsService } from './users/accounts.service';

/** After this long a stop no longer waits for requests. */
const REQUESTS_MAY_TAKE_MS = 1000;

const NEST_LEVELS: Readonly<Record<LogLevel, NestLogLevel[]>> = {
  error: ['fatal', 'error'],
  warn: ['fatal', 'error', 'warn'],
  info: ['fatal', 'error', 'warn', 'log'],
  debug: ['fatal', 'error', 'warn', 'log', 'debug'],
};

export interface BootedApp {
  readonly app: NestExpressApplication;
  readonly runtime: Runtime;
  /** Stops serving, closes the databases and gives the data folder free. */
  close(): Promise<void>;
}

async function createRuntime(config: AppConfig): Promise<Runtime> {
  const file = databaseFile(config.dataDir);
  await migrateDatabase(file);
  const demo = (await settleDataKind(file, config)) === 'demo';
  const setupToken = demo ? null : (config.setupToken ?? randomBytes(18).toString('base64url'));
  return new Runtime(config, sessionSecretOf(config.dataDir, config.sessionSecret), demo, setupToken);
}

/** Requests under way may end; a client that does not let go is cut off. Then the databases and the folder are free. */
async function closeApp(app: NestExpressApplication, lock: ServerLock): Promise<void> {
  const server = app.getHttpServer() as Server;
  const cutOff = setTimeout(() => server.closeAllConnections(), REQUESTS_MAY_TAKE_MS);
  await app.close();
  clearTimeout(cutOff);
  await lock.release();
}

/** Takes the data folder, brings its database up to date and builds the application, ready to listen. */
export async function bootApp(config: AppConfig): Promise<BootedApp> {
  prepareDataFolder(config.dataDir);
  const lock = await acquireServerLock(config.dataDir);
  try {
    const runtime = await createRuntime(config);
    const app = await NestFactory.create<NestExpressApplication>(AppModule.register(runtime), {
      bodyParser: false,
      abortOnError: false,
      logger: NEST_LEVELS[config.logLevel],
    });
    configureApp(app);
    await app.init();
    if (runtime.demo && !(await app.get(AccountsService, { strict: false }).exist())) await seedDemo(app);
    return { app, runtime, close: () => closeApp(app, lock) };
  } catch (error) {
    await lock.release();
    throw error;
  }
}

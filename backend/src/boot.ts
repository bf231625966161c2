import { randomBytes } from 'node:crypto';
import type { LogLevel as NestLogLevel } from '@nestjs/common';
import { NestFactory } from '@nestjs/core';
import type { NestExpressApplication } from '@nestjs/platform-express';
import { AppModule } from './app.module';
import type { AppConfig, LogLevel } from './config/environment';
import { Runtime } from './config/runtime';
import { configureApp } from './configure-app';
import { databaseFile, prepareDataFolder, sessionSecretOf } from './database/data-folder';
import { settleDataKind } from './database/data-kind';
import { migrateDatabase } from './database/migrator';
import { acquireServerLock } from './database/server-lock';
import { WriteQueue } from './database/write-queue';

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

/** Takes the data folder, brings its database up to date and builds the application, ready to listen. */
export async function bootApp(config: AppConfig): Promise<BootedApp> {
  prepareDataFolder(config.dataDir);
  const lock = await acquireServerLock(config.dataDir);
  try {
    const runtime = await createRuntime(config);
    const app = await NestFactory.create<NestExpressApplication>(AppModule.register(runtime), {
      bodyParser: false,
      abortOnError: false,
      forceCloseConnections: true,
      logger: NEST_LEVELS[config.logLevel],
    });
    configureApp(app);
    await app.init();
    const close = async (): Promise<void> => {
      await app.get(WriteQueue).idle();
      await app.close();
      await lock.release();
    };
    return { app, runtime, close };
  } catch (error) {
    await lock.release();
    throw error;
  }
}

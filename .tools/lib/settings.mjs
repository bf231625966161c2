// The few settings that the launcher needs before the server can read them itself.
import { existsSync, readFileSync } from 'node:fs';
import { parseEnv } from 'node:util';
import { LaunchError } from './launch-error.mjs';
import { fromRoot } from './paths.mjs';

const DEFAULTS = { PORT: '4180', HOST: '127.0.0.1', DATA_DIR: 'data' };

/** The environment wins over .env; an empty value counts as not set. */
export function readSettings(environment = process.env, file = fromRoot('.env')) {
  const fromFile = existsSync(file) ? parseEnv(readFileSync(file, 'utf8')) : {};
  const valueOf = (name) => environment[name]?.trim() || fromFile[name]?.trim() || DEFAULTS[name];
  const port = Number(valueOf('PORT'));
  if (!Number.isInteger(port) || port < 0 || port > 65535) {
    throw new LaunchError(`PORT is "${valueOf('PORT')}"; it must be a whole number from 1 to 65535`);
  }
  return { port, host: valueOf('HOST'), dataFolder: fromRoot(valueOf('DATA_DIR')) };
}

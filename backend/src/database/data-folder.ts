import { randomBytes } from 'node:crypto';
import {
  accessSync,
  chmodSync,
  constants,
  existsSync,
  mkdirSync,
  readFileSync,
  statSync,
  writeFileSync,
} from 'node:fs';
import path from 'node:path';
import { StartError } from './start-error';

export const databaseFile = (dataDir: string) => path.join(dataDir, 'bandledger.sqlite');
export const sessionsFile = (dataDir: string) => path.join(dataDir, 'sessions.sqlite');

/** The files that a server must be able to write; one left by root makes it fail with a riddle much later. */
const WRITTEN_FILES = ['bandledger.sqlite', 'sessions.sqlite', 'session-secret', 'server.lock', 'server.pid'];

function assertWritable(file: string): void {
  try {
    accessSync(file, constants.R_OK | constants.W_OK);
  } catch {
    throw new StartError(`${file} cannot be written by this user; give it to the user that runs Bandledger.`);
  }
}

/** Folder by folder: Node's own `recursive` never comes back from a place like /proc, where nothing can be made. */
function makeFolder(folder: string): void {
  if (existsSync(folder)) {
    if (!statSync(folder).isDirectory()) throw new Error(`${folder} is no folder`);
    return;
  }
  makeFolder(path.dirname(folder));
  mkdirSync(folder, { mode: 0o700 });
}

/** Makes the data folder if need be and checks that everything in it can be written. */
export function prepareDataFolder(dataDir: string): void {
  try {
    makeFolder(dataDir);
  } catch {
    throw new StartError(`The data folder ${dataDir} cannot be made; check DATA_DIR and who owns its parent folder.`);
  }
  assertWritable(dataDir);
  for (const name of WRITTEN_FILES) {
    const file = path.join(dataDir, name);
    if (existsSync(file)) assertWritable(file);
  }
}

/** The given secret, else the data folder's own: random, made once, readable by its owner only. */
export function sessionSecretOf(dataDir: string, given: string | null): string {
  if (given !== null) return given;
  const file = path.join(dataDir, 'session-secret');
  if (!existsSync(file)) writeFileSync(file, `${randomBytes(32).toString('base64url')}\n`, { mode: 0o600, flag: 'wx' });
  chmodSync(file, 0o600);
  const secret = readFileSync(file, 'utf8').trim();
  if (secret.length < 32)
    throw new StartError(`${file} is damaged; delete it to have a new one made (all sign in anew).`);
  return secret;
}

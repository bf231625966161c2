import { createHash } from 'node:crypto';
import { existsSync, readdirSync, readFileSync, statSync, writeFileSync } from 'node:fs';
import { join, relative, sep } from 'node:path';

const NEVER = new Set(['node_modules', 'dist', 'data', 'coverage', '.cache']);

function* filesUnder(path) {
  if (!existsSync(path)) return;
  if (!statSync(path).isDirectory()) {
    yield path;
    return;
  }
  for (const entry of readdirSync(path, { withFileTypes: true })) {
    if (!NEVER.has(entry.name)) yield* filesUnder(join(path, entry.name));
  }
}

/** SHA-256 over names and contents of the given files and folders: the same content gives the same hash anywhere. */
export function contentHash(root, paths, salt = '') {
  const hash = createHash('sha256').update(salt);
  const files = paths.flatMap((path) => [...filesUnder(join(root, path))]);
  for (const file of files.map((name) => relative(root, name).split(sep).join('/')).sort()) {
    const content = readFileSync(join(root, file));
    hash.update(`\0${file}\0${content.length}\0`).update(content);
  }
  return hash.digest('hex');
}

/** The hash that was written after the last success, or null. */
export const readStamp = (file) => (existsSync(file) ? readFileSync(file, 'utf8').trim() : null);
export const writeStamp = (file, hash) => writeFileSync(file, `${hash}\n`);

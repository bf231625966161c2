import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';

export const ENTRY_LIMIT_KB = 260;

/** Scripts that index.html asks for at once: the entry and what is preloaded beside it. */
export function entryScripts(html) {
  const scripts = [
    ...html.matchAll(/<script[^>]*\ssrc="([^"]+\.js)"/g),
    ...html.matchAll(/<link[^>]*rel="modulepreload"[^>]*href="([^"]+\.js)"/g),
  ];
  return scripts.map(([, path]) => path.replace(/^\//, ''));
}

/** What a browser loads before the first screen, compressed, in kB of 1000 bytes. */
export function entryBundleKb(distFolder) {
  const scripts = entryScripts(readFileSync(join(distFolder, 'index.html'), 'utf8'));
  if (scripts.length === 0) throw new Error(`${distFolder}/index.html names no script`);
  const bytes = scripts.map((path) => gzipSync(readFileSync(join(distFolder, path))).length);
  return bytes.reduce((sum, size) => sum + size, 0) / 1000;
}

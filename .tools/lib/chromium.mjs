import { existsSync } from 'node:fs';
import { findExecutable } from './checks.mjs';
import { run } from './process.mjs';

const NAMES = ['chromium', 'chromium-browser', 'google-chrome', 'google-chrome-stable'];
const PACKAGES = ['chromium', 'fonts-dejavu-core'];

const mayInstall = (env) =>
  process.getuid?.() === 0 &&
  env.NO_SYSTEM_INSTALL !== '1' &&
  existsSync('/etc/debian_version') &&
  findExecutable(['apt-get'], env.PATH ?? '') !== null;

/** Where Chromium is: { path } or { problem }. Installs Debian's as root, after saying so, unless that is forbidden. */
export async function findChromium(say, env = process.env) {
  if (env.CHROMIUM_PATH) {
    if (existsSync(env.CHROMIUM_PATH)) return { path: env.CHROMIUM_PATH };
    return { problem: `CHROMIUM_PATH is ${env.CHROMIUM_PATH}, and nothing is there` };
  }
  const found = findExecutable(NAMES, env.PATH ?? '');
  if (found) return { path: found };
  const command = `apt-get update && apt-get install -y --no-install-recommends ${PACKAGES.join(' ')}`;
  if (!mayInstall(env))
    return { problem: `the browser journeys need Chromium; as root: ${command} (or set CHROMIUM_PATH)` };
  say(`Chromium is missing; installing Debian's (NO_SYSTEM_INSTALL=1 forbids it): ${command}`);
  const result = await run('sh', ['-c', command], {
    env: { ...env, DEBIAN_FRONTEND: 'noninteractive' },
    timeoutMs: 600_000,
  });
  const installed = findExecutable(NAMES, env.PATH ?? '');
  return installed
    ? { path: installed }
    : { problem: `Chromium could not be installed:\n${result.output.slice(-2000)}` };
}

// Brings dependencies and builds up to date; decides by content what has to be done again.
import { existsSync, readFileSync, rmSync } from 'node:fs';
import { dirname, join } from 'node:path';
import { contentHash, readStamp, writeStamp } from './content-hash.mjs';
import { compilerProblem, folderProblem, nodeProblem } from './checks.mjs';
import { LaunchError } from './launch-error.mjs';
import { fromRoot, root } from './paths.mjs';
import { npmCommand, run } from './process.mjs';

const INSTALL_INPUTS = [
  'package.json',
  'package-lock.json',
  '.npmrc',
  'backend/package.json',
  'frontend/package.json',
  'e2e/package.json',
];
const BUILD_COMMON = ['tsconfig.base.json', 'package-lock.json'];
const SQLITE_BINDING = 'node_modules/sqlite3/build/Release/node_sqlite3.node';

const builds = {
  backend: ['backend/src', 'backend/package.json', 'backend/tsconfig.json', 'backend/tsconfig.build.json'],
  frontend: [
    'frontend/src',
    'frontend/public',
    'frontend/index.html',
    'frontend/package.json',
    'frontend/tsconfig.json',
    'frontend/vite.config.ts',
  ],
};

const insist = (problem) => {
  if (problem) throw new LaunchError(problem);
};

const readJson = (file) => JSON.parse(readFileSync(file, 'utf8'));

export function checkNode() {
  const { engines } = readJson(fromRoot('package.json'));
  insist(nodeProblem(process.version, engines.node, readFileSync(fromRoot('.nvmrc'), 'utf8').trim()));
}

export function checkFolders(dataFolder) {
  const folders = ['node_modules', '.cache', 'backend/dist', 'frontend/dist'].map((name) => fromRoot(name));
  for (const folder of [...folders, dataFolder].filter(Boolean)) insist(folderProblem(folder));
}

/** True when what npm recorded as installed is what the lock file asks for, however it came there. */
function matchesLock() {
  const installed = fromRoot('node_modules/.package-lock.json');
  if (!existsSync(installed)) return false;
  const have = readJson(installed).packages;
  return Object.entries(readJson(fromRoot('package-lock.json')).packages).every(
    ([path, wanted]) =>
      !path.includes('node_modules/') || wanted.optional || wanted.link || have[path]?.version === wanted.version,
  );
}

const INSTALL_STAMP = fromRoot('node_modules/.bandledger-install');

/** A compiled dependency belongs to one platform. */
export const installHash = (folder = root) => contentHash(folder, INSTALL_INPUTS, process.platform + process.arch);

export function needsInstall() {
  if (!existsSync(fromRoot(SQLITE_BINDING))) return true;
  const hash = installHash();
  if (readStamp(INSTALL_STAMP) === hash) return false;
  if (!matchesLock()) return true;
  writeStamp(INSTALL_STAMP, hash);
  return false;
}

/** node-gyp takes the headers that came with Node.js, where they did, instead of fetching them. */
function installEnvironment() {
  const prefix = dirname(dirname(process.execPath));
  const env = { ...process.env, NODE_ENV: 'development' };
  if (existsSync(join(prefix, 'include/node/node.h')) && !env.npm_config_nodedir) env.npm_config_nodedir = prefix;
  return env;
}

export async function install(say) {
  if (!needsInstall()) return false;
  insist(compilerProblem(process.env.PATH ?? ''));
  say('installing dependencies (two to four minutes, once)');
  const result = await run(...npmCommand(['ci', '--no-audit', '--no-fund', '--include=dev']), {
    env: installEnvironment(),
  });
  if (result.code !== 0) {
    process.stderr.write(`${result.output.trimEnd()}\n`);
    throw new LaunchError(`npm ci failed with code ${result.code}; its output stands above`);
  }
  if (!existsSync(fromRoot(SQLITE_BINDING))) {
    // Some npm settings skip install scripts; sqlite3 is useless without its own.
    const rebuilt = await run(...npmCommand(['rebuild', 'sqlite3', '--ignore-scripts=false']), {
      env: installEnvironment(),
    });
    if (rebuilt.code !== 0 || !existsSync(fromRoot(SQLITE_BINDING))) {
      process.stderr.write(`${rebuilt.output.trimEnd()}\n`);
      throw new LaunchError('sqlite3 could not be compiled; the compiler output stands above');
    }
  }
  writeStamp(INSTALL_STAMP, installHash());
  return true;
}

const stampOf = (workspace) => fromRoot(workspace, 'dist/.build-hash');
export const buildHash = (workspace, folder = root) => contentHash(folder, [...BUILD_COMMON, ...builds[workspace]]);

/** Builds one workspace unless its dist stands for exactly this source. Answers the command's result or null. */
export async function build(workspace, say) {
  const hash = buildHash(workspace);
  if (readStamp(stampOf(workspace)) === hash) return null;
  say(`building the ${workspace}`);
  rmSync(fromRoot(workspace, 'dist'), { recursive: true, force: true });
  const result = await run(...npmCommand(['run', 'build', '--silent', '-w', workspace]));
  if (result.code === 0) writeStamp(stampOf(workspace), hash);
  return result;
}

export async function buildAll(say) {
  const results = await Promise.all(
    Object.keys(builds).map(async (workspace) => [workspace, await build(workspace, say)]),
  );
  for (const [workspace, result] of results) {
    if (!result || result.code === 0) continue;
    process.stderr.write(`${result.output.trimEnd()}\n`);
    throw new LaunchError(`the ${workspace} does not build; the messages stand above`);
  }
}

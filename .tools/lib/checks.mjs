// What must hold before anything is installed, built or started. Each check answers with one line or with null.
import { accessSync, constants, existsSync, statSync } from 'node:fs';
import { createServer } from 'node:net';
import { delimiter, dirname, join } from 'node:path';

const numbers = (version) =>
  version
    .replace(/^v/, '')
    .split('.')
    .map((part) => Number.parseInt(part, 10));

const isBefore = (left, right) => {
  for (let index = 0; index < 3; index += 1) {
    const difference = (left[index] ?? 0) - (right[index] ?? 0);
    if (difference !== 0) return difference < 0;
  }
  return false;
};

/** `range` as in package.json: ">=20.19 <21". */
export function nodeProblem(version, range, wanted) {
  const [, least, below] = /^>=(\S+) <(\S+)$/.exec(range) ?? [];
  if (!least) return `package.json: engines.node is "${range}", expected ">=… <…"`;
  const own = numbers(version);
  if (!isBefore(own, numbers(least)) && isBefore(own, numbers(below))) return null;
  return `this is Node.js ${version.replace(/^v/, '')}; Bandledger needs ${wanted} (any ${range} will do)`;
}

const isExecutable = (file) => {
  try {
    accessSync(file, constants.X_OK);
    return statSync(file).isFile();
  } catch {
    return false;
  }
};

export const findExecutable = (names, path) =>
  path
    .split(delimiter)
    .filter(Boolean)
    .flatMap((folder) => names.map((name) => join(folder, name)))
    .find(isExecutable) ?? null;

export function compilerProblem(path) {
  const missing = ['g++', 'make', 'python3'].filter((tool) => !findExecutable([tool], path));
  if (missing.length === 0) return null;
  return `sqlite3 is compiled during installation and ${missing.join(', ')} ${missing.length > 1 ? 'are' : 'is'} missing; on Debian, as root: apt-get install g++ make python3`;
}

const ownerName = (uid) => (uid === 0 ? 'root' : `user ${uid}`);

/** A folder that is to be written, or (when it does not exist yet) the one that it will be made in. */
export function folderProblem(folder) {
  const existing = existsSync(folder) ? folder : dirname(folder);
  if (!existsSync(existing)) return existing === dirname(existing) ? null : folderProblem(existing);
  const status = statSync(existing);
  if (!status.isDirectory()) return `${existing} is in the way: a folder is expected there`;
  try {
    accessSync(existing, constants.W_OK | constants.X_OK);
    return null;
  } catch {
    const owner = ownerName(status.uid);
    return `${existing} cannot be written: it belongs to ${owner}; give it to yourself (chown -R) or remove it as ${owner}`;
  }
}

export function portProblem(port, host) {
  return new Promise((resolve) => {
    const server = createServer();
    server.once('error', (error) => resolve(describePortError(error, port, host)));
    server.listen({ port, host }, () => server.close(() => resolve(null)));
  });
}

function describePortError(error, port, host) {
  if (error.code === 'EADDRINUSE')
    return `port ${port} on ${host} is busy; stop what uses it or start with another: PORT=${port + 1} npm start`;
  if (error.code === 'EACCES') return `port ${port} needs special rights; start with another: PORT=4180 npm start`;
  return `cannot listen on ${host}:${port} (${error.code})`;
}

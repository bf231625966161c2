// A copy of the launcher in a tree of its own, in which everything is installed and built already and `server` stands
// for the built application.
import { spawn } from 'node:child_process';
import { cpSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { writeStamp } from '../lib/content-hash.mjs';
import { fromRoot } from '../lib/paths.mjs';
import { buildHash, installHash } from '../lib/prepare.mjs';

const BUILD_SCRIPT = `
const { mkdirSync, writeFileSync } = require('node:fs');
mkdirSync('dist', { recursive: true });
writeFileSync('dist/main.js', 'console.log("rebuilt")');
`;

export function createReadyTree(server) {
  const tree = mkdtempSync(join(tmpdir(), 'bandledger-start-'));
  const write = (path, text) => {
    mkdirSync(join(tree, path, '..'), { recursive: true });
    writeFileSync(join(tree, path), text);
  };
  for (const name of ['lib', 'start.mjs', 'test.mjs'])
    cpSync(fromRoot('.tools', name), join(tree, '.tools', name), { recursive: true });
  for (const name of ['.nvmrc', 'package.json', 'package-lock.json']) cpSync(fromRoot(name), join(tree, name));
  for (const workspace of ['backend', 'frontend', 'e2e']) {
    write(
      `${workspace}/package.json`,
      JSON.stringify({ name: workspace, version: '1.0.0', scripts: { build: 'node build.cjs' } }),
    );
    write(`${workspace}/build.cjs`, BUILD_SCRIPT);
    write(`${workspace}/src/a.ts`, 'one');
  }
  write('node_modules/sqlite3/build/Release/node_sqlite3.node', '');
  write('node_modules/.keep', '');
  write('backend/dist/main.js', server);
  write('frontend/dist/index.html', '');
  writeStamp(join(tree, 'node_modules/.bandledger-install'), installHash(tree));
  for (const workspace of ['backend', 'frontend'])
    writeStamp(join(tree, workspace, 'dist/.build-hash'), buildHash(workspace, tree));
  return { tree, write, remove: () => rmSync(tree, { recursive: true, force: true }) };
}

/** Runs one of the tree's launchers; `onOutput(child, soFar)` may act while it runs. Answers { code, output }. */
export function runLauncher(tree, name, env = {}, onOutput = () => {}) {
  return new Promise((resolve) => {
    const clean = { PATH: process.env.PATH, HOME: process.env.HOME };
    const child = spawn(process.execPath, [join(tree, '.tools', name)], { env: { ...clean, PORT: '0', ...env } });
    let output = '';
    const collect = (chunk) => {
      output += chunk;
      onOutput(child, output);
    };
    child.stdout.setEncoding('utf8').on('data', collect);
    child.stderr.setEncoding('utf8').on('data', collect);
    child.on('close', (code) => resolve({ code, output }));
  });
}

export function occupyPort() {
  const server = createServer();
  return new Promise((resolve) => {
    server.listen(0, '127.0.0.1', () => resolve({ port: server.address().port, free: () => server.close() }));
  });
}

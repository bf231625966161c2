import assert from 'node:assert/strict';
import { spawnSync } from 'node:child_process';
import { chmodSync, mkdirSync, mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { createServer } from 'node:net';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { after, before, describe, it } from 'node:test';
import { compilerProblem, findExecutable, folderProblem, nodeProblem, portProblem } from '../lib/checks.mjs';

const NOBODY = 65534;
let folder;
before(() => {
  folder = mkdtempSync(join(tmpdir(), 'bandledger-checks-'));
  chmodSync(folder, 0o755);
});
after(() => rmSync(folder, { recursive: true, force: true }));

const tool = (directory, name) => {
  mkdirSync(directory, { recursive: true });
  writeFileSync(join(directory, name), '#!/bin/sh\n', { mode: 0o755 });
};

describe('Node.js version', () => {
  const problem = (version) => nodeProblem(version, '>=20.19 <21', '20.20.2');
  it('accepts the range of package.json', () => {
    for (const version of ['v20.19.0', 'v20.20.2', '20.99.1']) assert.equal(problem(version), null, version);
  });
  it('names both versions on one line when it is older or newer', () => {
    for (const version of ['v18.20.4', 'v20.18.9', 'v21.0.0', 'v22.11.0', 'v24.1.0']) {
      assert.match(problem(version), /^this is Node\.js [\d.]+; Bandledger needs 20\.20\.2 [^\n]*$/, version);
    }
  });
  it('refuses a range that it cannot read', () => {
    assert.match(nodeProblem('v20.20.2', '^20', '20'), /engines\.node/);
  });
});

describe('compiler', () => {
  it('names what is missing', () => {
    const path = join(folder, 'half');
    tool(path, 'make');
    assert.match(compilerProblem(path), /g\+\+, python3 are missing; on Debian, as root: apt-get install/);
    tool(path, 'g++');
    assert.match(compilerProblem(path), / python3 is missing/);
  });
  it('is content with all three', () => {
    const path = join(folder, 'whole');
    for (const name of ['g++', 'make', 'python3']) tool(path, name);
    assert.equal(compilerProblem(`/nowhere:${path}`), null);
  });
  it('does not take a file that cannot be run, or a folder', () => {
    const path = join(folder, 'plain');
    mkdirSync(join(path, 'make'), { recursive: true });
    writeFileSync(join(path, 'g++'), '');
    assert.equal(findExecutable(['g++', 'make'], path), null);
  });
});

describe('folders', () => {
  it('accepts one that can be written, or made', () => {
    assert.equal(folderProblem(folder), null);
    assert.equal(folderProblem(join(folder, 'new/deep/down')), null);
  });
  it('says when a file is in the way', () => {
    const file = join(folder, 'file');
    writeFileSync(file, '');
    assert.match(folderProblem(file), /in the way/);
  });
  it('names the owner of one that cannot be written', () => {
    const locked = join(folder, 'locked');
    mkdirSync(locked, { mode: 0o555 });
    // Root may write everywhere: then the question is asked as another user.
    const asUser = process.getuid() === 0 ? { uid: NOBODY, gid: NOBODY } : {};
    const code = `import(${JSON.stringify(join(import.meta.dirname, '../lib/checks.mjs'))}).then((checks) => console.log(checks.folderProblem(${JSON.stringify(join(locked, 'dist'))})))`;
    const { stdout, stderr } = spawnSync(process.execPath, ['-e', code], { encoding: 'utf8', ...asUser });
    const owner = process.getuid() === 0 ? 'root' : `user ${process.getuid()}`;
    assert.equal(
      stdout.trim(),
      `${locked} cannot be written: it belongs to ${owner}; give it to yourself (chown -R) or remove it as ${owner}`,
      stderr,
    );
  });
});

describe('port', () => {
  it('says how to go on when it is busy', async () => {
    const server = createServer();
    await new Promise((resolve) => server.listen(0, '127.0.0.1', resolve));
    const { port } = server.address();
    assert.equal(
      await portProblem(port, '127.0.0.1'),
      `port ${port} on 127.0.0.1 is busy; stop what uses it or start with another: PORT=${port + 1} npm start`,
    );
    await new Promise((resolve) => server.close(resolve));
    assert.equal(await portProblem(port, '127.0.0.1'), null);
  });
});

import assert from 'node:assert/strict';
import { mkdirSync, rmSync } from 'node:fs';
import { join } from 'node:path';
import { afterEach, describe, it } from 'node:test';
import { createReadyTree, occupyPort, runLauncher } from './ready-tree.mjs';

const SERVER = `
let interrupts = 0;
const open = setInterval(() => {}, 1000);
process.on('SIGINT', () => {
  interrupts += 1;
  setImmediate(() => { console.log('interrupts: ' + interrupts); clearInterval(open); });
});
console.log('listening');
`;

let ready;
afterEach(() => ready.remove());
const oneLine = (output) => assert.match(output, /^Bandledger: [^\n]+\n$/);

describe('npm start', () => {
  it('starts what is built within five seconds and ends cleanly on Ctrl-C, which npm sends once more', async () => {
    ready = createReadyTree(SERVER);
    const startedAt = Date.now();
    let listeningAfterMs = Infinity;
    const { code, output } = await runLauncher(ready.tree, 'start.mjs', {}, (child, soFar) => {
      if (!/listening\n$/.test(soFar)) return;
      listeningAfterMs = Date.now() - startedAt;
      child.kill('SIGINT');
      child.kill('SIGINT');
    });
    assert.equal(output, 'listening\ninterrupts: 1\n');
    assert.equal(code, 0);
    assert.ok(listeningAfterMs < 5000, `${listeningAfterMs} ms`);
  });

  it('builds again exactly what changed', async () => {
    ready = createReadyTree('console.log("old")');
    ready.write('backend/src/a.ts', 'two');
    const { code, output } = await runLauncher(ready.tree, 'start.mjs');
    assert.equal(output, 'Bandledger: building the backend …\nrebuilt\n');
    assert.equal(code, 0);
    assert.equal((await runLauncher(ready.tree, 'start.mjs')).output, 'rebuilt\n');
  });

  it('hands on the exit code of a server that could not start', async () => {
    ready = createReadyTree('console.error("no"); process.exit(3)');
    assert.deepEqual(await runLauncher(ready.tree, 'start.mjs'), { code: 3, output: 'no\n' });
  });

  it('refuses a busy port in one line, before anything else', async () => {
    ready = createReadyTree(SERVER);
    rmSync(join(ready.tree, 'node_modules'), { recursive: true });
    const { port, free } = await occupyPort();
    const { code, output } = await runLauncher(ready.tree, 'start.mjs', { PORT: String(port) });
    free();
    oneLine(output);
    assert.match(output, new RegExp(`port ${port} on 127.0.0.1 is busy`));
    assert.equal(code, 1);
  });

  it('refuses a port that is none', async () => {
    ready = createReadyTree(SERVER);
    const { code, output } = await runLauncher(ready.tree, 'start.mjs', { PORT: 'http' });
    oneLine(output);
    assert.match(output, /PORT is "http"/);
    assert.equal(code, 1);
  });

  it('refuses another Node.js in one line', async () => {
    ready = createReadyTree(SERVER);
    const manifest = { name: 'x', engines: { node: '>=99.1 <100' }, workspaces: [] };
    ready.write('package.json', JSON.stringify(manifest));
    const { code, output } = await runLauncher(ready.tree, 'start.mjs');
    oneLine(output);
    assert.match(output, /this is Node\.js 2\d/);
    assert.equal(code, 1);
  });

  it('names a missing compiler before it installs', async () => {
    ready = createReadyTree(SERVER);
    rmSync(join(ready.tree, 'node_modules'), { recursive: true });
    mkdirSync(join(ready.tree, 'empty'));
    const { code, output } = await runLauncher(ready.tree, 'start.mjs', { PATH: join(ready.tree, 'empty') });
    oneLine(output);
    assert.match(output, /g\+\+, make, python3 are missing/);
    assert.equal(code, 1);
  });

  it('says that a data folder cannot be one', async () => {
    ready = createReadyTree(SERVER);
    ready.write('data', '');
    const { code, output } = await runLauncher(ready.tree, 'start.mjs');
    oneLine(output);
    assert.match(output, /data is in the way/);
    assert.equal(code, 1);
  });
});

describe('npm test', () => {
  it('ends with the count even when nothing can be installed', async () => {
    ready = createReadyTree(SERVER);
    rmSync(join(ready.tree, 'node_modules'), { recursive: true });
    mkdirSync(join(ready.tree, 'empty'));
    const { code, output } = await runLauncher(ready.tree, 'test.mjs', { PATH: join(ready.tree, 'empty') });
    assert.match(output, /missing/);
    assert.equal(output.trimEnd().split('\n').at(-1), '0 passed, 1 failed');
    assert.equal(code, 1);
  });
});

import assert from 'node:assert/strict';
import { mkdirSync, mkdtempSync, renameSync, rmSync, utimesSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { afterEach, beforeEach, describe, it } from 'node:test';
import { contentHash } from '../lib/content-hash.mjs';

describe('contentHash', () => {
  let root;
  const hash = () => contentHash(root, ['src', 'package.json', 'absent']);
  beforeEach(() => {
    root = mkdtempSync(join(tmpdir(), 'bandledger-hash-'));
    mkdirSync(join(root, 'src/deep'), { recursive: true });
    writeFileSync(join(root, 'src/deep/a.ts'), 'one');
    writeFileSync(join(root, 'package.json'), '{}');
  });
  afterEach(() => rmSync(root, { recursive: true, force: true }));

  it('does not look at dates', () => {
    const first = hash();
    utimesSync(join(root, 'src/deep/a.ts'), 1, 1);
    assert.equal(hash(), first);
  });
  it('sees a change, a new file and a new name', () => {
    const seen = new Set([hash()]);
    writeFileSync(join(root, 'src/deep/a.ts'), 'two');
    seen.add(hash());
    writeFileSync(join(root, 'src/b.ts'), '');
    seen.add(hash());
    renameSync(join(root, 'src/b.ts'), join(root, 'src/c.ts'));
    seen.add(hash());
    assert.equal(seen.size, 4);
  });
  it('leaves out what is made from the source', () => {
    const first = hash();
    for (const name of ['dist', 'node_modules']) {
      mkdirSync(join(root, 'src', name));
      writeFileSync(join(root, 'src', name, 'x.js'), '');
    }
    assert.equal(hash(), first);
  });
});

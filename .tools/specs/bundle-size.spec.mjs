import assert from 'node:assert/strict';
import { describe, it } from 'node:test';
import { ENTRY_LIMIT_KB, entryBundleKb, entryScripts } from '../lib/bundle-size.mjs';
import { fromRoot } from '../lib/paths.mjs';

describe('entry bundle', () => {
  it('is the entry script and what is preloaded', () => {
    const html = `<script type="module" crossorigin src="/assets/index-a.js"></script>
      <link rel="modulepreload" crossorigin href="/assets/vendor-b.js"><link rel="stylesheet" href="/assets/index.css">`;
    assert.deepEqual(entryScripts(html), ['assets/index-a.js', 'assets/vendor-b.js']);
  });

  it(`of the built application has at most ${ENTRY_LIMIT_KB} kB compressed`, () => {
    const size = entryBundleKb(fromRoot('frontend/dist'));
    assert.ok(size <= ENTRY_LIMIT_KB, `${size.toFixed(0)} kB`);
  });
});

import assert from 'node:assert/strict';
import { after, before, describe, it } from 'node:test';
import { resolve } from 'node:path';
import { ESLint } from 'eslint';
import { createFixtureTree } from './fixture-tree.mjs';
import { backendFeatures, BACKEND_FEATURE_ORDER } from './import-zones.mjs';
import { cases } from './rules-cases.mjs';

const productRoot = resolve(import.meta.dirname, '../..');
const rulesOf = (messages) => messages.map((message) => message.ruleId ?? message.message);

describe('lint rules', () => {
  let tree;
  before(() => {
    tree = createFixtureTree(productRoot);
  });
  after(() => tree.remove());

  for (const { title, rule, bad, good } of cases) {
    it(`${title}: ${rule} fires`, async () => {
      const rules = rulesOf(await tree.lint(...bad));
      assert.ok(rules.includes(rule), `expected ${rule}, got ${rules.join(', ') || 'nothing'}`);
    });
    it(`${title}: ${rule} stays silent beside it`, async () => {
      assert.deepEqual(
        rulesOf(await tree.lint(...good)).filter((name) => name === rule || name.startsWith('Parsing')),
        [],
      );
    });
  }
});

describe('lint set-up', () => {
  it('every backend folder has a place in the feature order', () => {
    const known = BACKEND_FEATURE_ORDER.flat();
    assert.deepEqual(
      backendFeatures(productRoot).filter((name) => !known.includes(name)),
      [],
    );
  });

  it('the product is linted with these rules', async () => {
    const eslint = new ESLint({ cwd: productRoot });
    const config = await eslint.calculateConfigForFile(resolve(productRoot, 'backend/src/calculator/engine/types.ts'));
    for (const rule of ['import-x/no-restricted-paths', 'import-x/no-cycle', 'max-lines', 'complexity'])
      assert.equal(config.rules[rule][0], 2, rule);
  });
});

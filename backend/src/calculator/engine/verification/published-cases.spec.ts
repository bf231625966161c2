import { readFileSync, readdirSync } from 'node:fs';
import { join } from 'node:path';
import { CASES_LEFT } from '../reference/cases-left';
import { ALL_CASES } from './published-cases.test-support';

const specs = readdirSync(__dirname)
  .filter((name) => name.endsWith('.spec.ts'))
  .map((name) => readFileSync(join(__dirname, name), 'utf8'))
  .join('\n');

const left = CASES_LEFT.flatMap(({ ids }) => ids);

/** The collection itself: no case is forgotten, none is without source, tolerance and provenance. */
describe('published cases', () => {
  it.each(ALL_CASES.map((published) => [published.id, published] as const))('%s is driven by a spec', (id) => {
    expect(specs).toContain(`'${id}'`);
  });

  it.each(ALL_CASES.map((published) => [published.id, published] as const))('%s is complete', (_, published) => {
    expect(Object.keys(published.tolerance).sort()).toEqual(Object.keys(published.expected).sort());
    expect(Object.keys(published.expected).length).toBeGreaterThan(0);
    expect(published.source.length).toBeGreaterThan(5);
    expect(published.provenance.length).toBeGreaterThan(5);
    for (const [key, tolerance] of Object.entries(published.tolerance)) {
      expect(tolerance).toBeGreaterThanOrEqual(0);
      // A tolerance that swallows the value would hold nothing.
      const expected = Math.abs(published.expected[key]);
      expect(expected === 0 || tolerance <= 0.25 * expected).toBe(true);
    }
  });

  it('ids are there once, and a case is either held or left for later', () => {
    const ids = ALL_CASES.map(({ id }) => id);
    expect(new Set([...ids, ...left]).size).toBe(ids.length + left.length);
    for (const { what, why } of CASES_LEFT) expect(what.length * why.length).toBeGreaterThan(0);
  });

  it('the whole collection is accounted for: 79 rows', () => {
    expect(ALL_CASES.length + left.length).toBe(79);
  });
});

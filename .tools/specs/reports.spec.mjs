import assert from 'node:assert/strict';
import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { after, before, describe, it } from 'node:test';
import { readReport } from '../lib/reports.mjs';

let folder;
before(() => (folder = mkdtempSync(join(tmpdir(), 'bandledger-reports-'))));
after(() => rmSync(folder, { recursive: true, force: true }));

function read(kind, content, code = 0) {
  const file = join(folder, 'report.json');
  rmSync(file, { force: true });
  if (content !== undefined) writeFileSync(file, typeof content === 'string' ? content : JSON.stringify(content));
  const { passed, failed, failures } = readReport(kind, file, { name: 'specs', code, output: 'last words' });
  assert.equal(failures.length, failed);
  return { passed, failed, messages: failures.map(({ message }) => message).join('\n') };
}

const counts = ({ passed, failed }) => [passed, failed];
const jestFile = (...statuses) => ({
  name: 'a.spec.ts',
  message: '',
  assertionResults: statuses.map((status) => ({ status, fullName: status, failureMessages: [] })),
});
const journey = (status) => ({
  title: 'as-designer',
  suites: [
    {
      title: 'ledger',
      specs: [{ title: 'x', tests: [{ status, projectName: 'designer', results: [{ errors: [] }] }] }],
    },
  ],
});

describe('readReport', () => {
  it('counts a report that is missing, unreadable or empty as one failed', () => {
    for (const content of [undefined, '', '{', '{}', { testResults: [] }]) {
      assert.deepEqual(counts(read('jest', content)), [0, 1], String(content));
    }
    assert.match(read('jest', undefined).messages, /no report was written[^]*last words/);
  });
  it('counts skipped and unfinished tests as failed', () => {
    const report = { testResults: [jestFile('passed', 'passed', 'pending', 'todo', 'failed')] };
    assert.deepEqual(counts(read('jest', report, 1)), [2, 3]);
    assert.deepEqual(
      counts(read('playwright', { suites: [journey('skipped'), journey('expected'), journey('flaky')] })),
      [1, 2],
    );
  });
  it('counts a file that could not be loaded', () => {
    const report = {
      testResults: [jestFile('passed'), { name: 'b.spec.ts', message: 'cannot find module', assertionResults: [] }],
    };
    const result = read('vitest', report, 1);
    assert.deepEqual(counts(result), [1, 1]);
    assert.match(result.messages, /cannot find module/);
  });
  it('does not believe in success when the runner ended with an error', () => {
    assert.deepEqual(counts(read('jest', { testResults: [jestFile('passed')] }, 1)), [1, 1]);
  });
  it('reads errors outside the journeys', () => {
    assert.deepEqual(counts(read('playwright', { suites: [], errors: [{ message: 'no server' }] }, 1)), [0, 1]);
  });
  it('takes counts as they are when all is well', () => {
    assert.deepEqual(counts(read('node', { passed: 3, failed: 0, failures: [] })), [3, 0]);
    assert.deepEqual(counts(read('playwright', { suites: [journey('expected')] })), [1, 0]);
  });
});

import { execFile } from 'node:child_process';
import path from 'node:path';
import { promisify } from 'node:util';
import { median, type Measured } from './bench-measures';

/** The speed limits are for `npm run bench`; here five times as much, so that a busy machine does not fail. */
const ALLOWANCE = 5;
/** The built server, as it is delivered: its threads and clients run in another process than the tests. */
const BENCH = path.resolve(__dirname, '../dist/bench.js');

const EXPECTED = [
  'analysis of 8 stages, 3 cases, 401 points',
  'report of 8 stages',
  'preview, 95th percentile of ten people typing',
  'save of 24 stages',
  '300 devices tried in a stage',
];

describe('speed', () => {
  it('everything measured stays within five times its limit', async () => {
    const { stdout } = await promisify(execFile)(process.execPath, [BENCH]);
    const measured = JSON.parse(stdout.trimEnd().split('\n').at(-1) ?? '[]') as Measured[];
    expect(measured.map(({ name }) => name)).toEqual(EXPECTED);
    for (const { name, value, limit } of measured) {
      expect([name, value <= ALLOWANCE * limit ? 'in time' : value]).toEqual([name, 'in time']);
    }
  }, 180_000);

  it('median takes the middle one', () => {
    expect(median([9, 1, 5])).toBe(5);
  });
});

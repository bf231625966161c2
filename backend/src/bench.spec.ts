import { measureServer } from './bench';
import { median, measureEngine } from './bench-measures';

/** The speed limits are for `npm run bench`; here five times as much, so that a busy machine does not fail. */
const ALLOWANCE = 5;

describe('speed', () => {
  it('the engine stays within five times its limits', async () => {
    for (const { name, value, limit } of await measureEngine(15)) {
      expect([name, value <= ALLOWANCE * limit ? 'in time' : value]).toEqual([name, 'in time']);
    }
  });

  it('preview, save and picker stay within five times their limits', async () => {
    for (const { name, value, limit } of await measureServer()) {
      expect([name, value <= ALLOWANCE * limit ? 'in time' : value]).toEqual([name, 'in time']);
    }
  }, 120_000);

  it('median takes the middle one', () => {
    expect(median([9, 1, 5])).toBe(5);
  });
});

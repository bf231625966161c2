import { describe, expect, it } from 'vitest';

import { formatDay, formatPlainDate, today } from './dates';

describe('dates', () => {
  it('prints a plain date as the same day in every time zone', () => {
    expect(formatPlainDate('2026-01-31')).toBe('31 Jan 2026');
  });

  it('prints a dash for what is no instant', () => {
    expect(formatDay('soon')).toBe('–');
  });

  it('today is the local day', () => {
    expect(today(new Date(2026, 0, 5, 0, 30))).toBe('2026-01-05');
  });
});

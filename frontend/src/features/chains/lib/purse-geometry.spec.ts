import { describe, expect, it } from 'vitest';

import { purseGeometry } from './purse-geometry';

describe('purseGeometry', () => {
  it('shares the bar between spent and left', () => {
    expect(purseGeometry(260e6, 65e6)).toEqual({ has: 1, spent: 0.25, overspent: 0 });
  });

  it('lets overspending stick out beyond what the device has', () => {
    const purse = purseGeometry(75e6, 100e6);
    expect(purse).toEqual({ has: 0.75, spent: 0.75, overspent: 0.25 });
  });

  it('is full and not over when all is spent', () => {
    expect(purseGeometry(1e6, 1e6)).toEqual({ has: 1, spent: 1, overspent: 0 });
  });

  it('is not drawn without both figures', () => {
    expect(purseGeometry(null, 1e6)).toBeNull();
    expect(purseGeometry(1e6, null)).toBeNull();
    expect(purseGeometry(0, 1e6)).toBeNull();
  });
});

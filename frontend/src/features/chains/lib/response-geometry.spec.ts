import { describe, expect, it } from 'vitest';

import { curvePath, envelope, frequencyTicks, gainRange, nearestIndex, plotScales } from './response-geometry';

const box = { width: 120, height: 110, left: 10, right: 10, top: 5, bottom: 5 };

describe('plotScales and curvePath', () => {
  const scales = plotScales(box, [1e3, 1e5], [0, 20]);

  it('maps decades and decibels to equal steps', () => {
    expect(scales.x(1e4)).toBeCloseTo(60, 9);
    expect(scales.y(20)).toBe(5);
    expect(scales.y(0)).toBe(105);
    expect(scales.frequencyAt(60)).toBeCloseTo(1e4, 6);
  });

  it('leaves a gap where there is no answer', () => {
    const path = curvePath(scales, [1e3, 1e4, 3e4, 1e5], [20, null, 10, 0]);
    expect(path.match(/M/g)).toHaveLength(2);
  });
});

describe('envelope', () => {
  it('is the lowest and highest of the curves, null where one is missing', () => {
    expect(
      envelope([
        [1, 5, null],
        [3, 2, 1],
      ]),
    ).toEqual({ low: [1, 2, null], high: [3, 5, null] });
  });
});

describe('helpers of the axes', () => {
  it('finds the nearest point on the logarithmic axis', () => {
    expect(nearestIndex([1, 10, 100], 30)).toBe(1);
    expect(nearestIndex([1, 10, 100], 32)).toBe(2);
  });

  it('covers the tops of all curves in whole tens', () => {
    const [low, high] = gainRange([
      [60, 57, -80],
      [20, 19, 3],
    ]);
    expect(high).toBe(70);
    expect(low).toBeLessThanOrEqual(3);
    expect(low).toBeGreaterThanOrEqual(-40);
  });

  it('marks decades', () => {
    const decades = frequencyTicks([2e5, 3e7]).filter((tick) => tick.decade);
    expect(decades.map((tick) => tick.frequencyHz)).toEqual([1e6, 1e7]);
  });
});

import { describe, expect, it } from 'vitest';

import { seriesMantissas, snapToSeries, stepInSeries, type Series } from './preferred-values';

describe('preferred series of IEC 60063:2015 (values from memory of its tables)', () => {
  it('E6 and E12 are the printed rows', () => {
    expect(seriesMantissas('E6')).toEqual([1, 1.5, 2.2, 3.3, 4.7, 6.8]);
    expect(seriesMantissas('E12')).toEqual([1, 1.2, 1.5, 1.8, 2.2, 2.7, 3.3, 3.9, 4.7, 5.6, 6.8, 8.2]);
  });

  it('E48 and E96 hold the well-known values', () => {
    expect(seriesMantissas('E48')).toEqual(expect.arrayContaining([1.05, 1.69, 2.15, 3.16, 4.64, 6.81, 9.53]));
    expect(seriesMantissas('E96')).toEqual(expect.arrayContaining([1.02, 2.21, 3.16, 4.99, 6.98, 8.06, 9.76]));
    expect(new Set(seriesMantissas('E96')).size).toBe(96);
  });
});

describe('snapToSeries(value, series)', () => {
  it.each<[number, Series, number]>([
    [1980, 'E24', 2000],
    [2000, 'E24', 2000],
    [2162, 'E96', 2150],
    [9.7, 'E24', 10],
    [9600, 'E6', 10000],
    [9.9e-12, 'E12', 1e-11],
    [4.7e-9, 'E6', 4.7e-9],
    [0, 'E24', 0],
    [-5, 'E24', -5],
    [Number.POSITIVE_INFINITY, 'E24', Number.POSITIVE_INFINITY],
  ])('takes %d in %s to %d', (value, series, snapped) => {
    expect(snapToSeries(value, series)).toBe(snapped);
  });
});

describe('stepInSeries(value, series, direction)', () => {
  it.each<[number, Series, 1 | -1, number]>([
    [1000, 'E24', 1, 1100],
    [1000, 'E24', -1, 910],
    [9100, 'E24', 1, 10000],
    [1050, 'E24', 1, 1100],
    [1050, 'E24', -1, 1000],
    [0, 'E24', 1, 0],
  ])('from %d in %s by %d is %d', (value, series, direction, next) => {
    expect(stepInSeries(value, series, direction)).toBe(next);
  });
});

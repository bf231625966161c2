import fc from 'fast-check';
import { decidingDigits, digitsForDecimals, digitsWithoutTrailingZeros, isAbove, isBelow } from './deciding-digits';

describe('decidingDigits(value, least, limits)', () => {
  it.each([
    [0.974026, 3, [1, 3], 3],
    [0.9996, 3, [1], 4],
    [0.999_96, 3, [1], 5],
    [1.0004, 3, [1], 5],
    [2.9999, 3, [3], 5],
    [58.9999, 4, [59], 6],
    [3, 3, [3], 3],
    [17.14, 3, [], 3],
  ])('%s with at least %s digits against %s takes %s', (value, least, limits, digits) => {
    expect(decidingDigits(value, least, limits)).toBe(digits);
  });

  it('never lets the rounded number change sides, as long as ten digits can tell', () => {
    fc.assert(
      fc.property(
        fc.double({ min: 1e-3, max: 1e3, noNaN: true }),
        fc.double({ min: 1e-8, max: 1, noNaN: true }),
        (limit, part) => {
          const below = limit * (1 - part * 0.5);
          const printed = Number(below.toPrecision(decidingDigits(below, 3, [limit])));
          expect(printed).toBeLessThan(limit);
        },
      ),
    );
  });
});

it('digitsForDecimals(value, decimals) keeps two decimals of a level', () => {
  expect(digitsForDecimals(58.0787, 2)).toBe(4);
  expect(digitsForDecimals(-0.79, 2)).toBe(2);
  expect(digitsForDecimals(9.999, 2)).toBe(4);
  expect(digitsForDecimals(0, 2)).toBe(3);
  expect(digitsForDecimals(0.0004, 2)).toBe(1);
});

it('digitsWithoutTrailingZeros(value, most) writes 11 as 11 and 3.162 as 3.162', () => {
  expect(digitsWithoutTrailingZeros(11, 4)).toBe(2);
  expect(digitsWithoutTrailingZeros(-10, 4)).toBe(2);
  expect(digitsWithoutTrailingZeros(100, 4)).toBe(3);
  expect(digitsWithoutTrailingZeros(Math.sqrt(10), 4)).toBe(4);
  expect(digitsWithoutTrailingZeros(0, 4)).toBe(1);
});

it('isBelow and isAbove take rounding noise of the arithmetic for equality', () => {
  expect(isBelow(0.1 + 0.2, 0.3)).toBe(false);
  expect(isAbove(0.1 + 0.2, 0.3)).toBe(false);
  expect(isBelow(0.999_999, 1)).toBe(true);
  expect(isAbove(1.000_001, 1)).toBe(true);
});

import {
  decimalAmount,
  formatFigure,
  formatMoney,
  prefixFor,
  quantity,
  significant,
  trimmed,
  typed,
} from './si-format';

describe('significant(value, digits)', () => {
  it.each([
    [77.04, 3, '77.0'],
    [0.97403, 3, '0.974'],
    [-1234, 3, '−1230'],
    [1e9, 3, '1000000000'],
    [0, 3, '0.00'],
    [-0, 3, '0.00'],
    [9.996, 3, '10.0'],
    [1.5e-9, 2, '0.0000000015'],
  ])('%s with %s digits is %s', (value, digits, text) => {
    expect(significant(value, digits)).toBe(text);
  });
});

describe('trimmed(value, digits)', () => {
  it.each([
    [7, 4, '7'],
    [10.7, 4, '10.7'],
    [100, 4, '100'],
    [-3.1620001, 4, '−3.162'],
  ])('%s is %s', (value, digits, text) => {
    expect(trimmed(value, digits)).toBe(text);
  });
});

describe('prefixFor(value, digits)', () => {
  it('looks at the rounded number, so that 999.96 MHz is 1.00 GHz', () => {
    expect(prefixFor(999.96e6, 3)).toEqual([1e9, 'G']);
    expect(quantity(999.96e6, 'Hz', 3)).toBe('1.00 GHz');
    expect(quantity(999.4e6, 'Hz', 3)).toBe('999 MHz');
  });

  it('keeps to the smallest and largest prefix', () => {
    expect(quantity(3e-21, 'F', 2)).toBe('0.0030 aF');
    expect(quantity(5e16, 'Hz', 2)).toBe('50000 THz');
  });
});

describe('quantity(value, unit, digits)', () => {
  it.each([
    [77e6, 'Hz', 3, '77.0 MHz'],
    [0.974, 'ratio', 3, '×0.974'],
    [10, 'gain', 2, '×10'],
    [-10, 'gain', 2, '−10'],
    [11, 'number', 2, '11'],
    [4.4e6, 'V/s', 3, '4.40 V/µs'],
    [1.2451e-9, 'V/√Hz', 3, '1.25 nV/√Hz'],
    [0.82, 'fraction', 3, '82.0 %'],
    [-0.79, 'dB', 2, '−0.79 dB'],
    [57.31, 'deg', 3, '57.3°'],
    [2200, 'Ω', 2, '2.2 kΩ'],
    [38e-3, 'A', 3, '38.0 mA'],
  ] as const)('%s %s is %s', (value, unit, digits, text) => {
    expect(quantity(value, unit, digits)).toBe(text);
  });
});

it('typed(value, unit) leaves trailing zeros out', () => {
  expect(typed(7e6, 'Hz')).toBe('7 MHz');
  expect(typed(10.7e6, 'Hz')).toBe('10.7 MHz');
  expect(typed(3, 'ratio')).toBe('×3');
});

it('formatFigure(figure) gives the reason where there is no number', () => {
  expect(formatFigure({ value: null, unit: 'Hz', digits: 3, reason: 'Has no GBW.' })).toBe('Has no GBW.');
});

describe('decimalAmount(amountMicros)', () => {
  it.each([
    [620_000, '0.62'],
    [4_200, '0.0042'],
    [8_120_000, '8.12'],
    [0, '0.00'],
    [1, '0.000001'],
    [-880_000, '−0.88'],
    [1_000_000_000_000, '1000000.00'],
  ])('%s millionths are %s', (amount, text) => {
    expect(decimalAmount(amount)).toBe(text);
  });

  it('is followed by the currency in formatMoney', () => {
    expect(formatMoney({ amountMicros: 8_120_000, currency: 'USD' })).toBe('8.12 USD');
    expect(formatMoney({ amountMicros: null, currency: 'USD', reason: 'no rate from EUR to USD' })).toBe(
      'no rate from EUR to USD',
    );
  });
});

import { describe, expect, it } from 'vitest';

import { describeQuantity, limitMessage, parseInUnit, toFieldText, type QuantityUnit } from './quantity-units';

const plain = (text: string | null): string | null => text?.replace(/\u00a0/g, ' ').replace(/\u2212/g, '-') ?? null;

describe('toFieldText(value, unit)', () => {
  it.each<[number | null, QuantityUnit, string]>([
    [75e6, 'MHz', '75'],
    [1.2e9, 'MHz', '1200'],
    [159e3, 'MHz', '0.159'],
    [5, 'MHz', '5 Hz'],
    [4700, 'Ω', '4.7k'],
    [100, 'Ω', '100'],
    [2.2e6, 'Ω', '2.2M'],
    [3e-12, 'pF', '3'],
    [1e-6, 'pF', '1 µF'],
    [0.9e-9, 'nV/√Hz', '0.9'],
    [55e6, 'V/µs', '55'],
    [-10, 'gain', '-10'],
    [0, 'V', '0'],
    [null, 'Ω', ''],
  ])('shows %d in a field of %s as “%s”', (value, unit, text) => {
    expect(plain(toFieldText(value, unit))).toBe(text);
  });

  it.each<[number, QuantityUnit]>([
    [6_818_181.818, 'MHz'],
    [4990, 'Ω'],
    [4.7e-9, 'pF'],
    [1.5e-12, 'nF'],
    [2.5e-12, 'pA/√Hz'],
    [316.2, 'gain'],
    [300e6, 'V/µs'],
    [1e-4, 'mA'],
  ])('%d is read back unchanged from a field of %s', (value, unit) => {
    const parsed = parseInUnit(toFieldText(value, unit), unit);
    expect(parsed.ok && Math.abs(parsed.value / value - 1)).toBeLessThan(1e-11);
  });
});

describe('describeQuantity(value, unit)', () => {
  it('names value, prefix and unit, and a gain both ways', () => {
    expect(plain(describeQuantity(4700, 'Ω'))).toBe('4.7 kΩ');
    expect(plain(describeQuantity(-10, 'gain'))).toBe('-10 = 20.00 dB');
    expect(plain(describeQuantity(250, 'pieces'))).toBe('250 pieces');
  });
});

describe('limitMessage(value, unit, limits)', () => {
  it('says which limit was broken', () => {
    expect(plain(limitMessage(0, 'Ω', { minimum: 0, exclusiveMinimum: true }))).toBe('Must be more than 0 Ω.');
    expect(plain(limitMessage(2e9, 'Ω', { maximum: 1e9 }))).toBe('Must be at most 1 GΩ.');
    expect(plain(limitMessage(-1, 'V', { minimum: 0 }))).toBe('Must be at least 0 V.');
    expect(limitMessage(5, 'V', { minimum: 0, maximum: 10 })).toBeNull();
  });
});

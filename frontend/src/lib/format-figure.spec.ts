import { describe, expect, it } from 'vitest';

import type { Unit } from '../api/types';
import { formatFigure, otherNotation } from './format-figure';

const plain = (text: string | null): string | null => text?.replace(/\u00a0/g, ' ').replace(/\u2212/g, '-') ?? null;
const print = (value: number | null, unit: Unit, digits: number): string | null =>
  plain(formatFigure({ value, unit, digits, reason: 'none' }).text);

describe('formatFigure(figure)', () => {
  it.each<[number, Unit, number, string]>([
    [75e6, 'Hz', 3, '75.0 MHz'],
    [1.2e9, 'Hz', 3, '1.20 GHz'],
    [6.818181e6, 'Hz', 4, '6.818 MHz'],
    [999.96e3, 'Hz', 4, '1.000 MHz'],
    [4700, 'Ω', 2, '4.7 kΩ'],
    [1e-11, 'F', 2, '10 pF'],
    [0.018, 'A', 2, '18 mA'],
    [55e6, 'V/s', 2, '55 V/µs'],
    [4.4e6, 'V/s', 2, '4.4 V/µs'],
    [1.2e-9, 'V/√Hz', 2, '1.2 nV/√Hz'],
    [58.08, 'dB', 4, '58.08 dB'],
    [-0.769, 'dB', 3, '-0.769 dB'],
    [-0.0031, 'dB', 3, '-0.0031 dB'],
    [1e-9, 'dB', 3, '0.00 dB'],
    [0.974, 'ratio', 3, '×0.974'],
    [17.1, 'ratio', 3, '×17.1'],
    [10, 'gain', 2, '×10'],
    [-10, 'gain', 2, '-10'],
    [11, 'number', 2, '11'],
    [59.6, 'deg', 2, '60°'],
    [0.125, 'fraction', 3, '12.5 %'],
    [0, 'V', 3, '0 V'],
    [-0.0125, 'V', 3, '-12.5 mV'],
    [950.4, 'ratio', 2, '×950'],
  ])('prints %d %s with %d digits as %s', (value, unit, digits, text) => {
    expect(print(value, unit, digits)).toBe(text);
  });

  it('prints a dash for a figure without value, and for one that should never arrive', () => {
    expect(print(null, 'Hz', 3)).toBe('–');
    expect(print(Number.NaN, 'Hz', 3)).toBe('–');
    expect(print(Number.POSITIVE_INFINITY, 'Hz', 3)).toBe('–');
  });

  it('never rounds 0.9996 up to a bare pass when the digits say four', () => {
    expect(print(0.9996, 'ratio', 4)).toBe('×0.9996');
  });
});

describe('otherNotation(figure)', () => {
  it.each<[number, Unit, number, string | null]>([
    [10, 'gain', 3, '20.0 dB'],
    [-10, 'gain', 3, '20.0 dB'],
    [20, 'dB', 3, '×10.0 in voltage'],
    [100, 'dBΩ', 3, '100 kΩ'],
    [5e6, 'Hz', 3, null],
    [0, 'ratio', 3, null],
  ])('of %d %s is %s', (value, unit, digits, text) => {
    expect(plain(otherNotation({ value, unit, digits }))).toBe(text);
  });
});

import { describe, expect, it } from 'vitest';

import { formatMicros, formatMoney, parsePrice } from './money';

describe('formatMicros(amountMicros, currency)', () => {
  it.each<[number, string, string]>([
    [620_000, 'USD', '0.62'],
    [8_120_000, 'USD', '8.12'],
    [4_200, 'USD', '0.0042'],
    [4_100_000, 'EUR', '4.10'],
    [0, 'USD', '0.00'],
    [1, 'USD', '0.000001'],
    [120_000_000, 'JPY', '120'],
    [-500_000, 'USD', '−0.50'],
    [9_007_199_254_740_991, 'USD', '9007199254.740991'],
  ])('prints %d micro-%s as %s', (micros, currency, text) => {
    expect(formatMicros(micros, currency)).toBe(text);
  });
});

describe('formatMoney(money)', () => {
  it('prints a dash, not zero, when there is no amount', () => {
    expect(formatMoney({ amountMicros: null, currency: 'USD', reason: 'no quote' })).toBe('–');
  });
});

describe('parsePrice(text)', () => {
  it.each<[string, number]>([
    ['0.62', 620_000],
    ['0,62', 620_000],
    ['4', 4_000_000],
    ['0.0042', 4_200],
    ['1.1', 1_100_000],
    [' 1.35 ', 1_350_000],
  ])('reads “%s” as %d micro-units', (text, micros) => {
    expect(parsePrice(text)).toEqual({ ok: true, micros });
  });

  it.each(['', 'abc', '-1', '1,200', '1.2.3', '0.1234567', '99999999999999999'])('refuses “%s”', (text) => {
    expect(parsePrice(text).ok).toBe(false);
  });
});

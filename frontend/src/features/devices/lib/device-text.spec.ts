import { describe, expect, it } from 'vitest';

import type { Quote } from '../../../api/types';
import { buildDevice } from '../../../testing/builders';
import { bandwidthOf, columnText, lowestPriceText } from './device-text';

const quote: Quote = {
  currency: 'USD',
  breaks: [
    { quantity: 10, unitPriceMicros: 1_120_000 },
    { quantity: 250, unitPriceMicros: 620_000 },
    { quantity: 1000, unitPriceMicros: 550_000 },
  ],
};
const plain = (text: string | null): string | null => text?.replace(/\u00a0/g, ' ') ?? null;

describe('lowestPriceText(quote)', () => {
  it('names the lowest price and where it starts', () => {
    expect(plain(lowestPriceText(quote))).toBe('0.55 USD at 1000');
    expect(lowestPriceText(undefined)).toBeNull();
  });
});

describe('columnText(sheet, column, unit)', () => {
  it('is empty for a column that the datasheet does not give', () => {
    expect(columnText({ min: 75e6 }, 'max', 'MHz')).toBe('');
    expect(plain(columnText({ min: 75e6 }, 'min', 'MHz'))).toBe('75 MHz');
  });
});

describe('bandwidthOf(device)', () => {
  it('is the GBW of a voltage-feedback amplifier, without a note', () => {
    expect(bandwidthOf(buildDevice())).toEqual({ sheet: { min: 75e6, typ: 100e6, page: '4' }, note: '' });
  });
});

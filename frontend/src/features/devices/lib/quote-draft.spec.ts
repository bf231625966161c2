import { describe, expect, it } from 'vitest';

import { addBreak, quoteBody, quoteDraftOf, quoteProblems } from './quote-draft';

const quote = {
  currency: 'USD',
  breaks: [
    { quantity: 1, unitPriceMicros: 1_350_000 },
    { quantity: 250, unitPriceMicros: 4_200 },
  ],
};

describe('a quote that is typed', () => {
  it('goes back to the same micro-units', () => {
    expect(quoteBody(quoteDraftOf(quote)).breaks).toEqual(quote.breaks);
    expect(quoteProblems(quoteDraftOf(quote))).toEqual({});
  });

  it('starts with one line that lacks its price', () => {
    expect(Object.keys(quoteProblems(quoteDraftOf(undefined)))).toEqual(['breaks.0.unitPriceMicros']);
  });

  it.each([
    ['0', 'breaks.1.quantity'],
    ['1', 'breaks.1.quantity'],
    ['2.5', 'breaks.1.quantity'],
    ['', 'breaks.1.quantity'],
    ['1e3', 'breaks.1.quantity'],
  ])('refuses the quantity “%s” after 1', (quantity, path) => {
    const draft = quoteDraftOf(quote);
    const breaks = draft.breaks.map((step, index) => (index === 1 ? { ...step, quantity } : step));
    expect(Object.keys(quoteProblems({ ...draft, breaks }))).toEqual([path]);
  });

  it('refuses a price of nothing', () => {
    const draft = quoteDraftOf(quote);
    const breaks = draft.breaks.map((step) => ({ ...step, price: '0.00' }));
    expect(Object.keys(quoteProblems({ ...draft, breaks }))).toHaveLength(2);
  });

  it.each([
    ['1000000', undefined],
    ['1000000.000001', 'Must be at most 1000000.'],
    ['1.0000001', 'A price has at most six decimals.'],
    ['−1', 'Give a price, for example 0.62.'],
  ])('answers the price “%s” in words before the server does', (price, message) => {
    const draft = { ...quoteDraftOf(quote), breaks: [{ id: 0, quantity: '1', price }] };
    expect(quoteProblems(draft)['breaks.0.unitPriceMicros']).toBe(message);
  });

  it('gives every added line an id of its own', () => {
    const ids = addBreak(addBreak(quoteDraftOf(quote))).breaks.map((step) => step.id);
    expect(new Set(ids).size).toBe(4);
  });
});

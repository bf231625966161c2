import { describe, expect, it } from 'vitest';

import { parseQuantity, type QuantityKind } from './engineering-notation';
import cases from './engineering-notation.cases.json';

const kindOf = (kind: unknown): QuantityKind => kind as QuantityKind;

describe('parseQuantity(text, kind)', () => {
  it.each(cases.read)('reads “%s” as %s %d', (text, kind, value) => {
    const parsed = parseQuantity(String(text), kindOf(kind));
    expect(parsed).toEqual({ ok: true, value: expect.closeTo(Number(value), 20) as number });
    if (parsed.ok && value !== 0) expect(Math.abs(parsed.value / Number(value) - 1)).toBeLessThan(1e-15);
  });

  it.each(cases.readBare)('reads “%s” as %s in a field of 10^%d', (text, kind, exponent, value) => {
    expect(parseQuantity(String(text), kindOf(kind), Number(exponent))).toEqual({ ok: true, value });
  });

  it.each(cases.refuse)('refuses “%s” as %s: %s', (text, kind, code) => {
    expect(parseQuantity(String(text), kindOf(kind))).toMatchObject({ ok: false, code });
  });

  it('names an example in every refusal of a unit', () => {
    expect(parseQuantity('10 pF', 'resistance')).toMatchObject({ message: expect.stringContaining('4k7') as string });
  });

  it('never answers −0', () => {
    const parsed = parseQuantity('-0', 'number');
    expect(parsed.ok && Object.is(parsed.value, 0)).toBe(true);
  });
});

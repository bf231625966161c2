import { InvalidError } from './errors';
import { cleanJson } from './json-walk';

const fieldError = (value: unknown): unknown => {
  try {
    cleanJson(value);
  } catch (error) {
    return error instanceof InvalidError ? error.details.fieldErrors?.[0] : error;
  }
  return 'accepted';
};

describe('cleanJson(value)', () => {
  it('makes −0 to 0, at any depth', () => {
    const cleaned = cleanJson(JSON.parse('{"a": -0, "b": [{"c": -0.0}]}')) as { a: number; b: { c: number }[] };
    expect(Object.is(cleaned.a, 0)).toBe(true);
    expect(Object.is(cleaned.b[0]?.c, 0)).toBe(true);
  });

  it('leaves everything else as it is', () => {
    const value = { a: -1.5e-300, b: 'text', c: null, d: [true, [], {}], e: 5e-324 };
    expect(cleanJson(value)).toEqual(value);
    expect(cleanJson(undefined)).toBeUndefined();
  });

  it.each(['1e400', '-1e400'])('refuses %s with its path', (number) => {
    expect(fieldError(JSON.parse(`{"stages": [{}, {"feedbackOhm": ${number}}]}`))).toMatchObject({
      path: 'stages.1.feedbackOhm',
      code: 'not_finite',
    });
  });

  it('refuses depth beyond what any request has, and no less', () => {
    const nested = (depth: number) => JSON.parse(`${'['.repeat(depth)}${']'.repeat(depth)}`) as unknown;
    expect(fieldError(nested(24))).toBe('accepted');
    expect(fieldError(nested(25))).toMatchObject({ code: 'too_deep' });
  });

  it('refuses a key that would reach a prototype', () => {
    expect(fieldError(JSON.parse('{"a": {"__proto__": {}}}'))).toMatchObject({
      path: 'a.__proto__',
      code: 'unknown_field',
    });
  });
});

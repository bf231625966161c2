import { describe, expect, it } from 'vitest';

import { canonicalText } from './draft-key';

describe('canonicalText', () => {
  it('does not depend on the order of keys or on absent values', () => {
    expect(canonicalText({ b: 1, a: { d: [1, 2], c: null }, x: undefined })).toBe('{"a":{"c":null,"d":[1,2]},"b":1}');
  });

  it('tells null from absent, and one order of a list from another', () => {
    expect(canonicalText({ a: null })).not.toBe(canonicalText({}));
    expect(canonicalText([1, 2])).not.toBe(canonicalText([2, 1]));
  });
});

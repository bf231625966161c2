import { withoutSecrets } from './audit.service';

describe('withoutSecrets(value)', () => {
  it('drops passwords, hashes, tokens and secrets at any depth', () => {
    const value = { name: 'a', passwordHash: 'x', list: [{ sessionSecret: 'y', setupToken: 'z', kept: 1 }] };
    expect(withoutSecrets(value)).toEqual({ name: 'a', list: [{ kept: 1 }] });
  });

  it('keeps dates, null and plain values', () => {
    const at = new Date(0);
    expect(withoutSecrets({ at, none: null, zero: 0, no: false })).toEqual({ at, none: null, zero: 0, no: false });
    expect(withoutSecrets('text')).toBe('text');
  });
});

import { findRoot } from './root';

describe('findRoot(f, a, f(a), b, f(b))', () => {
  it('finds √2', () => {
    const f = (x: number) => x * x - 2;
    expect(findRoot(f, 1, f(1), 2, f(2))).toBeCloseTo(Math.SQRT2, 12);
  });

  it('takes few steps on a smooth function and does not stall on a bent one', () => {
    let count = 0;
    const f = (x: number) => {
      count++;
      return x ** 21 - 1e-3;
    };
    expect(findRoot(f, 0, f(0), 2, f(2))).toBeCloseTo(1e-3 ** (1 / 21), 10);
    expect(count).toBeLessThan(80);
  });

  it('gives an end that is the root', () => {
    expect(findRoot((x) => x, 0, 0, 1, 1)).toBe(0);
    expect(findRoot((x) => x - 1, 0, -1, 1, 0)).toBe(1);
  });

  it('works with the ends the other way round', () => {
    const f = (x: number) => Math.log(x);
    expect(findRoot(f, 4, f(4), 0.5, f(0.5))).toBeCloseTo(1, 12);
  });
});

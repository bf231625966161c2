/** Taken out once: these run at every frequency. */
const { abs, min, sign } = Math;

/**
 * Root of a continuous function between two points of opposite sign: regula falsi after Anderson and Björck, with a
 * bisection step when three steps together have not halved the interval. Ends when the interval is `tolerance` wide.
 * Source: N. Anderson, Å. Björck, BIT 13 (1973), p. 253 (from memory).
 *
 * @param fa f(a); @param fb f(b); one of them may be 0
 * @param tolerance width of x, absolute
 * @example findRoot((x) => x * x - 2, 1, -1, 2, 2) // 1.41421356…
 */
export function findRoot(
  f: (x: number) => number,
  a: number,
  fa: number,
  b: number,
  fb: number,
  tolerance = 1e-13,
): number {
  if (fa === 0) return a;
  let width = abs(b - a);
  let stalled = 0;
  for (let count = 0; count < 200 && fb !== 0 && abs(b - a) > tolerance; count++) {
    const bisect = stalled >= 3;
    const x = bisect ? (a + b) / 2 : falsePosition(a, fa, b, fb, tolerance);
    const fx = f(x);
    if (fx * fb < 0) {
      a = b;
      fa = fb;
    } else {
      fa *= retained(fx, fb);
    }
    b = x;
    fb = fx;
    if (bisect || abs(b - a) <= width / 2) {
      stalled = 0;
      width = abs(b - a);
    } else {
      stalled++;
    }
  }
  return b;
}

/** The Anderson–Björck factor for the end that stays. */
function retained(fx: number, fb: number): number {
  const factor = 1 - fx / fb;
  return factor > 0 ? factor : 0.5;
}

/** Where the chord crosses zero, kept a little inside both ends so that the interval closes around the root. */
function falsePosition(a: number, fa: number, b: number, fb: number, tolerance: number): number {
  const x = b - (fb * (b - a)) / (fb - fa);
  const inset = (min(tolerance, abs(b - a)) / 2) * sign(a - b);
  if (!Number.isFinite(x) || abs(x - b) < abs(inset)) return b + inset;
  return abs(x - a) < abs(inset) ? a - inset : x;
}

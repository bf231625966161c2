/** A complex number in Cartesian form. Plain data; functions below return new objects. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

/** A complex number that a hot loop writes its answer into, so that nothing is allocated per frequency. */
export interface MutableComplex {
  re: number;
  im: number;
}

/**
 * Builds a complex number.
 *
 * @example complex(3, 4) // { re: 3, im: 4 }
 */
export function complex(re: number, im = 0): Complex {
  return { re, im };
}

/**
 * a + b.
 *
 * @example add(complex(1, 2), complex(3, -1)) // { re: 4, im: 1 }
 */
export function add(a: Complex, b: Complex): Complex {
  return { re: a.re + b.re, im: a.im + b.im };
}

/**
 * a · b.
 *
 * @example multiply(complex(0, 1), complex(0, 1)) // { re: -1, im: 0 }
 */
export function multiply(a: Complex, b: Complex): Complex {
  return { re: a.re * b.re - a.im * b.im, im: a.re * b.im + a.im * b.re };
}

/**
 * a / b; both parts are NaN when b is 0.
 *
 * @example divide(complex(1), complex(0, 1)) // { re: 0, im: -1 }
 */
export function divide(a: Complex, b: Complex): Complex {
  const squared = b.re * b.re + b.im * b.im;
  return { re: (a.re * b.re + a.im * b.im) / squared, im: (a.im * b.re - a.re * b.im) / squared };
}

/**
 * a · factor for a real factor.
 *
 * @example scale(complex(1, 2), 3) // { re: 3, im: 6 }
 */
export function scale(a: Complex, factor: number): Complex {
  return { re: a.re * factor, im: a.im * factor };
}

/**
 * 1 / a; the reciprocal of 0 is +Infinity (an open circuit of a zero admittance).
 *
 * @example reciprocal(complex(0)) // { re: Infinity, im: 0 }
 */
export function reciprocal(a: Complex): Complex {
  if (a.re === 0 && a.im === 0) return { re: Infinity, im: 0 };
  return divide({ re: 1, im: 0 }, a);
}

/**
 * |a|².
 *
 * @example magnitudeSquared(complex(3, 4)) // 25
 */
export function magnitudeSquared(a: Complex): number {
  return a.re * a.re + a.im * a.im;
}

/**
 * |a|.
 *
 * @example magnitude(complex(3, 4)) // 5
 */
export function magnitude(a: Complex): number {
  return Math.hypot(a.re, a.im);
}

/**
 * Principal value of the angle of a, degrees in (−180, 180].
 *
 * @example angleDeg(complex(0, 2)) // 90
 */
export function angleDeg(a: Complex): number {
  return (Math.atan2(a.im, a.re) * 180) / Math.PI;
}

/** Complex numbers and a dense complex LU factorisation, for the nodal solutions that the calculator is held to. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

/** Taken out once: globals are slow to reach inside the test runner. */
const { atan2, hypot } = Math;

export const complex = (re: number, im = 0): Complex => ({ re, im });
export const add = (a: Complex, b: Complex): Complex => complex(a.re + b.re, a.im + b.im);
export const subtract = (a: Complex, b: Complex): Complex => complex(a.re - b.re, a.im - b.im);
export const multiply = (a: Complex, b: Complex): Complex =>
  complex(a.re * b.re - a.im * b.im, a.re * b.im + a.im * b.re);
export const scale = (a: Complex, k: number): Complex => complex(a.re * k, a.im * k);
export const magnitude = (a: Complex): number => hypot(a.re, a.im);
export const magnitudeSquared = (a: Complex): number => a.re * a.re + a.im * a.im;
export const argument = (a: Complex): number => atan2(a.im, a.re);

export function divide(a: Complex, b: Complex): Complex {
  const d = magnitudeSquared(b);
  return complex((a.re * b.re + a.im * b.im) / d, (a.im * b.re - a.re * b.im) / d);
}

export const reciprocal = (a: Complex): Complex => divide(complex(1), a);

/** |a − b| relative to the larger of the two; 0 when both are 0. */
export function relativeDifference(a: Complex, b: Complex): number {
  const size = Math.max(magnitude(a), magnitude(b));
  return size === 0 ? 0 : magnitude(subtract(a, b)) / size;
}

/** Square complex matrix, row-major. */
export class ComplexMatrix {
  readonly re: Float64Array;
  readonly im: Float64Array;

  constructor(readonly size: number) {
    this.re = new Float64Array(size * size);
    this.im = new Float64Array(size * size);
  }

  add(row: number, column: number, value: Complex): void {
    this.re[row * this.size + column] += value.re;
    this.im[row * this.size + column] += value.im;
  }
}

/** A node without any connection, or voltages that contradict each other. */
export class SingularCircuit extends Error {}

export interface RightSide {
  readonly row: number;
  readonly value: Complex;
}

/** LU factorisation with row scaling and partial pivoting; solves are refined once against the original matrix. */
export class Factorisation {
  private readonly lu: ComplexMatrix;
  private readonly order: Int32Array;

  constructor(private readonly matrix: ComplexMatrix) {
    const n = matrix.size;
    this.lu = new ComplexMatrix(n);
    this.lu.re.set(matrix.re);
    this.lu.im.set(matrix.im);
    this.order = Int32Array.from({ length: n }, (_, i) => i);
    const rowSize = this.rowSizes();
    for (let k = 0; k < n; k++) {
      this.pivot(k, rowSize);
      this.eliminate(k);
    }
  }

  /** Solution for the right side given by its non-zero entries. */
  solve(rightSide: readonly RightSide[]): Complex[] {
    const n = this.matrix.size;
    const bRe = new Float64Array(n);
    const bIm = new Float64Array(n);
    for (const { row, value } of rightSide) {
      bRe[row] += value.re;
      bIm[row] += value.im;
    }
    const x = this.substitute(bRe, bIm);
    const correction = this.substitute(...this.residual(bRe, bIm, x));
    return Array.from({ length: n }, (_, i) => complex(x[0][i] + correction[0][i], x[1][i] + correction[1][i]));
  }

  private rowSizes(): Float64Array {
    const n = this.matrix.size;
    const sizes = new Float64Array(n);
    for (let i = 0; i < n; i++) {
      for (let j = 0; j < n; j++) {
        const size = sizeOf(this.lu.re[i * n + j], this.lu.im[i * n + j]);
        if (size > sizes[i]) sizes[i] = size;
      }
      if (sizes[i] === 0) throw new SingularCircuit(`row ${i} of the nodal matrix is empty`);
    }
    return sizes;
  }

  private pivot(k: number, rowSize: Float64Array): void {
    const n = this.matrix.size;
    const { re, im } = this.lu;
    let best = k;
    let bestSize = -1;
    for (let i = k; i < n; i++) {
      const size = sizeOf(re[i * n + k], im[i * n + k]) / rowSize[i];
      if (size > bestSize) {
        best = i;
        bestSize = size;
      }
    }
    if (bestSize === 0) throw new SingularCircuit('the nodal matrix is singular');
    if (best === k) return;
    for (let j = 0; j < n; j++) {
      [re[k * n + j], re[best * n + j]] = [re[best * n + j], re[k * n + j]];
      [im[k * n + j], im[best * n + j]] = [im[best * n + j], im[k * n + j]];
    }
    [this.order[k], this.order[best]] = [this.order[best], this.order[k]];
    [rowSize[k], rowSize[best]] = [rowSize[best], rowSize[k]];
  }

  private eliminate(k: number): void {
    const n = this.matrix.size;
    const { re, im } = this.lu;
    const pivot = reciprocal(complex(re[k * n + k], im[k * n + k]));
    const columns = this.filledColumns(k);
    for (let i = k + 1; i < n; i++) {
      const at = i * n + k;
      if (re[at] === 0 && im[at] === 0) continue;
      const fRe = re[at] * pivot.re - im[at] * pivot.im;
      const fIm = re[at] * pivot.im + im[at] * pivot.re;
      re[at] = fRe;
      im[at] = fIm;
      for (const j of columns) {
        const uRe = re[k * n + j];
        const uIm = im[k * n + j];
        re[i * n + j] -= fRe * uRe - fIm * uIm;
        im[i * n + j] -= fRe * uIm + fIm * uRe;
      }
    }
  }

  /** Columns behind the pivot that are not zero in its row. */
  private filledColumns(k: number): number[] {
    const n = this.matrix.size;
    const columns: number[] = [];
    for (let j = k + 1; j < n; j++) {
      if (this.lu.re[k * n + j] !== 0 || this.lu.im[k * n + j] !== 0) columns.push(j);
    }
    return columns;
  }

  private substitute(bRe: Float64Array, bIm: Float64Array): [Float64Array, Float64Array] {
    const n = this.matrix.size;
    const { re, im } = this.lu;
    const xRe = new Float64Array(n);
    const xIm = new Float64Array(n);
    for (let i = 0; i < n; i++) {
      xRe[i] = bRe[this.order[i]];
      xIm[i] = bIm[this.order[i]];
      for (let j = 0; j < i; j++) subtractProduct(xRe, xIm, i, j, re[i * n + j], im[i * n + j]);
    }
    for (let i = n - 1; i >= 0; i--) {
      for (let j = i + 1; j < n; j++) subtractProduct(xRe, xIm, i, j, re[i * n + j], im[i * n + j]);
      const value = divide(complex(xRe[i], xIm[i]), complex(re[i * n + i], im[i * n + i]));
      xRe[i] = value.re;
      xIm[i] = value.im;
    }
    return [xRe, xIm];
  }

  private residual(
    bRe: Float64Array,
    bIm: Float64Array,
    x: readonly [Float64Array, Float64Array],
  ): [Float64Array, Float64Array] {
    const n = this.matrix.size;
    const rRe = Float64Array.from(bRe);
    const rIm = Float64Array.from(bIm);
    for (let i = 0; i < n; i++) {
      for (let j = 0; j < n; j++) {
        const mRe = this.matrix.re[i * n + j];
        const mIm = this.matrix.im[i * n + j];
        if (mRe === 0 && mIm === 0) continue;
        rRe[i] -= mRe * x[0][j] - mIm * x[1][j];
        rIm[i] -= mRe * x[1][j] + mIm * x[0][j];
      }
    }
    return [rRe, rIm];
  }
}

/** |re| + |im|: a norm without calls to globals, which are slow inside the test runner. */
const sizeOf = (re: number, im: number): number => (re < 0 ? -re : re) + (im < 0 ? -im : im);

/** x[i] −= m·x[j] */
function subtractProduct(xRe: Float64Array, xIm: Float64Array, i: number, j: number, mRe: number, mIm: number): void {
  if (mRe === 0 && mIm === 0) return;
  const re = xRe[j];
  const im = xIm[j];
  xRe[i] -= mRe * re - mIm * im;
  xIm[i] -= mRe * im + mIm * re;
}

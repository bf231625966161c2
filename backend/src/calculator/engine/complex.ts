/** A complex number in Cartesian form. */
export interface Complex {
  readonly re: number;
  readonly im: number;
}

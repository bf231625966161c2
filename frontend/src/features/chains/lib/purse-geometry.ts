/** Fractions of the purse bar: what the device has, what of it is spent, and by how much it is overspent. */
export interface PurseGeometry {
  readonly has: number;
  readonly spent: number;
  readonly overspent: number;
}

/** The bar is as long as the larger of the two, so that overspending sticks out beyond the purse's end. */
export function purseGeometry(haveHz: number | null, usedHz: number | null): PurseGeometry | null {
  if (haveHz === null || usedHz === null || haveHz <= 0 || usedHz < 0) return null;
  const whole = Math.max(haveHz, usedHz);
  return {
    has: haveHz / whole,
    spent: Math.min(haveHz, usedHz) / whole,
    overspent: Math.max(0, usedHz - haveHz) / whole,
  };
}

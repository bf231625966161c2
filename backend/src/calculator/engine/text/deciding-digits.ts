/** Relative distance under which two numbers count as equal: rounding noise of the arithmetic, not a margin. */
export const EQUAL_WITHIN = 1e-9;

const MOST_DIGITS = 10;

/** True when `value` lies below `limit` by more than rounding noise. */
export function isBelow(value: number, limit: number): boolean {
  return value < limit && !areEqual(value, limit);
}

/** True when `value` lies above `limit` by more than rounding noise. */
export function isAbove(value: number, limit: number): boolean {
  return value > limit && !areEqual(value, limit);
}

function areEqual(a: number, b: number): boolean {
  return Math.abs(a - b) <= EQUAL_WITHIN * Math.max(Math.abs(a), Math.abs(b));
}

/**
 * How many significant digits to print so that the rounded number still shows on which side of each limit it is.
 *
 * @param value finite number, unrounded
 * @param least digits to start from (usually 3 or 4)
 * @param limits the limits that it is compared with, in the same unit
 * @returns significant digits; `decidingDigits(0.9996, 3, [1])` → 4, because "1.00" would hide that it is below 1
 */
export function decidingDigits(value: number, least: number, limits: readonly number[]): number {
  if (limits.length === 0) return Math.min(least, MOST_DIGITS);
  for (let digits = least; digits < MOST_DIGITS; digits += 1) {
    const rounded = Number(value.toPrecision(digits));
    if (limits.every((limit) => areEqual(value, limit) || sideOf(rounded, limit) === sideOf(value, limit)))
      return digits;
  }
  return MOST_DIGITS;
}

function sideOf(value: number, limit: number): number {
  return areEqual(value, limit) ? 0 : Math.sign(value - limit);
}

/**
 * Digits for a fixed number of decimals, as decibels are written.
 *
 * @param value finite number
 * @param decimals places after the point
 * @returns significant digits, at least 1; `digitsForDecimals(58.08, 2)` → 4, `digitsForDecimals(-0.79, 2)` → 2
 */
export function digitsForDecimals(value: number, decimals: number): number {
  const rounded = Math.abs(Number(value.toFixed(decimals)));
  if (rounded === 0) return value === 0 ? decimals + 1 : 1;
  return Math.max(1, Math.floor(Math.log10(rounded)) + 1 + decimals);
}

/**
 * Digits of a limit in decibels: two decimals, and every further one that was set, so that a value beside it never seems to
 * keep a limit that it breaks.
 *
 * @param limit finite number
 * @returns significant digits; `decibelLimitDigits(1)` → 3, `decibelLimitDigits(0.125)` → 3, `decibelLimitDigits(59.875)` → 5
 */
export function decibelLimitDigits(limit: number): number {
  return Math.max(digitsForDecimals(limit, 2), digitsWithoutTrailingZeros(limit, 6));
}

/**
 * The fewest digits that say the same as `most` digits do: 11.00 needs two, 3.162 needs four.
 *
 * @param value finite number
 * @param most largest number of digits
 * @returns significant digits, never fewer than the integer part has
 */
export function digitsWithoutTrailingZeros(value: number, most: number): number {
  const full = Number(value.toPrecision(most));
  const integerDigits = full === 0 ? 1 : Math.max(1, Math.floor(Math.log10(Math.abs(full))) + 1);
  for (let digits = Math.min(integerDigits, most); digits < most; digits += 1) {
    if (Number(value.toPrecision(digits)) === full) return digits;
  }
  return most;
}

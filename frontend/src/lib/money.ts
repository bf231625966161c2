import type { Money } from '../api/types';

/** Millionths of a currency unit in one unit. */
export const MICROS_PER_UNIT = 1_000_000;
const MICRO_DECIMALS = 6;
const MINUS = '\u2212';

/** Minor-unit decimals of a currency (ISO 4217); 2 where the browser does not know the code. */
export function currencyDecimals(currency: string): number {
  try {
    const format = new Intl.NumberFormat('en', { style: 'currency', currency });
    return format.resolvedOptions().maximumFractionDigits ?? 2;
  } catch {
    return 2;
  }
}

/**
 * Prints micro-units exactly: at least the currency's own decimals, more where the price has them (0.0042 each).
 * Worked on the digits, not on a float.
 */
export function formatMicros(amountMicros: number, currency: string): string {
  const negative = amountMicros < 0;
  const digits = BigInt(Math.round(Math.abs(amountMicros)))
    .toString()
    .padStart(MICRO_DECIMALS + 1, '0');
  const whole = digits.slice(0, -MICRO_DECIMALS);
  const minimum = currencyDecimals(currency);
  let fraction = digits.slice(-MICRO_DECIMALS);
  while (fraction.length > minimum && fraction.endsWith('0')) fraction = fraction.slice(0, -1);
  return `${negative ? MINUS : ''}${whole}${fraction === '' ? '' : `.${fraction}`}`;
}

export function formatMoney(money: Money): string {
  return money.amountMicros === null
    ? '–'
    : `${formatMicros(money.amountMicros, money.currency)}\u00a0${money.currency}`;
}

export type ParsedPrice =
  { readonly ok: true; readonly micros: number } | { readonly ok: false; readonly message: string };

/** Reads a typed price into whole micro-units; more than six decimals are refused, not rounded. */
export function parsePrice(text: string): ParsedPrice {
  const normal = text.trim().replace(/[−–]/g, '-').replace(/\s/g, '');
  if (/,\d{3}(?!\d)/.test(normal) || (normal.includes(',') && normal.includes('.'))) {
    return { ok: false, message: 'The comma can be read in two ways. Write 1200 or 1.2.' };
  }
  const match = /^(\d+)(?:[.,](\d*))?$/.exec(normal);
  if (!match) return { ok: false, message: 'Give a price, for example 0.62.' };
  const [, whole = '0', fraction = ''] = match;
  if (fraction.length > MICRO_DECIMALS) return { ok: false, message: 'A price has at most six decimals.' };
  const micros = Number(BigInt(whole + fraction.padEnd(MICRO_DECIMALS, '0')));
  if (!Number.isSafeInteger(micros)) return { ok: false, message: 'This price is too large.' };
  return { ok: true, micros };
}

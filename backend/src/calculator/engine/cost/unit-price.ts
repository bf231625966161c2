import type { Money } from '../report';
import type { Device, Quote, Stage } from '../types';

/** Unit price of one device in a project. */
export interface UnitPrice {
  readonly money: Money;
  /** Pieces that one build needs. */
  readonly needed: number;
  /** Quantity of the break whose price is used; null: no price. */
  readonly breakQuantity: number | null;
  /** The quote's validity ended before the day asked about. */
  readonly lapsed: boolean;
}

/** What a price is asked for. */
export interface PriceQuestion {
  /** ISO 4217 currency of the project. */
  readonly currency: string;
  readonly needed: number;
  /** Plain date YYYY-MM-DD; absent: nothing is lapsed. */
  readonly today?: string;
}

/**
 * How many stages use each device.
 *
 * @param stages stages of one chain
 * @returns count by device id
 */
export function countStagesByDevice(stages: readonly Stage[]): ReadonlyMap<string, number> {
  const counts = new Map<string, number>();
  for (const stage of stages) {
    if ('deviceId' in stage) counts.set(stage.deviceId, (counts.get(stage.deviceId) ?? 0) + 1);
  }
  return counts;
}

/**
 * The unit price of a device from its quote at the quantity that one build needs.
 * Below the first break the first break's price stands in and `reason` says so. Another currency is no price, not zero.
 *
 * @param device device with or without a quote
 * @param question currency of the project, pieces needed, today
 * @returns price in integer micro-units, or null with the reason
 * @example unitPrice(device with breaks 1 → 1.35, 250 → 0.62, { currency: 'USD', needed: 250 }).money.amountMicros → 620000
 */
export function unitPrice(device: Device, question: PriceQuestion): UnitPrice {
  const { quote } = device;
  const none = (reason: string): UnitPrice => ({
    money: { amountMicros: null, currency: question.currency, reason },
    needed: question.needed,
    breakQuantity: null,
    lapsed: false,
  });
  if (!quote || quote.breaks.length === 0)
    return none(`no quote for ${device.partNumber}: enter one on its device page`);
  if (quote.currency !== question.currency) return none(`no rate from ${quote.currency} to ${question.currency}`);
  return priceFromBreaks(quote, question);
}

function priceFromBreaks(quote: Quote, question: PriceQuestion): UnitPrice {
  const ascending = [...quote.breaks].sort((a, b) => a.quantity - b.quantity);
  const reached = ascending.filter((step) => step.quantity <= question.needed);
  const used = reached[reached.length - 1] ?? ascending[0];
  const remark =
    reached.length === 0
      ? { reason: `${question.needed} needed is below the first break of ${used.quantity}: its price is used` }
      : {};
  return {
    money: { amountMicros: used.unitPriceMicros, currency: question.currency, ...remark },
    needed: question.needed,
    breakQuantity: used.quantity,
    lapsed: isLapsed(quote, question.today),
  };
}

/** True when the quote's last day lies before `today`; a quote without a last day never lapses. */
export function isLapsed(quote: Quote, today: string | undefined): boolean {
  return today !== undefined && quote.validUntil !== undefined && quote.validUntil.slice(0, 10) < today.slice(0, 10);
}

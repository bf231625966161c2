import { API_LIMITS } from '../../../api/limits';
import type { Quote, QuoteBody } from '../../../api/types';
import { formatMicros, parsePrice } from '../../../lib/money';

/** A price break being typed; text is kept as typed. */
export interface BreakDraft {
  readonly id: number;
  readonly quantity: string;
  readonly price: string;
}

export interface QuoteDraft {
  readonly currency: string;
  readonly breaks: readonly BreakDraft[];
  readonly supplier: string;
  readonly reference: string;
  readonly validUntil: string;
}

const { maximum: MAXIMUM_QUANTITY } = API_LIMITS.PriceBreak.quantity;
const { maximum: MAXIMUM_MICROS } = API_LIMITS.PriceBreak.unitPriceMicros;
const NO_QUANTITY = `A whole number from 1 to ${MAXIMUM_QUANTITY}.`;

function priceProblem(text: string): string | null {
  const price = parsePrice(text);
  if (!price.ok) return price.message;
  if (price.micros === 0) return 'Must be more than 0.';
  return price.micros > MAXIMUM_MICROS ? `Must be at most ${MAXIMUM_MICROS / 1e6}.` : null;
}

export function quoteDraftOf(quote: Quote | undefined): QuoteDraft {
  if (!quote) {
    return {
      currency: 'USD',
      breaks: [{ id: 0, quantity: '1', price: '' }],
      supplier: '',
      reference: '',
      validUntil: '',
    };
  }
  return {
    currency: quote.currency,
    breaks: quote.breaks.map((step, id) => ({
      id,
      quantity: String(step.quantity),
      price: formatMicros(step.unitPriceMicros, quote.currency),
    })),
    supplier: quote.supplier ?? '',
    reference: quote.reference ?? '',
    validUntil: quote.validUntil ?? '',
  };
}

export function addBreak(draft: QuoteDraft): QuoteDraft {
  const id = Math.max(-1, ...draft.breaks.map((step) => step.id)) + 1;
  return { ...draft, breaks: [...draft.breaks, { id, quantity: '', price: '' }] };
}

function readQuantity(text: string): number | null {
  const value = /^\d+$/.test(text.trim()) ? Number(text) : Number.NaN;
  return value >= 1 && value <= MAXIMUM_QUANTITY ? value : null;
}

function breakProblems(breaks: readonly BreakDraft[]): Record<string, string> {
  const problems: Record<string, string> = {};
  breaks.forEach((step, index) => {
    const quantity = readQuantity(step.quantity);
    const before = index > 0 ? readQuantity(breaks[index - 1]?.quantity ?? '') : null;
    if (quantity === null) problems[`breaks.${index}.quantity`] = NO_QUANTITY;
    else if (before !== null && quantity <= before) {
      problems[`breaks.${index}.quantity`] = `Must be more than ${before}, the line above.`;
    }
    const price = priceProblem(step.price);
    if (price !== null) problems[`breaks.${index}.unitPriceMicros`] = price;
  });
  return problems;
}

export function quoteProblems(draft: QuoteDraft): Readonly<Record<string, string>> {
  const problems = breakProblems(draft.breaks);
  if (!/^[A-Z]{3}$/.test(draft.currency.trim())) problems['currency'] = 'Three capital letters (ISO 4217), e.g. USD.';
  return problems;
}

const text = (value: string): string | undefined => (value.trim() === '' ? undefined : value.trim());

/** Only for a draft without problems. */
export function quoteBody(draft: QuoteDraft): QuoteBody {
  return {
    currency: draft.currency.trim(),
    breaks: draft.breaks.map((step) => {
      const price = parsePrice(step.price);
      return { quantity: Number(step.quantity), unitPriceMicros: price.ok ? price.micros : 0 };
    }),
    supplier: text(draft.supplier),
    reference: text(draft.reference),
    validUntil: text(draft.validUntil),
  };
}

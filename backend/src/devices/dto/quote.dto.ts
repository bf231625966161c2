import { ApiSchema } from '@nestjs/swagger';
import type { PriceBreak, Quote } from '../../calculator/engine';
import { NestedList } from '../../common/fields/nested';
import { rule } from '../../common/fields/presence';
import { Quantity } from '../../common/fields/quantity';
import { Currency, PlainDate, Text } from '../../common/fields/text';
import { LIST_LIMITS, TEXT_LIMITS } from '../../common/limits';

@ApiSchema({ name: 'PriceBreak' })
export class PriceBreakDto implements PriceBreak {
  @Quantity('quantity', { description: 'From this many pieces on' })
  readonly quantity: number;

  @Quantity('unitPriceMicros', { description: 'Price of one piece in millionths of the currency unit' })
  readonly unitPriceMicros: number;
}

/** Ascending quantities without repeats: a table that can be read in one way only. */
const ascending = rule(
  'breaks_not_ascending',
  (value) =>
    !Array.isArray(value) ||
    value.every(
      (step: PriceBreak, index) => index === 0 || !(step?.quantity <= (value[index - 1] as PriceBreak)?.quantity),
    ),
  'quantities must rise from line to line, each only once',
);

@ApiSchema({ name: 'Quote' })
export class QuoteDto implements Quote {
  @Currency()
  readonly currency: string;

  @NestedList(() => PriceBreakDto, { minimum: 1, maximum: LIST_LIMITS.priceBreaks })
  @ascending
  readonly breaks: readonly PriceBreakDto[];

  @Text({ maximum: TEXT_LIMITS.shortText, optional: true, description: "The supplier's quote number" })
  readonly reference?: string;

  @PlainDate({ optional: true, description: 'Last day of validity' })
  readonly validUntil?: string;

  @Text({ maximum: TEXT_LIMITS.name, optional: true })
  readonly supplier?: string;
}

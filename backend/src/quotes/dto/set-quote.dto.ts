import { ApiSchema } from '@nestjs/swagger';
import { QueryQuantity, Quantity } from '../../common/fields/quantity';
import type { LibraryDeviceDto } from '../../devices/dto/library-device.dto';
import { QuoteDto } from '../../devices/dto/quote.dto';

/** The quote as typed on the device's page; it replaces the one before as a whole. */
@ApiSchema({ name: 'SetQuote' })
export class SetQuoteDto extends QuoteDto {
  @Quantity('quoteVersion', { optional: true, description: 'The `quoteVersion` that was read; absent: not compared' })
  readonly version?: number;
}

/** `?version=`: the version of the quote that was read; absent: not compared. */
export class QuoteVersionQueryDto {
  @QueryQuantity('quoteVersion', 'The `quoteVersion` that was read; absent: not compared')
  readonly version?: number;
}

/** The device with its new quote. */
export type QuotedDeviceDto = LibraryDeviceDto;

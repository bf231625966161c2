import { ApiSchema } from '@nestjs/swagger';
import type { LibraryDeviceDto } from '../../devices/dto/library-device.dto';
import { QuoteDto } from '../../devices/dto/quote.dto';

/** The quote as typed on the device's page; it replaces the one before as a whole. */
@ApiSchema({ name: 'SetQuote' })
export class SetQuoteDto extends QuoteDto {}

/** The device with its new quote. */
export type QuotedDeviceDto = LibraryDeviceDto;

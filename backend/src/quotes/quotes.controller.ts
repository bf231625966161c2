import { Body, Controller, Delete, HttpCode, Param, Put, Query } from '@nestjs/common';
import { ApiNoContentResponse, ApiOkResponse, ApiTags, getSchemaPath } from '@nestjs/swagger';
import { CurrentUser } from '../common/decorators';
import { EntityIdPipe } from '../common/entity-id.pipe';
import type { SessionUser } from '../common/session-user';
import { QuoteVersionQueryDto, SetQuoteDto } from './dto/set-quote.dto';
import type { QuotedDeviceDto } from './dto/set-quote.dto';
import { QuotesService } from './quotes.service';

@ApiTags('quotes')
@Controller('devices/:id/quote')
export class QuotesController {
  constructor(private readonly quotes: QuotesService) {}

  @Put()
  @ApiOkResponse({ schema: { $ref: getSchemaPath('LibraryDevice') } })
  set(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Body() dto: SetQuoteDto,
  ): Promise<QuotedDeviceDto> {
    return this.quotes.set(user, id, dto);
  }

  @Delete()
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Query() { version }: QuoteVersionQueryDto,
  ): Promise<void> {
    return this.quotes.remove(user, id, version);
  }
}

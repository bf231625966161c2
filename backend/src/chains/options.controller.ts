import { Body, Controller, Delete, Get, HttpCode, Param, Post, Put, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { STAGE } from '../calculator/dto/stage.dto';
import { CurrentUser } from '../common/decorators';
import { EntityIdPipe } from '../common/entity-id.pipe';
import { UsesUnions } from '../common/fields/union';
import { VersionQueryDto } from '../common/fields/version';
import type { SessionUser } from '../common/session-user';
import { CreateOptionDto, OptionDto, SaveOptionDto } from './dto/option.dto';
import { OptionsService } from './options.service';

@ApiTags('options')
@UsesUnions([STAGE])
@Controller()
export class OptionsController {
  constructor(private readonly options: OptionsService) {}

  @Post('chains/:chainId/options')
  @ApiCreatedResponse({ type: OptionDto })
  create(
    @CurrentUser() user: SessionUser,
    @Param('chainId', EntityIdPipe) chainId: string,
    @Body() dto: CreateOptionDto,
  ): Promise<OptionDto> {
    return this.options.create(user, chainId, dto);
  }

  @Get('options/:id')
  @ApiOkResponse({ type: OptionDto })
  findOne(@CurrentUser() user: SessionUser, @Param('id', EntityIdPipe) id: string): Promise<OptionDto> {
    return this.options.findOne(user, id);
  }

  @Put('options/:id')
  @ApiOkResponse({ type: OptionDto })
  save(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Body() dto: SaveOptionDto,
  ): Promise<OptionDto> {
    return this.options.save(user, id, dto);
  }

  @Delete('options/:id')
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<void> {
    return this.options.remove(user, id, version);
  }
}

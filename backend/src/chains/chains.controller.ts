import { Body, Controller, Delete, Get, HttpCode, Param, Patch, Post, Query } from '@nestjs/common';
import { ApiCreatedResponse, ApiNoContentResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { SOURCE } from '../calculator/dto/specification.dto';
import { CurrentUser } from '../common/decorators';
import { EntityIdPipe } from '../common/entity-id.pipe';
import { UsesUnions } from '../common/fields/union';
import { VersionQueryDto } from '../common/fields/version';
import type { SessionUser } from '../common/session-user';
import { ChainsService } from './chains.service';
import { ChainDto, ChainListItemDto, CreateChainDto, UpdateChainDto } from './dto/chain.dto';

@ApiTags('chains')
@UsesUnions([SOURCE])
@Controller()
export class ChainsController {
  constructor(private readonly chains: ChainsService) {}

  @Get('projects/:projectId/chains')
  @ApiOkResponse({ type: [ChainListItemDto] })
  findAll(
    @CurrentUser() user: SessionUser,
    @Param('projectId', EntityIdPipe) projectId: string,
  ): Promise<ChainListItemDto[]> {
    return this.chains.findAll(user, projectId);
  }

  @Post('projects/:projectId/chains')
  @ApiCreatedResponse({ type: ChainDto })
  create(
    @CurrentUser() user: SessionUser,
    @Param('projectId', EntityIdPipe) projectId: string,
    @Body() dto: CreateChainDto,
  ): Promise<ChainDto> {
    return this.chains.create(user, projectId, dto);
  }

  @Get('chains/:id')
  @ApiOkResponse({ type: ChainDto })
  findOne(@CurrentUser() user: SessionUser, @Param('id', EntityIdPipe) id: string): Promise<ChainDto> {
    return this.chains.findOne(user, id);
  }

  @Patch('chains/:id')
  @ApiOkResponse({ type: ChainDto })
  update(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Body() dto: UpdateChainDto,
  ): Promise<ChainDto> {
    return this.chains.update(user, id, dto);
  }

  @Delete('chains/:id')
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<void> {
    return this.chains.remove(user, id, version);
  }
}

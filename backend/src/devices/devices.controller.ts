import { Body, Controller, Delete, Get, HttpCode, Param, Post, Put, Query } from '@nestjs/common';
import {
  ApiBody,
  ApiCreatedResponse,
  ApiNoContentResponse,
  ApiOkResponse,
  ApiTags,
  getSchemaPath,
} from '@nestjs/swagger';
import { CurrentUser } from '../common/decorators';
import { EntityIdPipe } from '../common/entity-id.pipe';
import { UsesUnions } from '../common/fields/union';
import { UnionPipe } from '../common/fields/union.pipe';
import { VersionQueryDto } from '../common/fields/version';
import type { SessionUser } from '../common/session-user';
import { DatasheetValueDto } from './dto/datasheet-value.dto';
import { DEVICE_BODY, DEVICE_UPDATE, VersionBodyDto } from './dto/device-body.dto';
import type { DeviceBodyDto, DeviceUpdateDto } from './dto/device-body.dto';
import { DeviceListDto, DeviceQueryDto, DeviceUsesDto } from './dto/device-list.dto';
import { LIBRARY_DEVICE } from './dto/library-device.dto';
import type { LibraryDeviceDto } from './dto/library-device.dto';
import { DevicesService } from './devices.service';

const DEVICE_ANSWER = { schema: { $ref: getSchemaPath('LibraryDevice') } };

@ApiTags('devices')
@UsesUnions([DEVICE_BODY, DEVICE_UPDATE, LIBRARY_DEVICE], [DatasheetValueDto])
@Controller('devices')
export class DevicesController {
  constructor(private readonly devices: DevicesService) {}

  @Get()
  @ApiOkResponse({ type: DeviceListDto })
  findPage(@CurrentUser() user: SessionUser, @Query() query: DeviceQueryDto): Promise<DeviceListDto> {
    return this.devices.findPage(user, query);
  }

  @Post()
  @ApiBody({ schema: { $ref: getSchemaPath('DeviceBody') } })
  @ApiCreatedResponse(DEVICE_ANSWER)
  create(
    @CurrentUser() user: SessionUser,
    @Body(new UnionPipe(DEVICE_BODY)) body: DeviceBodyDto,
  ): Promise<LibraryDeviceDto> {
    return this.devices.create(user, body);
  }

  @Get(':id')
  @ApiOkResponse(DEVICE_ANSWER)
  findOne(@CurrentUser() user: SessionUser, @Param('id', EntityIdPipe) id: string): Promise<LibraryDeviceDto> {
    return this.devices.findOne(user, id);
  }

  @Put(':id')
  @ApiBody({ schema: { $ref: getSchemaPath('DeviceUpdate') } })
  @ApiOkResponse(DEVICE_ANSWER)
  update(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Body(new UnionPipe(DEVICE_UPDATE)) body: DeviceUpdateDto,
  ): Promise<LibraryDeviceDto> {
    return this.devices.update(user, id, body);
  }

  @Delete(':id')
  @HttpCode(204)
  @ApiNoContentResponse()
  remove(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<void> {
    return this.devices.remove(user, id, version);
  }

  @Get(':id/uses')
  @ApiOkResponse({ type: DeviceUsesDto })
  findUses(@CurrentUser() user: SessionUser, @Param('id', EntityIdPipe) id: string): Promise<DeviceUsesDto> {
    return this.devices.findUses(user, id);
  }

  @Post(':id/verification')
  @HttpCode(200)
  @ApiOkResponse(DEVICE_ANSWER)
  verify(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Body() { version }: VersionBodyDto,
  ): Promise<LibraryDeviceDto> {
    return this.devices.setVerified(user, id, version, true);
  }

  @Delete(':id/verification')
  @ApiOkResponse(DEVICE_ANSWER)
  removeVerification(
    @CurrentUser() user: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Query() { version }: VersionQueryDto,
  ): Promise<LibraryDeviceDto> {
    return this.devices.setVerified(user, id, version, false);
  }
}

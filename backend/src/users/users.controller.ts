import { Body, Controller, Get, HttpCode, Param, Patch, Post } from '@nestjs/common';
import { ApiCreatedResponse, ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { CurrentUser, NoStore, Roles } from '../common/decorators';
import { EntityIdPipe } from '../common/entity-id.pipe';
import type { SessionUser } from '../common/session-user';
import { CreateUserDto } from './dto/create-user.dto';
import { UpdateUserDto } from './dto/update-user.dto';
import { CreatedUserDto, PasswordLinkDto, UserDto } from './dto/user.dto';
import { UsersService } from './users.service';

@ApiTags('users')
@Controller('users')
export class UsersController {
  constructor(private readonly users: UsersService) {}

  @Get()
  @ApiOkResponse({ type: [UserDto] })
  findAll(@CurrentUser() actor: SessionUser): Promise<UserDto[]> {
    return this.users.findAll(actor);
  }

  @Post()
  @Roles('admin')
  @NoStore()
  @ApiCreatedResponse({ type: CreatedUserDto })
  create(@CurrentUser() actor: SessionUser, @Body() dto: CreateUserDto): Promise<CreatedUserDto> {
    return this.users.create(actor, dto);
  }

  @Patch(':id')
  @Roles('admin')
  @ApiOkResponse({ type: UserDto })
  update(
    @CurrentUser() actor: SessionUser,
    @Param('id', EntityIdPipe) id: string,
    @Body() dto: UpdateUserDto,
  ): Promise<UserDto> {
    return this.users.update(actor, id, dto);
  }

  @Post(':id/password-link')
  @HttpCode(201)
  @Roles('admin')
  @NoStore()
  @ApiCreatedResponse({ type: PasswordLinkDto })
  createPasswordLink(
    @CurrentUser() actor: SessionUser,
    @Param('id', EntityIdPipe) id: string,
  ): Promise<PasswordLinkDto> {
    return this.users.createPasswordLink(actor, id);
  }
}

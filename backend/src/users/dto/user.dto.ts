import { ApiProperty, ApiPropertyOptional } from '@nestjs/swagger';
import { ROLES, type Role } from '../../common/role';

export class UserCanDto {
  @ApiProperty()
  edit: boolean;
}

export class UserDto {
  @ApiProperty({ format: 'uuid' })
  id: string;

  @ApiProperty()
  name: string;

  @ApiPropertyOptional({ description: 'For administrators only' })
  email?: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  roles: Role[];

  @ApiProperty()
  active: boolean;

  @ApiPropertyOptional({ description: 'Whether a password has been chosen; for administrators only' })
  hasPassword?: boolean;

  @ApiPropertyOptional({ description: 'Whether it is an invented person of the demo; for administrators only' })
  demo?: boolean;

  @ApiProperty()
  version: number;

  @ApiProperty({ type: UserCanDto })
  can: UserCanDto;
}

export class PasswordLinkDto {
  @ApiProperty({ example: '/welcome/x3v…', description: 'Path below the public address; shown this once' })
  path: string;

  @ApiProperty({ format: 'date-time' })
  expiresAt: string;
}

export class CreatedUserDto {
  @ApiProperty({ type: UserDto })
  user: UserDto;

  @ApiProperty({ type: PasswordLinkDto })
  link: PasswordLinkDto;
}

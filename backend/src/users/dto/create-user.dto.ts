import { ApiProperty } from '@nestjs/swagger';
import { Text } from '../../common/fields/text';
import { TEXT_LIMITS } from '../../common/limits';
import { ROLES, type Role } from '../../common/role';
import { EmailField } from './email-field';
import { RolesField } from './roles-field';

export class CreateUserDto {
  @Text({ maximum: TEXT_LIMITS.name })
  name: string;

  @EmailField()
  email: string;

  @ApiProperty({ enum: ROLES, enumName: 'Role', isArray: true })
  @RolesField()
  roles: Role[];
}

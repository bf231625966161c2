import { ApiPropertyOptional } from '@nestjs/swagger';
import { ValidateIf } from 'class-validator';
import { Flag } from '../../common/fields/choice';
import { Quantity } from '../../common/fields/quantity';
import { Text } from '../../common/fields/text';
import { TEXT_LIMITS } from '../../common/limits';
import { ROLES, type Role } from '../../common/role';
import { RolesField } from './roles-field';

export class UpdateUserDto {
  @Quantity('version', { description: 'The version that was read' })
  version: number;

  @Text({ maximum: TEXT_LIMITS.name, optional: true })
  name?: string;

  @ApiPropertyOptional({ enum: ROLES, enumName: 'Role', isArray: true })
  @ValidateIf((_object, value) => value !== undefined)
  @RolesField()
  roles?: Role[];

  @Flag({ optional: true })
  active?: boolean;
}

import { applyDecorators } from '@nestjs/common';
import { ArrayMinSize, ArrayUnique, IsArray, IsIn } from 'class-validator';
import { ROLES } from '../../common/role';

/** At least one role, none twice. */
export function RolesField(): PropertyDecorator {
  return applyDecorators(IsArray(), ArrayMinSize(1), ArrayUnique(), IsIn(ROLES, { each: true }));
}

import { applyDecorators } from '@nestjs/common';
import { ArrayMinSize, ArrayUnique, IsArray, IsIn } from 'class-validator';
import { ROLES } from '../../common/role';

/** At least one role, none twice. */
export function RolesField(): PropertyDecorator {
  return applyDecorators(
    IsArray({ message: 'must be a list of roles' }),
    ArrayMinSize(1, { message: 'needs at least one role' }),
    ArrayUnique({ message: 'names a role twice' }),
    IsIn(ROLES, { each: true, message: `must be of: ${ROLES.join(', ')}` }),
  );
}

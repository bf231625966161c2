import type { SessionUser } from '../common/session-user';
import type { UserDto } from './dto/user.dto';
import type { User } from './models/user.model';
import { canManageUsers, canSeeEmail } from './user.policy';

/** What `actor` gets to see of a person. */
export function presentUser(user: User, actor: SessionUser): UserDto {
  const { id, name, roles, active, version } = user;
  const shared = { id, name, roles, active, version, can: { edit: canManageUsers(actor) } };
  return canSeeEmail(actor)
    ? {
        ...shared,
        email: user.email,
        hasPassword: typeof user.passwordHash === 'string',
        ...(user.isDemo && { demo: true }),
      }
    : shared;
}

/** What goes on record about a person. */
export function auditedUser({ name, email, roles, active }: User): Record<string, unknown> {
  return { name, email, roles, active };
}

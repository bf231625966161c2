import type { Role } from '../../../api/types';

export const ROLES: readonly { readonly role: Role; readonly does: string }[] = [
  { role: 'designer', does: 'enters devices, builds projects, chains and options' },
  { role: 'buyer', does: 'enters quotes; electrical values stay as they are' },
  { role: 'lead', does: 'as a designer, and sets the margins of projects' },
  { role: 'admin', does: 'invites people and gives roles' },
];

/** With the role added or taken away, in the fixed order. */
export function toggleRole(roles: readonly Role[], role: Role): Role[] {
  const wanted = roles.includes(role) ? roles.filter((each) => each !== role) : [...roles, role];
  return ROLES.map((each) => each.role).filter((each) => wanted.includes(each));
}

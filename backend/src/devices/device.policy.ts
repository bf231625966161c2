import type { SessionUser } from '../common/session-user';

type Person = Pick<SessionUser, 'id' | 'roles'>;

/** What the rules need to know of a device. */
export interface DeviceHands {
  readonly enteredById: string;
  readonly valuesEditedById: string;
}

export function canCreateDevice({ roles }: Pick<Person, 'roles'>): boolean {
  return roles.includes('designer') || roles.includes('lead');
}

/** Electrical values are the designers' and leads'; buyers keep to prices. */
export function canEditDevice(user: Pick<Person, 'roles'>): boolean {
  return canCreateDevice(user);
}

export function canDeleteDevice(user: Pick<Person, 'roles'>): boolean {
  return canCreateDevice(user);
}

/** Comparing with the datasheet takes a second pair of eyes. */
export function canVerifyDevice(user: Person, { enteredById, valuesEditedById }: DeviceHands): boolean {
  return canEditDevice(user) && user.id !== enteredById && user.id !== valuesEditedById;
}

export function canEditQuote({ roles }: Pick<Person, 'roles'>): boolean {
  return roles.includes('designer') || roles.includes('buyer') || roles.includes('lead');
}

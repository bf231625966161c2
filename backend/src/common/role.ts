/** Team-wide roles; a person may hold several. */
export const ROLES = ['designer', 'buyer', 'lead', 'admin'] as const;
export type Role = (typeof ROLES)[number];

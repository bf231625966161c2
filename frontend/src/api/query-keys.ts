/**
 * First words of the query keys, so that a feature can mark another's data as out of date without importing it:
 * `queryClient.invalidateQueries({ queryKey: KEYS.projects })`.
 */
export const KEYS = {
  session: ['session'],
  desk: ['desk'],
  users: ['users'],
  projects: ['projects'],
  chains: ['chains'],
  options: ['options'],
  devices: ['devices'],
  calculations: ['calculations'],
} as const;

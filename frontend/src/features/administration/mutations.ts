import { useMutation, useQueryClient } from '@tanstack/react-query';

import { patchJson, postJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { CreatedUser, PasswordLink, Role, UserRow } from '../../api/types';

export interface NewPerson {
  readonly name: string;
  readonly email: string;
  readonly roles: readonly Role[];
}

export function useCreatePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (person: NewPerson) => postJson<CreatedUser>('/users', person),
    onSuccess: () => client.invalidateQueries({ queryKey: KEYS.users }),
  });
}

export interface PersonChange {
  readonly id: string;
  readonly version: number;
  readonly name?: string;
  readonly roles?: readonly Role[];
  readonly active?: boolean;
}

export function useUpdatePerson() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, ...change }: PersonChange) => patchJson<UserRow>(`/users/${id}`, change),
    // Also after a refusal: a stale row is shown as it is now.
    onSettled: () => client.invalidateQueries({ queryKey: KEYS.users }),
  });
}

export function usePasswordLink() {
  return useMutation({
    mutationFn: (userId: string) => postJson<PasswordLink>(`/users/${userId}/password-link`),
  });
}

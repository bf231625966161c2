import { useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';

import { deleteJson, patchJson, postJson, putJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { Chain, OptionDto, Specification, Stage } from '../../api/types';
import { canonicalText } from './lib/draft-key';
import type { Draft } from './lib/draft';
import type { DraftBase } from './lib/history';
import { chainQuery, optionQuery } from './queries';

/** Summaries of this chain are shown on the desk and on the project's page. */
function forgetSummaries(client: QueryClient): void {
  void client.invalidateQueries({ queryKey: KEYS.projects });
  void client.invalidateQueries({ queryKey: KEYS.desk });
}

export interface SaveRequest {
  readonly chainId: string;
  readonly optionId: string;
  readonly base: DraftBase;
  readonly draft: Draft;
  /** Called after each of the two rows, so that a conflict on the second does not repeat the first. */
  readonly onProgress: (base: DraftBase) => void;
}

const differ = (a: unknown, b: unknown): boolean => canonicalText(a) !== canonicalText(b);

/** Saves what changed: the specification belongs to the chain, stages and name to the option. */
export function useSaveDraft() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ chainId, optionId, base, draft, onProgress }: SaveRequest): Promise<void> => {
      let current = base;
      if (differ(draft.specification, base.draft.specification)) {
        const body = { version: base.chainVersion, specification: draft.specification };
        const chain = await patchJson<Chain>(`/chains/${chainId}`, body);
        client.setQueryData(chainQuery(chainId).queryKey, chain);
        current = {
          ...current,
          chainVersion: chain.version,
          draft: { ...current.draft, specification: draft.specification },
        };
        onProgress(current);
      }
      const { name, stages } = draft;
      if (name !== base.draft.name || differ(stages, base.draft.stages)) {
        const option = await putJson<OptionDto>(`/options/${optionId}`, { version: base.optionVersion, name, stages });
        client.setQueryData(optionQuery(optionId).queryKey, option);
        onProgress({ ...current, optionVersion: option.version, draft });
      }
    },
    onSuccess: (_data, { chainId }) => {
      void client.invalidateQueries({ queryKey: chainQuery(chainId).queryKey });
      forgetSummaries(client);
    },
  });
}

interface NewOption {
  readonly name: string;
  readonly fromOptionId?: string;
  /** Unsaved stages (under ids of their own) that the new option gets instead of the saved ones. */
  readonly stages?: readonly Stage[];
}

export function useCreateOption(chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: async ({ name, fromOptionId, stages }: NewOption) => {
      const created = await postJson<OptionDto>(`/chains/${chainId}/options`, { name, fromOptionId });
      if (!stages) return created;
      return putJson<OptionDto>(`/options/${created.id}`, { version: created.version, name, stages });
    },
    onSuccess: async (option) => {
      client.setQueryData(optionQuery(option.id).queryKey, option);
      await client.invalidateQueries({ queryKey: chainQuery(chainId).queryKey });
      forgetSummaries(client);
    },
  });
}

export function useDeleteOption(chainId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: { id: string; version: number }) => deleteJson(`/options/${id}`, { version }),
    onSuccess: async () => {
      await client.invalidateQueries({ queryKey: chainQuery(chainId).queryKey });
      forgetSummaries(client);
    },
  });
}

export function useRenameChain(chain: Chain) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (name: string) => patchJson<Chain>(`/chains/${chain.id}`, { version: chain.version, name }),
    onSuccess: (saved) => {
      client.setQueryData(chainQuery(chain.id).queryKey, saved);
      forgetSummaries(client);
    },
  });
}

export function useCreateChain(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (body: { name: string; specification: Specification }) =>
      postJson<Chain>(`/projects/${projectId}/chains`, body),
    onSuccess: (chain) => {
      client.setQueryData(chainQuery(chain.id).queryKey, chain);
      forgetSummaries(client);
    },
  });
}

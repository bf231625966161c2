import { useMutation, useQueryClient, type QueryClient } from '@tanstack/react-query';

import { deleteJson, postJson, putJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { DeviceDto, QuoteBody } from '../../api/types';
import { deviceBody, type DeviceDraft } from './lib/device-draft';
import { deviceQuery } from './queries';

/** A device's values and price stand in every figure of every chain that uses it. */
async function refreshFigures(client: QueryClient): Promise<void> {
  await Promise.all(
    [KEYS.devices, KEYS.chains, KEYS.options, KEYS.calculations, KEYS.desk].map((queryKey) =>
      client.invalidateQueries({ queryKey }),
    ),
  );
}

function useRefreshed(): (device: DeviceDto) => Promise<void> {
  const client = useQueryClient();
  return async (device) => {
    client.setQueryData(deviceQuery(device.id).queryKey, device);
    await refreshFigures(client);
  };
}

/** After a stale save: what somebody else saved is on the screen at once. */
export function useShowNewerDevice(): (device: DeviceDto) => void {
  const refreshed = useRefreshed();
  return (device) => void refreshed(device);
}

export function useCreateDevice() {
  const refreshed = useRefreshed();
  return useMutation({
    mutationFn: (draft: DeviceDraft) => postJson<DeviceDto>('/devices', deviceBody(draft)),
    onSuccess: refreshed,
  });
}

export function useUpdateDevice(deviceId: string) {
  const refreshed = useRefreshed();
  return useMutation({
    mutationFn: ({ draft, version }: { readonly draft: DeviceDraft; readonly version: number }) =>
      putJson<DeviceDto>(`/devices/${deviceId}`, { version, ...deviceBody(draft) }),
    onSuccess: refreshed,
  });
}

export function useDeleteDevice() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ id, version }: DeviceDto) => deleteJson(`/devices/${id}`, { version }),
    onSuccess: async (_nothing, device) => {
      client.removeQueries({ queryKey: deviceQuery(device.id).queryKey });
      await client.invalidateQueries({ queryKey: [...KEYS.devices, 'list'] });
      await client.invalidateQueries({ queryKey: KEYS.desk });
    },
  });
}

export function useVerifyDevice(deviceId: string) {
  const refreshed = useRefreshed();
  return useMutation({
    mutationFn: (version: number) => postJson<DeviceDto>(`/devices/${deviceId}/verification`, { version }),
    onSuccess: refreshed,
  });
}

export function useSetQuote(deviceId: string) {
  const refreshed = useRefreshed();
  return useMutation({
    mutationFn: ({ quote, version }: { readonly quote: QuoteBody; readonly version: number }) =>
      putJson<DeviceDto>(`/devices/${deviceId}/quote`, { version, ...quote }),
    onSuccess: refreshed,
  });
}

export function useRemoveQuote(deviceId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (version: number) => deleteJson(`/devices/${deviceId}/quote`, { version }),
    // Also after a refusal: the quote may have been changed by somebody else.
    onSettled: () => refreshFigures(client),
  });
}

export function useWithdrawVerification(deviceId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (version: number) => deleteJson(`/devices/${deviceId}/verification`, { version }),
    onSuccess: () => refreshFigures(client),
  });
}

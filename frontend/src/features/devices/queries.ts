import { keepPreviousData, queryOptions } from '@tanstack/react-query';

import { getJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { DeviceDto, DeviceList, DeviceUses } from '../../api/types';
import { filterParams, type DeviceFilters } from './lib/device-filters';

export const devicesQuery = (filters: DeviceFilters) =>
  queryOptions({
    queryKey: [...KEYS.devices, 'list', filterParams(filters)],
    queryFn: ({ signal }) => getJson<DeviceList>('/devices', { params: filterParams(filters), signal }),
    // The last rows stay (dimmed) while the next ones come.
    placeholderData: keepPreviousData,
  });

export const deviceQuery = (deviceId: string) =>
  queryOptions({
    queryKey: [...KEYS.devices, 'one', deviceId],
    queryFn: ({ signal }) => getJson<DeviceDto>(`/devices/${deviceId}`, { signal }),
  });

export const deviceUsesQuery = (deviceId: string) =>
  queryOptions({
    queryKey: [...KEYS.devices, 'uses', deviceId],
    queryFn: ({ signal }) => getJson<DeviceUses>(`/devices/${deviceId}/uses`, { signal }),
  });

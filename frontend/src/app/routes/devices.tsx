import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { useSearchParams } from 'react-router-dom';

import type { DeviceList } from '../../api/types';
import { EmptyState } from '../../components/empty-state';
import { ErrorNotice } from '../../components/error-notice';
import { LinkButton } from '../../components/link-button';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { useHasRole } from '../../components/session-context';
import { SkeletonRows } from '../../components/skeleton-rows';
import { DeviceFilterBar } from '../../features/devices/components/device-filter-bar';
import { DeviceTable } from '../../features/devices/components/device-table';
import { Pager } from '../../features/devices/components/pager';
import {
  isNarrowed,
  NO_FILTERS,
  readFilters,
  writeFilters,
  type DeviceFilters,
} from '../../features/devices/lib/device-filters';
import { devicesQuery } from '../../features/devices/queries';

export function Component() {
  const [search, setSearch] = useSearchParams();
  const filters = readFilters(search);
  const { data, error, refetch, isPlaceholderData } = useQuery(devicesQuery(filters));
  const change = (next: DeviceFilters): void => setSearch(writeFilters(next), { replace: true });
  const bare = data?.total === 0 && !isPlaceholderData && !isNarrowed(filters);
  return (
    <Page wide>
      <PageHeader title="Devices" extra={bare ? null : <EnterDevice />} />
      {!bare && <DeviceFilterBar filters={filters} onChange={change} />}
      <ErrorNotice error={error} title="The devices could not be loaded." onRetry={() => void refetch()} />
      {!data && !error && <SkeletonRows rows={8} />}
      {data && <DeviceResults data={data} stale={isPlaceholderData} filters={filters} onChange={change} />}
    </Page>
  );
}

function EnterDevice() {
  const mayCreate = useHasRole('designer', 'lead');
  if (!mayCreate) return null;
  return (
    <LinkButton to="/devices/new" type="primary">
      Enter a device
    </LinkButton>
  );
}

interface DeviceResultsProps {
  data: DeviceList;
  /** The rows are of the question before. */
  stale: boolean;
  filters: DeviceFilters;
  onChange: (filters: DeviceFilters) => void;
}

function DeviceResults({ data, stale, filters, onChange }: DeviceResultsProps) {
  if (data.total === 0 && stale) return <SkeletonRows rows={8} />;
  if (data.total === 0) return <NoDevices narrowed={isNarrowed(filters)} onClear={() => onChange(NO_FILTERS)} />;
  return (
    <>
      <DeviceTable devices={data.items} filters={filters} onChange={onChange} stale={stale} />
      <Pager page={filters.page} total={data.total} onChange={(page) => onChange({ ...filters, page })} />
    </>
  );
}

interface NoDevicesProps {
  narrowed: boolean;
  onClear: () => void;
}

function NoDevices({ narrowed, onClear }: NoDevicesProps) {
  if (narrowed) {
    return (
      <EmptyState title="No device matches these filters" action={<Button onClick={onClear}>Clear filters</Button>}>
        Take a filter off, or look for a part of the part number.
      </EmptyState>
    );
  }
  return (
    <EmptyState title="The library is empty" action={<EnterDevice />}>
      Enter the first device from its datasheet. Its gain-bandwidth product is enough to start with.
    </EmptyState>
  );
}

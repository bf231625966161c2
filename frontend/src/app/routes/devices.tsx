import { useQuery } from '@tanstack/react-query';
import { Button } from 'antd';
import { useSearchParams } from 'react-router-dom';

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
  const mayCreate = useHasRole('designer', 'lead');
  const change = (next: DeviceFilters): void => setSearch(writeFilters(next), { replace: true });
  const empty = data?.total === 0 && !isPlaceholderData;
  const create = (
    <LinkButton to="/devices/new" type="primary">
      Enter a device
    </LinkButton>
  );
  return (
    <Page wide>
      <PageHeader title="Devices" extra={mayCreate && !(empty && !isNarrowed(filters)) ? create : null} />
      {!(empty && !isNarrowed(filters)) && <DeviceFilterBar filters={filters} onChange={change} />}
      <ErrorNotice error={error} title="The devices could not be loaded." onRetry={() => void refetch()} />
      {!data && !error && <SkeletonRows rows={8} />}
      {empty && (
        <NoDevices
          narrowed={isNarrowed(filters)}
          action={mayCreate ? create : null}
          onClear={() => change(NO_FILTERS)}
        />
      )}
      {data && data.total > 0 && (
        <>
          <DeviceTable devices={data.items} filters={filters} onChange={change} stale={isPlaceholderData} />
          <Pager page={filters.page} total={data.total} onChange={(page) => change({ ...filters, page })} />
        </>
      )}
    </Page>
  );
}

interface NoDevicesProps {
  narrowed: boolean;
  action: React.ReactNode;
  onClear: () => void;
}

function NoDevices({ narrowed, action, onClear }: NoDevicesProps) {
  if (narrowed) {
    return (
      <EmptyState title="No device matches these filters" action={<Button onClick={onClear}>Clear filters</Button>}>
        Take a filter off, or look for a part of the part number.
      </EmptyState>
    );
  }
  return (
    <EmptyState title="The library is empty" action={action}>
      Enter the first device from its datasheet. Its gain-bandwidth product is enough to start with.
    </EmptyState>
  );
}

import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';

import { isApiError } from '../../api/api-error';
import { EmptyState } from '../../components/empty-state';
import { ErrorNotice } from '../../components/error-notice';
import { LinkButton } from '../../components/link-button';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { EditDeviceForm } from '../../features/devices/components/edit-device-form';
import { deviceQuery } from '../../features/devices/queries';
import { PageSkeleton } from '../layout/page-skeleton';
import { Component as NotFound } from './not-found';

export function Component() {
  const { deviceId = '' } = useParams();
  const { data: device, error, refetch } = useQuery(deviceQuery(deviceId));
  if (isApiError(error, 404)) return <NotFound />;
  if (!device && !error) return <PageSkeleton />;
  return (
    <Page>
      <ErrorNotice error={error} title="The device could not be loaded." onRetry={() => void refetch()} />
      {device && (
        <>
          <PageHeader
            title={`Edit ${device.partNumber}`}
            trail={[
              { label: 'Devices', to: '/devices' },
              { label: device.partNumber, to: `/devices/${device.id}` },
              { label: 'Edit' },
            ]}
          />
          {device.can.edit ? (
            <EditDeviceForm key={device.id} device={device} />
          ) : (
            <EmptyState
              title="You may not edit this device"
              action={<LinkButton to={`/devices/${device.id}`}>Back to the device</LinkButton>}
            >
              Electrical values are entered by designers and leads.
            </EmptyState>
          )}
        </>
      )}
    </Page>
  );
}

import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';

import { isApiError } from '../../api/api-error';
import { GradeMark } from '../../components/data-marks';
import { ErrorNotice } from '../../components/error-notice';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { DeviceActions } from '../../features/devices/components/device-actions';
import { DeviceFacts } from '../../features/devices/components/device-facts';
import { DeviceUsesSection } from '../../features/devices/components/device-uses';
import { DeviceValues } from '../../features/devices/components/device-values';
import { QuoteSection } from '../../features/devices/components/quote-section';
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
            title={device.partNumber}
            trail={[{ label: 'Devices', to: '/devices' }, { label: device.partNumber }]}
            beside={<GradeMark grade={device.grade} />}
            extra={<DeviceActions device={device} />}
          />
          <DeviceFacts device={device} />
          <QuoteSection key={device.id} device={device} />
          <DeviceValues device={device} />
          <DeviceUsesSection deviceId={device.id} />
        </>
      )}
    </Page>
  );
}

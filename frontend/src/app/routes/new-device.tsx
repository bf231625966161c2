import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { NewDeviceForm } from '../../features/devices/components/new-device-form';

export function Component() {
  return (
    <Page>
      <PageHeader title="Enter a device" trail={[{ label: 'Devices', to: '/devices' }, { label: 'New' }]} />
      <NewDeviceForm />
    </Page>
  );
}

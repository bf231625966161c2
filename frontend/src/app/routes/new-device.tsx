import { NotAllowed } from '../../components/not-allowed';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { useHasRole } from '../../components/session-context';
import { NewDeviceForm } from '../../features/devices/components/new-device-form';

export function Component() {
  const mayCreate = useHasRole('designer', 'lead');
  return (
    <Page>
      <PageHeader title="Enter a device" trail={[{ label: 'Devices', to: '/devices' }, { label: 'New' }]} />
      {mayCreate ? (
        <NewDeviceForm />
      ) : (
        <NotAllowed title="You may not enter devices" back={{ label: 'Back to the devices', to: '/devices' }}>
          Electrical values are entered by designers and leads.
        </NotAllowed>
      )}
    </Page>
  );
}

import { useQuery } from '@tanstack/react-query';
import { useNavigate, useSearchParams } from 'react-router-dom';

import { ErrorNotice } from '../../../components/error-notice';
import { AFTER_SAVING } from '../../../components/leave-guard';
import { SkeletonRows } from '../../../components/skeleton-rows';
import { duplicateOf, NEW_DEVICE, type DeviceDraft } from '../lib/device-draft';
import { useCreateDevice } from '../mutations';
import { deviceQuery } from '../queries';
import { DeviceForm } from './device-form';

/** `?from=<id>` starts with the values of another device. */
export function NewDeviceForm() {
  const [params] = useSearchParams();
  const from = params.get('from');
  return from === null ? <CreateForm initial={NEW_DEVICE} /> : <DuplicateForm deviceId={from} />;
}

function DuplicateForm({ deviceId }: { deviceId: string }) {
  const { data: device, error, refetch } = useQuery(deviceQuery(deviceId));
  if (device) return <CreateForm initial={duplicateOf(device)} />;
  if (error)
    return <ErrorNotice error={error} title="Its values could not be loaded." onRetry={() => void refetch()} />;
  return <SkeletonRows />;
}

function CreateForm({ initial }: { initial: DeviceDraft }) {
  const navigate = useNavigate();
  const create = useCreateDevice();
  return (
    <DeviceForm
      initial={initial}
      kindFixed={false}
      submitLabel="Save the device"
      cancelTo="/devices"
      saving={create.isPending}
      saved={create.isSuccess}
      error={create.error}
      onSubmit={(draft) =>
        create.mutate(draft, { onSuccess: (device) => void navigate(`/devices/${device.id}`, AFTER_SAVING) })
      }
    />
  );
}

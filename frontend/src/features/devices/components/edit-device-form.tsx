import { useState } from 'react';
import { useNavigate } from 'react-router-dom';

import type { DeviceDto } from '../../../api/types';
import { AFTER_SAVING } from '../../../components/leave-guard';
import { draftOf, type DeviceDraft } from '../lib/device-draft';
import { useUpdateDevice } from '../mutations';
import { DeviceForm } from './device-form';

export function EditDeviceForm({ device }: { device: DeviceDto }) {
  const navigate = useNavigate();
  // The version that was read when the form opened: a refetch behind it must not hide a conflict.
  const [version, setVersion] = useState(device.version);
  const [initial] = useState(() => draftOf(device));
  const update = useUpdateDevice(device.id);
  const save = (draft: DeviceDraft, of: number): void =>
    update.mutate({ draft, version: of }, { onSuccess: () => void navigate(`/devices/${device.id}`, AFTER_SAVING) });
  return (
    <DeviceForm
      initial={initial}
      kindFixed
      submitLabel="Save"
      cancelTo={`/devices/${device.id}`}
      saving={update.isPending}
      saved={update.isSuccess}
      error={update.error}
      onSubmit={(draft) => save(draft, version)}
      onSaveOver={(draft, newer) => save(draft, newer.version)}
      onTakeTheirs={(newer) => {
        setVersion(newer.version);
        update.reset();
      }}
      onCloseConflict={() => update.reset()}
    />
  );
}

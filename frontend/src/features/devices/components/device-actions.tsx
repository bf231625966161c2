import { App, Button, Modal } from 'antd';
import { useNavigate } from 'react-router-dom';

import { isApiError } from '../../../api/api-error';
import type { DeviceDto, DeviceUses } from '../../../api/types';
import { LinkButton } from '../../../components/link-button';
import { useHasRole } from '../../../components/session-context';
import { useDeleteDevice, useVerifyDevice, useWithdrawVerification } from '../mutations';
import { UseList } from './device-uses';

const messageOf = (error: unknown): string => (isApiError(error) ? error.message : 'It did not work. Try again.');

/** 409 in_use says where: in the error itself, as a list of stages and the number of those that are hidden. */
function usesOf(error: unknown): DeviceUses | null {
  if (!isApiError(error) || error.code !== 'in_use') return null;
  const { where, hiddenCount } = error.details;
  if (!Array.isArray(where)) return null;
  return { where: where as DeviceUses['where'], hiddenCount: typeof hiddenCount === 'number' ? hiddenCount : 0 };
}

export function DeviceActions({ device }: { device: DeviceDto }) {
  const mayCreate = useHasRole('designer', 'lead');
  return (
    <>
      <VerifyButton device={device} />
      {mayCreate && <LinkButton to={`/devices/new?from=${device.id}`}>Duplicate</LinkButton>}
      {device.can.edit && <LinkButton to={`/devices/${device.id}/edit`}>Edit</LinkButton>}
      {device.can.delete && <DeleteButton device={device} />}
    </>
  );
}

function VerifyButton({ device }: { device: DeviceDto }) {
  const { message } = App.useApp();
  const verify = useVerifyDevice(device.id);
  const withdraw = useWithdrawVerification(device.id);
  const onError = (error: unknown): void => void message.error(messageOf(error));
  if (!device.can.verify) return null;
  return device.verifiedBy ? (
    <Button loading={withdraw.isPending} onClick={() => withdraw.mutate(device.version, { onError })}>
      Withdraw the comparison
    </Button>
  ) : (
    <Button
      loading={verify.isPending}
      title="You compared every value with the datasheet"
      onClick={() => verify.mutate(device.version, { onError })}
    >
      Mark as compared with the datasheet
    </Button>
  );
}

function DeleteButton({ device }: { device: DeviceDto }) {
  const { modal } = App.useApp();
  const navigate = useNavigate();
  const remove = useDeleteDevice();
  const ask = (): void =>
    void modal.confirm({
      title: `Delete ${device.partNumber}?`,
      content: 'Its values and its quote are deleted with it. This cannot be undone.',
      okText: 'Delete',
      okButtonProps: { danger: true },
      onOk: () => remove.mutate(device, { onSuccess: () => void navigate('/devices') }),
    });
  return (
    <>
      <Button danger loading={remove.isPending} onClick={ask}>
        Delete
      </Button>
      <RefusedDelete device={device} error={remove.error} onClose={() => remove.reset()} />
    </>
  );
}

interface RefusedDeleteProps {
  device: DeviceDto;
  error: unknown;
  onClose: () => void;
}

/** Names the stages that use the device; its links need the router, so it is drawn in place. */
function RefusedDelete({ device, error, onClose }: RefusedDeleteProps) {
  const uses = usesOf(error);
  return (
    <Modal
      open={Boolean(error)}
      title={`${device.partNumber} was not deleted`}
      width={560}
      onCancel={onClose}
      footer={<Button onClick={onClose}>Close</Button>}
    >
      <p>{uses ? 'It is used in:' : messageOf(error)}</p>
      {uses && <UseList uses={uses} />}
    </Modal>
  );
}

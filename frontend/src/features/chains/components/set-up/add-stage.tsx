import { useQuery } from '@tanstack/react-query';
import Modal from 'antd/es/modal';
import Radio from 'antd/es/radio';
import Skeleton from 'antd/es/skeleton';
import { useState } from 'react';
import { Link } from 'react-router-dom';

import type { DeviceDto, DeviceKind, StageKind } from '../../../../api/types';
import { ErrorNotice } from '../../../../components/error-notice';
import { SelectField } from '../../../../components/select-field';
import { newId } from '../../lib/new-id';
import { needsDevice, newStage, STAGE_KINDS } from '../../lib/stage-defaults';
import { devicesOfKindQuery } from '../../queries';
import { useWorkspace } from '../workspace-context';
import styles from './add-stage.module.css';

/** Kind first, then the device it is made with; the rest is set up in place. */
export function AddStage({ onClose }: { onClose: () => void }) {
  const { edits, address, control } = useWorkspace();
  const [kind, setKind] = useState<StageKind>('voltage-feedback');
  const [chosen, setChosen] = useState<DeviceDto | null>(null);
  const device = useDeviceChoice(kind, chosen);
  const { stages, specification } = control.draft;
  const atCurrentSource = stages.length === 0 && specification.source.kind === 'current';
  const stage = newStage('', kind, device, atCurrentSource);

  const add = () => {
    if (!stage) return;
    const added = { ...stage, id: newId() };
    edits.add(added, address.stageId);
    address.change({ stageId: added.id });
    onClose();
  };

  return (
    <Modal
      open
      title="Add a stage"
      okText="Add"
      okButtonProps={{ disabled: stage === null }}
      onOk={add}
      onCancel={onClose}
      width={520}
    >
      <Radio.Group
        className={styles.kinds}
        aria-label="Kind of stage"
        value={kind}
        onChange={(event) => setKind(event.target.value as StageKind)}
      >
        {STAGE_KINDS.map(({ kind: value, label, note }) => (
          <Radio key={value} value={value} autoFocus={value === kind}>
            {label}
            <span className={styles.note}>{note}</span>
          </Radio>
        ))}
      </Radio.Group>
      {needsDevice(kind) && <DeviceChoice key={kind} kind={kind} device={device} onChange={setChosen} />}
      <p className="soft">
        {address.stageId === null ? 'It goes to the end of the chain.' : 'It goes behind the selected stage.'}
      </p>
    </Modal>
  );
}

/** The chosen device, or the cheapest to begin with. */
function useDeviceChoice(kind: StageKind, chosen: DeviceDto | null): DeviceDto | null {
  const deviceKind = needsDevice(kind) ? kind : 'voltage-feedback';
  const { data } = useQuery(devicesOfKindQuery(deviceKind));
  if (!needsDevice(kind)) return null;
  return chosen?.kind === kind ? chosen : (data?.items.find((each) => each.kind === kind) ?? null);
}

interface DeviceChoiceProps {
  kind: DeviceKind;
  device: DeviceDto | null;
  onChange: (device: DeviceDto) => void;
}

function DeviceChoice({ kind, device, onChange }: DeviceChoiceProps) {
  const query = useQuery(devicesOfKindQuery(kind));
  if (query.error) return <ErrorNotice error={query.error} onRetry={() => void query.refetch()} />;
  if (!query.data) return <Skeleton active title={false} paragraph={{ rows: 1 }} />;
  const { items } = query.data;
  if (items.length === 0) {
    return (
      <p className={styles.none}>
        The library has no device of this kind yet.{' '}
        <Link to={`/devices/new?kind=${kind}`}>Enter one from its datasheet</Link>.
      </p>
    );
  }
  return (
    <SelectField
      label="Device"
      hint="Every other device can be tried in place afterwards."
      value={device?.id ?? ''}
      options={items.map((each) => ({ value: each.id, label: deviceLabel(each) }))}
      onChange={(deviceId) => {
        const found = items.find((each) => each.id === deviceId);
        if (found) onChange(found);
      }}
    />
  );
}

function deviceLabel({ partNumber, grade, maker }: DeviceDto): string {
  return [partNumber, grade === 'rf' ? 'RF' : null, maker].filter(Boolean).join(' · ');
}

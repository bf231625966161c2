import type { DeviceDto } from '../../../api/types';
import { Facts } from '../../../components/facts';
import { formatDay, formatPlainDate } from '../../../lib/dates';
import { GRADE_LABELS, KIND_LABELS, LIFECYCLE_LABELS } from '../lib/device-filters';
import styles from './device-facts.module.css';

function lifecycleText({ lifecycle, lifecycleDate }: DeviceDto): string {
  if (!lifecycle) return 'not looked up';
  return lifecycleDate
    ? `${LIFECYCLE_LABELS[lifecycle]}, ${formatPlainDate(lifecycleDate)}`
    : LIFECYCLE_LABELS[lifecycle];
}

function datasheetText({ datasheet }: DeviceDto): string {
  if (!datasheet) return 'not stated';
  return datasheet.title ? `${datasheet.title}, ${datasheet.revision}` : datasheet.revision;
}

export function DeviceFacts({ device }: { device: DeviceDto }) {
  const facts: readonly (readonly [string, string])[] = [
    ['Maker', device.maker ?? 'not stated'],
    ['Kind', KIND_LABELS[device.kind]],
    ['Grade', GRADE_LABELS[device.grade]],
    ['Package', `${device.package ?? 'not stated'}; ${device.channels} in one`],
    ['Lifecycle', lifecycleText(device)],
    ['Datasheet', datasheetText(device)],
    ['Entered by', `${device.enteredBy.name}, changed ${formatDay(device.updatedAt)}`],
    ['Compared with the datasheet by', device.verifiedBy?.name ?? 'nobody yet'],
  ];
  return (
    <>
      <Facts facts={facts} />
      {device.notes && <p className={styles.notes}>{device.notes}</p>}
    </>
  );
}

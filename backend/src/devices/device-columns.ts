import type { DeviceBodyDto } from './dto/device-body.dto';
import type { Device } from './models/device.model';

/** The columns that a body fills; everything else of it is a datasheet value and goes into `parameters`. */
export interface DeviceColumns {
  readonly kind: Device['kind'];
  readonly partNumber: string;
  readonly maker: string;
  readonly grade: Device['grade'];
  readonly package: string | null;
  readonly lifecycle: Device['lifecycle'];
  readonly lifecycleDate: string | null;
  readonly channels: number;
  readonly datasheetRevision: string | null;
  readonly datasheetTitle: string | null;
  readonly notes: string | null;
  readonly parameters: Readonly<Record<string, unknown>>;
}

export function columnsOf(body: DeviceBodyDto): DeviceColumns {
  const { kind, partNumber, maker, grade, package: housing, lifecycle, lifecycleDate, channels, ...others } = body;
  const { datasheet, notes, ...values } = others;
  const parameters = Object.fromEntries(Object.entries(values).filter(([key]) => key !== 'version'));
  return {
    kind,
    partNumber,
    maker: maker ?? '',
    grade,
    package: housing ?? null,
    lifecycle: lifecycle ?? null,
    lifecycleDate: lifecycleDate ?? null,
    channels,
    datasheetRevision: datasheet?.revision ?? null,
    datasheetTitle: datasheet?.title ?? null,
    notes: notes ?? null,
    // Through JSON once, so that what is compared and recorded is what is stored.
    parameters: JSON.parse(JSON.stringify(parameters)) as Record<string, unknown>,
  };
}

/** What a verification vouches for: another part, another datasheet or another value voids it. */
function vouchedFor(device: DeviceColumns): unknown {
  const { partNumber, maker, package: housing, channels, datasheetRevision, parameters } = device;
  return sorted({ partNumber, maker, housing, channels, datasheetRevision, parameters });
}

export function valuesDiffer(a: DeviceColumns, b: DeviceColumns): boolean {
  return JSON.stringify(vouchedFor(a)) !== JSON.stringify(vouchedFor(b));
}

function sorted(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(sorted);
  if (typeof value !== 'object' || value === null) return value;
  return Object.fromEntries(
    Object.entries(value)
      .sort(([a], [b]) => (a < b ? -1 : 1))
      .map(([key, item]) => [key, sorted(item)]),
  );
}

/** What goes on record about a device. */
export function auditedDevice(device: DeviceColumns): Record<string, unknown> {
  const { kind, partNumber, maker, grade, package: housing, lifecycle, channels, parameters } = device;
  return { kind, partNumber, maker, grade, package: housing, lifecycle, channels, parameters };
}

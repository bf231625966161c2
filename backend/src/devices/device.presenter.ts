import type { Device as EngineDevice, PriceBreak } from '../calculator/engine';
import type { SessionUser } from '../common/session-user';
import type { DeviceRow } from './device-row';
import { canDeleteDevice, canEditDevice, canEditQuote, canVerifyDevice } from './device.policy';
import type { LibraryDeviceDto } from './dto/library-device.dto';
import type { QuoteDto } from './dto/quote.dto';

/** A key that is absent rather than null or empty: absent means unknown to the calculator. */
function whenGiven<K extends string, V>(key: K, value: V | null | undefined | ''): { [P in K]?: V } {
  return value === null || value === undefined || value === '' ? {} : ({ [key]: value } as { [P in K]?: V });
}

function quoteOf(row: DeviceRow): QuoteDto | null {
  if (row.quoteCurrency === null || row.quoteBreaks === null) return null;
  return {
    currency: row.quoteCurrency,
    breaks: JSON.parse(row.quoteBreaks) as PriceBreak[],
    ...whenGiven('reference', row.quoteReference),
    ...whenGiven('validUntil', row.quoteValidUntil),
    ...whenGiven('supplier', row.quoteSupplier),
  };
}

/** The device as the calculator takes it. Its values were checked on the way in and are not looked through again. */
export function toEngineDevice(row: DeviceRow): EngineDevice {
  const device = {
    ...(JSON.parse(row.parameters) as Record<string, unknown>),
    id: row.id,
    kind: row.kind,
    partNumber: row.partNumber,
    grade: row.grade,
    channels: row.channels,
    verified: row.verifiedById !== null,
    ...whenGiven('maker', row.maker),
    ...whenGiven('package', row.package),
    ...whenGiven('lifecycle', row.lifecycle),
    ...whenGiven('quote', quoteOf(row)),
  };
  return device as unknown as EngineDevice;
}

export function presentDevice(row: DeviceRow, user: SessionUser): LibraryDeviceDto {
  const datasheet =
    row.datasheetRevision === null
      ? null
      : { revision: row.datasheetRevision, ...whenGiven('title', row.datasheetTitle) };
  const device = {
    ...toEngineDevice(row),
    version: row.version,
    quoteVersion: row.quoteVersion ?? 0,
    ...whenGiven('datasheet', datasheet),
    ...whenGiven('lifecycleDate', row.lifecycleDate),
    ...whenGiven('notes', row.notes),
    enteredBy: { id: row.enteredById, name: row.enteredByName },
    verifiedBy: row.verifiedById === null ? null : { id: row.verifiedById, name: row.verifiedByName ?? '' },
    updatedAt: new Date(row.updatedAt).toISOString(),
    can: {
      edit: canEditDevice(user),
      delete: canDeleteDevice(user),
      verify: canVerifyDevice(user, row),
      editQuote: canEditQuote(user),
    },
  };
  return device as unknown as LibraryDeviceDto;
}

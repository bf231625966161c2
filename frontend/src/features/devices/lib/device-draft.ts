import type { DatasheetValue, DeviceDto, DeviceKind, Grade, Lifecycle } from '../../../api/types';
import { ALL, type Column } from './device-field';
import { fieldsOf } from './device-fields';

/** A datasheet value being typed. */
export interface SheetDraft {
  readonly min: number | null;
  readonly typ: number | null;
  readonly max: number | null;
  readonly condition: string;
  readonly page: string;
}

export const EMPTY_SHEET: SheetDraft = { min: null, typ: null, max: null, condition: '', page: '' };

/** What the device form edits. Values of another kind stay while somebody switches the kind to and fro. */
export interface DeviceDraft {
  readonly kind: DeviceKind;
  readonly partNumber: string;
  readonly maker: string;
  readonly grade: Grade;
  readonly package: string;
  readonly lifecycle: Lifecycle | '';
  readonly lifecycleDate: string;
  readonly channels: number | null;
  readonly datasheetRevision: string;
  readonly datasheetTitle: string;
  readonly notes: string;
  readonly sheets: Readonly<Record<string, SheetDraft>>;
  readonly numbers: Readonly<Record<string, number | null>>;
}

export const NEW_DEVICE: DeviceDraft = {
  kind: 'voltage-feedback',
  partNumber: '',
  maker: '',
  grade: 'general-purpose',
  package: '',
  lifecycle: 'active',
  lifecycleDate: '',
  channels: 1,
  datasheetRevision: '',
  datasheetTitle: '',
  notes: '',
  sheets: {},
  numbers: {},
};

const isSheet = (value: unknown): value is DatasheetValue => typeof value === 'object' && value !== null;

/** The value that a device has under a field's key. */
export function valueOf(device: DeviceDto, key: string): unknown {
  return (device as unknown as Readonly<Record<string, unknown>>)[key];
}

export function sheetOf(device: DeviceDto, key: string): DatasheetValue | null {
  const value = valueOf(device, key);
  return isSheet(value) ? value : null;
}

const sheetDraft = ({ min, typ, max, condition, page }: DatasheetValue): SheetDraft => ({
  min: min ?? null,
  typ: typ ?? null,
  max: max ?? null,
  condition: condition ?? '',
  page: page ?? '',
});

export function draftOf(device: DeviceDto): DeviceDraft {
  const sheets: Record<string, SheetDraft> = {};
  const numbers: Record<string, number | null> = {};
  for (const { key, columns } of fieldsOf(device.kind)) {
    const value = valueOf(device, key);
    if (columns.length > 0 && isSheet(value)) sheets[key] = sheetDraft(value);
    if (columns.length === 0 && typeof value === 'number') numbers[key] = value;
  }
  return {
    kind: device.kind,
    ...identityOf(device),
    sheets,
    numbers,
  };
}

const given = (value: string | undefined): string => value ?? '';

function identityOf(device: DeviceDto): Omit<DeviceDraft, 'kind' | 'sheets' | 'numbers'> {
  return {
    partNumber: device.partNumber,
    maker: given(device.maker),
    grade: device.grade,
    package: given(device.package),
    lifecycle: device.lifecycle ?? '',
    lifecycleDate: given(device.lifecycleDate),
    channels: device.channels,
    datasheetRevision: given(device.datasheet?.revision),
    datasheetTitle: given(device.datasheet?.title),
    notes: given(device.notes),
  };
}

/** A new device with the values of another: same values, own part number. */
export function duplicateOf(device: DeviceDto): DeviceDraft {
  return { ...draftOf(device), partNumber: `${device.partNumber} copy` };
}

const hasColumn = (sheet: SheetDraft): boolean => ALL.some((column) => sheet[column] !== null);

const ORDER: readonly (readonly [Column, Column])[] = [
  ['min', 'typ'],
  ['typ', 'max'],
  ['min', 'max'],
];

/** "min must not be above typ" at the first column of the pair that is the wrong way round. */
function orderProblem(key: string, sheet: SheetDraft): readonly [string, string] | null {
  for (const [lower, upper] of ORDER) {
    const low = sheet[lower];
    const high = sheet[upper];
    if (low !== null && high !== null && low > high) return [`${key}.${lower}`, `${lower} is above ${upper}.`];
  }
  return null;
}

function identityProblems(draft: DeviceDraft): Record<string, string> {
  const problems: Record<string, string> = {};
  if (draft.partNumber.trim() === '') problems['partNumber'] = 'The exact orderable part number is needed.';
  if (draft.channels === null) problems['channels'] = 'How many are in one package is needed.';
  if (draft.datasheetTitle.trim() !== '' && draft.datasheetRevision.trim() === '') {
    problems['datasheet.revision'] = 'Give the revision or date that is printed on the datasheet.';
  }
  return problems;
}

/** What the form can tell by itself, under the server's paths. */
export function deviceProblems(draft: DeviceDraft): Readonly<Record<string, string>> {
  const problems = identityProblems(draft);
  for (const { key, label, columns, required } of fieldsOf(draft.kind)) {
    if (columns.length === 0) {
      if (required && (draft.numbers[key] ?? null) === null) problems[key] = 'Needed for every figure.';
      continue;
    }
    const sheet = draft.sheets[key] ?? EMPTY_SHEET;
    if (required && !hasColumn(sheet)) problems[key] = `${label}: at least one of ${columns.join(', ')} is needed.`;
    const order = orderProblem(key, sheet);
    if (order) problems[order[0]] = order[1];
  }
  return problems;
}

const text = (value: string): string | undefined => (value.trim() === '' ? undefined : value.trim());
const number = (value: number | null): number | undefined => value ?? undefined;

function sheetBody(sheet: SheetDraft): DatasheetValue | undefined {
  if (!hasColumn(sheet)) return undefined;
  return {
    min: number(sheet.min),
    typ: number(sheet.typ),
    max: number(sheet.max),
    condition: text(sheet.condition),
    page: text(sheet.page),
  };
}

/** The request body: what is empty is left out, so that it is unknown and not zero. */
export function deviceBody(draft: DeviceDraft): Record<string, unknown> {
  const values: Record<string, unknown> = {};
  for (const { key, columns } of fieldsOf(draft.kind)) {
    values[key] =
      columns.length === 0 ? number(draft.numbers[key] ?? null) : sheetBody(draft.sheets[key] ?? EMPTY_SHEET);
  }
  const revision = text(draft.datasheetRevision);
  return {
    kind: draft.kind,
    partNumber: draft.partNumber.trim(),
    maker: text(draft.maker),
    grade: draft.grade,
    package: text(draft.package),
    lifecycle: draft.lifecycle === '' ? undefined : draft.lifecycle,
    lifecycleDate: text(draft.lifecycleDate),
    channels: draft.channels,
    datasheet: revision === undefined ? undefined : { revision, title: text(draft.datasheetTitle) },
    notes: text(draft.notes),
    ...values,
  };
}

import type { DeviceKind, Grade, Lifecycle } from '../../../api/types';

/** Filters, order and page of the device list; all of it stands in the address. */
export interface DeviceFilters {
  readonly search: string;
  readonly kind: DeviceKind | '';
  readonly grade: Grade | '';
  readonly lifecycle: Lifecycle | '';
  readonly minimumGbwHz: number | null;
  readonly maximumPriceMicros: number | null;
  readonly verified: 'true' | 'false' | '';
  readonly sort: DeviceSort;
  readonly order: 'asc' | 'desc';
  readonly page: number;
}

export const DEVICE_SORTS = ['partNumber', 'gbw', 'price', 'updated'] as const;
export type DeviceSort = (typeof DEVICE_SORTS)[number];

export const PAGE_SIZE = 50;

export const KIND_LABELS: Readonly<Record<DeviceKind, string>> = {
  'voltage-feedback': 'Voltage feedback',
  'current-feedback': 'Current feedback',
  'matched-block': 'Matched block',
};

export const GRADE_LABELS: Readonly<Record<Grade, string>> = { 'general-purpose': 'General purpose', rf: 'RF' };

export const LIFECYCLE_LABELS: Readonly<Record<Lifecycle, string>> = {
  active: 'Active',
  'not-recommended': 'Not recommended for new designs',
  'last-time-buy': 'Last-time buy',
  obsolete: 'Obsolete',
};

export const NO_FILTERS: DeviceFilters = {
  search: '',
  kind: '',
  grade: '',
  lifecycle: '',
  minimumGbwHz: null,
  maximumPriceMicros: null,
  verified: '',
  sort: 'partNumber',
  order: 'asc',
  page: 1,
};

function oneOf<T extends string>(text: string | null, allowed: readonly T[]): T | '' {
  return allowed.find((each) => each === text) ?? '';
}

function positive(text: string | null): number | null {
  const value = text === null || text === '' ? Number.NaN : Number(text);
  return Number.isFinite(value) && value > 0 ? value : null;
}

const keys = <T extends string>(labels: Readonly<Record<T, string>>): readonly T[] => Object.keys(labels) as T[];

/** Whatever stands in the address that is no filter is passed over: old links keep working. */
export function readFilters(search: URLSearchParams): DeviceFilters {
  return {
    search: search.get('search') ?? '',
    kind: oneOf(search.get('kind'), keys(KIND_LABELS)),
    grade: oneOf(search.get('grade'), keys(GRADE_LABELS)),
    lifecycle: oneOf(search.get('lifecycle'), keys(LIFECYCLE_LABELS)),
    minimumGbwHz: positive(search.get('minimumGbwHz')),
    maximumPriceMicros: positive(search.get('maximumPriceMicros')),
    verified: oneOf(search.get('verified'), ['true', 'false']),
    sort: oneOf(search.get('sort'), DEVICE_SORTS) || 'partNumber',
    order: search.get('order') === 'desc' ? 'desc' : 'asc',
    page: Math.max(1, Math.floor(positive(search.get('page')) ?? 1)),
  };
}

/** Only what differs from the default, in a fixed order. */
function entries(filters: DeviceFilters): readonly (readonly [string, string])[] {
  return (Object.keys(NO_FILTERS) as (keyof DeviceFilters)[])
    .filter((key) => filters[key] !== NO_FILTERS[key])
    .map((key) => [key, String(filters[key])] as const);
}

export function writeFilters(filters: DeviceFilters): URLSearchParams {
  return new URLSearchParams(entries(filters).map(([key, value]) => [key, value]));
}

/** Query of the request. */
export function filterParams(filters: DeviceFilters): Record<string, string | number> {
  return {
    ...Object.fromEntries(entries(filters)),
    sort: filters.sort,
    order: filters.order,
    page: filters.page,
    pageSize: PAGE_SIZE,
  };
}

/** Whether anything but order and page narrows the list. */
export function isNarrowed(filters: DeviceFilters): boolean {
  return entries(filters).some(([key]) => key !== 'sort' && key !== 'order' && key !== 'page');
}

import { API_LIMITS } from '../../../api/limits';
import type { QuantityLimits, QuantityUnit } from '../../../lib/quantity-units';

/** Columns of a datasheet value. */
export type Column = 'min' | 'typ' | 'max';

export interface DeviceField extends QuantityLimits {
  /** Name in the device's data. */
  readonly key: string;
  readonly label: string;
  /** Symbol as datasheets print it. */
  readonly symbol?: string;
  readonly unit: QuantityUnit;
  /** Columns that are offered; empty: a single number. */
  readonly columns: readonly Column[];
  readonly required?: boolean;
  /** What a missing value means for the figures; empty where it is required. */
  readonly without: string;
  readonly placeholder?: string;
}

export interface DeviceFieldGroup {
  readonly title: string;
  readonly fields: readonly DeviceField[];
}

export const ALL: readonly Column[] = ['min', 'typ', 'max'];
export const MIN_TYP: readonly Column[] = ['min', 'typ'];
export const TYP_MAX: readonly Column[] = ['typ', 'max'];
export const SINGLE: readonly Column[] = [];

interface LimitEntry {
  readonly minimum?: number;
  readonly maximum?: number;
  readonly maxLength?: number;
}

const LIMITS: Readonly<Record<string, LimitEntry>> = {
  ...API_LIMITS.MatchedBlockDeviceBody,
  ...API_LIMITS.CurrentFeedbackDeviceBody,
  ...API_LIMITS.VoltageFeedbackDeviceBody,
};

type More = Pick<DeviceField, 'symbol' | 'placeholder'>;

/** A value that may be missing; `without` says what is then not known. Its limits are the server's. */
export function optional(
  key: string,
  label: string,
  unit: QuantityUnit,
  columns: readonly Column[],
  without: string,
  more: More = {},
): DeviceField {
  const { minimum, maximum } = LIMITS[key] ?? {};
  return { key, label, unit, columns, without, minimum, maximum, ...more };
}

export function required(
  key: string,
  label: string,
  unit: QuantityUnit,
  columns: readonly Column[],
  more: More = {},
): DeviceField {
  return { ...optional(key, label, unit, columns, '', more), required: true };
}

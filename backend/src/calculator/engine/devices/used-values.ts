import type { UsedValue } from '../analysis';
import type {
  AmplifierDevice,
  CurrentFeedbackDevice,
  DatasheetValue,
  GbwCase,
  MatchedBlockDevice,
  Policy,
  VoltageFeedbackDevice,
} from '../types';

/** 'maximum' is the other end of the spread: only stability asks for it. */
export type DeviceCorner = GbwCase | 'maximum';

function plain(
  value: number,
  basis: UsedValue['basis'],
  text: string,
  source?: Pick<DatasheetValue, 'page' | 'condition'>,
): UsedValue {
  return { value, basis, text, page: source?.page, condition: source?.condition };
}

/** Digits that a factor prints with: 0.7, 1.3, 0.6667 — enough for a working to multiply with. */
function factorText(factor: number): string {
  return String(Number(factor.toPrecision(6)));
}

/** The lower end of a spread: `min`, else typ × derating (assumed). `sheet` needs min or typ. */
function minimumOf(sheet: DatasheetValue, derating: number): UsedValue {
  if (sheet.min !== undefined) return plain(sheet.min, 'min', 'minimum', sheet);
  return plain((sheet.typ ?? NaN) * derating, 'typ-derated', `typical × ${factorText(derating)}`, sheet);
}

function typicalOf(sheet: DatasheetValue): UsedValue {
  if (sheet.typ !== undefined) return plain(sheet.typ, 'typ', 'typical', sheet);
  return plain(sheet.min ?? NaN, 'min', 'minimum (typical not given)', sheet);
}

function maximumOf(sheet: DatasheetValue, derating: number): UsedValue {
  if (sheet.max !== undefined) return plain(sheet.max, 'max', 'maximum', sheet);
  const typical = typicalOf(sheet);
  const factor = 2 - derating;
  return plain(typical.value * factor, 'typ-derated', `${typical.text} × ${factorText(factor)}`, sheet);
}

function spreadValue(sheet: DatasheetValue, policy: Policy, corner: DeviceCorner): UsedValue {
  if (corner === 'typical') return typicalOf(sheet);
  if (corner === 'maximum') return maximumOf(sheet, policy.gbwDerating);
  const minimum = minimumOf(sheet, policy.gbwDerating);
  if (corner === 'minimum' || hotIsMinimum(policy)) return minimum;
  return {
    ...minimum,
    value: minimum.value * policy.temperatureFactor,
    text: `${minimum.text} × ${factorText(policy.temperatureFactor)} (hot)`,
  };
}

/** True when the hot case counts with the very values of the minimum case: nothing has to be computed twice. */
export function hotIsMinimum(policy: Policy): boolean {
  return policy.temperatureFactor === 1;
}

/**
 * Gain-bandwidth product that a case counts with, Hz. `min` where the datasheet gives it, else typ × derating (assumed);
 * the hot case multiplies by the policy's temperature factor; 'maximum' is max, else typ × (2 − derating).
 * Without a typical value the minimum stands for it. Common practice.
 *
 * @example gbwFor(device /* 100 MHz typ, 75 MHz min *\/, DEFAULT_POLICY, 'minimum').value // 75e6
 */
export function gbwFor(device: VoltageFeedbackDevice, policy: Policy, corner: DeviceCorner): UsedValue {
  return spreadValue(device.gainBandwidthHz, policy, corner);
}

/** Reference bandwidth of a current-feedback amplifier, Hz; same rules as {@link gbwFor}. */
export function referenceBandwidthFor(device: CurrentFeedbackDevice, policy: Policy, corner: DeviceCorner): UsedValue {
  return spreadValue(device.referenceBandwidthHz, policy, corner);
}

/**
 * Upper −3 dB corner of a matched block, Hz; same rules as {@link gbwFor}. Null: flat upwards.
 *
 * @example upperCornerFor(block /* 1 GHz typ *\/, DEFAULT_POLICY, 'minimum')?.value // 0.7e9
 */
export function upperCornerFor(device: MatchedBlockDevice, policy: Policy, corner: DeviceCorner): UsedValue | null {
  return device.upperCornerHz ? spreadValue(device.upperCornerHz, policy, corner) : null;
}

/** Slew rate that is judged, V/s: the minimum, else typ × slew derating, in every case; null when not entered. */
export function slewFor(device: AmplifierDevice, policy: Policy): UsedValue | null {
  const sheet = device.slewRateVPerS;
  if (!sheet || (sheet.min === undefined && sheet.typ === undefined)) return null;
  return minimumOf(sheet, policy.slewDerating);
}

const COLUMN_TEXT = { min: 'minimum', typ: 'typical', max: 'maximum' } as const;
type Column = keyof typeof COLUMN_TEXT;

/** First column of `order` that the datasheet gives; null when there is no value at all. */
export function columnOf(sheet: DatasheetValue | undefined, order: readonly Column[]): UsedValue | null {
  if (!sheet) return null;
  for (const column of order) {
    const value = sheet[column];
    if (value !== undefined) return plain(value, column, COLUMN_TEXT[column], sheet);
  }
  return null;
}

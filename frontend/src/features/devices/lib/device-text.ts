import type { DatasheetValue, DeviceDto, Quote } from '../../../api/types';
import { describeQuantity, type QuantityUnit } from '../../../lib/quantity-units';
import { formatMicros } from '../../../lib/money';
import type { Column } from './device-field';

/** A column of a datasheet value as printed; empty where the datasheet gives none. */
export function columnText(sheet: DatasheetValue | null | undefined, column: Column, unit: QuantityUnit): string {
  const value = sheet?.[column];
  return value === undefined ? '' : describeQuantity(value, unit);
}

/** What a list shows as the bandwidth of a device: GBW, or the reference bandwidth where there is none. */
export function bandwidthOf(device: DeviceDto): { readonly sheet: DatasheetValue; readonly note: string } | null {
  if (device.kind === 'voltage-feedback') return { sheet: device.gainBandwidthHz, note: '' };
  if (device.kind === 'current-feedback') return { sheet: device.referenceBandwidthHz, note: 'no GBW; bandwidth' };
  return device.upperCornerHz ? { sheet: device.upperCornerHz, note: 'no GBW; corner' } : null;
}

/** "0.55 USD at 1000": the lowest price and where it starts. */
export function lowestPriceText(quote: Quote | undefined): string | null {
  if (!quote || quote.breaks.length === 0) return null;
  const lowest = quote.breaks.reduce((best, step) => (step.unitPriceMicros < best.unitPriceMicros ? step : best));
  const price = `${formatMicros(lowest.unitPriceMicros, quote.currency)}\u00a0${quote.currency}`;
  return lowest.quantity > 1 ? `${price} at ${lowest.quantity}` : price;
}

import type { Specification } from '../calculator/engine';

const PREFIXES: readonly (readonly [number, string])[] = [
  [1e9, 'G'],
  [1e6, 'M'],
  [1e3, 'k'],
  [1, ''],
  [1e-3, 'm'],
];

const number = (value: number): string => String(Number(value.toPrecision(6))).replace('-', '−');

function scaled(value: number): { scale: number; prefix: string } {
  const [scale, prefix] = PREFIXES.find(([limit]) => Math.abs(value) >= limit) ?? [1, ''];
  return { scale, prefix };
}

function hertz(value: number): string {
  const { scale, prefix } = scaled(value);
  return `${number(value / scale)} ${prefix}Hz`;
}

/** One unit for both edges where that reads well. */
function range(low: number, high: number): string {
  const { scale, prefix } = scaled(high);
  if (prefix !== scaled(low).prefix) return `${hertz(low)}–${hertz(high)}`;
  return `${number(low / scale)}–${number(high / scale)} ${prefix}Hz`;
}

function supply({ positiveV, negativeV }: Specification['supply']): string {
  if (negativeV === 0) return `${number(positiveV)} V single`;
  return positiveV === -negativeV ? `±${number(positiveV)} V` : `+${number(positiveV)} / ${number(negativeV)} V`;
}

/**
 * The specification in one line, for lists.
 *
 * @example specificationText(spec) // "60 ±1 dB at 5 MHz · 3–7 MHz · ±5 V"
 */
export function specificationText({ band, requirements, supply: rails, gainBasis }: Specification): string {
  const unit = gainBasis === 'transimpedance' ? 'dBΩ' : 'dB';
  const gain = requirements.gainDb;
  const wanted = gain ? `${number(gain.target)} ±${number(gain.tolerance)} ${unit} at ` : '';
  return [`${wanted}${hertz(band.operatingHz)}`, range(band.lowHz, band.highHz), supply(rails)].join(' · ');
}

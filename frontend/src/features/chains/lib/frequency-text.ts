import { formatValue } from '../../../lib/format-figure';
import type { Band, GbwCase, StageReport } from '../../../api/types';

/** Enough digits for a typed frequency, none that it does not have: 433.92 MHz, 5 MHz. */
export function frequencyText(frequencyHz: number): string {
  const digits = Math.max(
    1,
    Number(frequencyHz.toPrecision(7)).toExponential().split('e')[0]?.replace('.', '').length ?? 3,
  );
  return formatValue(frequencyHz, 'Hz', digits);
}

/** "3 – 7 MHz"; both units where they differ. */
export function bandText(band: Pick<Band, 'lowHz' | 'highHz'>): string {
  const low = frequencyText(band.lowHz);
  const high = frequencyText(band.highHz);
  const unit = /[\s\u202f]\S+$/.exec(high)?.[0] ?? '';
  return low.endsWith(unit) ? `${low.slice(0, low.length - unit.length)} – ${high}` : `${low} – ${high}`;
}

/** The frequency that the GBW column speaks of: where each stage's headroom is the lower one. */
export function gbwColumnTitle(stages: readonly StageReport[], gbwCase: GbwCase, band: Band): string {
  const withGbw = stages.filter((stage) => stage.hasGbw).map((stage) => stage.cases[gbwCase].figures);
  const allAtTop = withGbw.every((figures) => figures.gbwUsed.value === figures.gbwUsedTop.value);
  return allAtTop
    ? `GBW at ${frequencyText(band.highHz)}`
    : `GBW, worse of ${frequencyText(band.operatingHz)} and ${frequencyText(band.highHz)}`;
}

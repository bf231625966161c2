import { scaleLinear, scaleLog } from 'd3-scale';
import { area, line } from 'd3-shape';

export type Values = readonly (number | null)[];

export interface PlotBox {
  readonly width: number;
  readonly height: number;
  readonly left: number;
  readonly right: number;
  readonly top: number;
  readonly bottom: number;
}

export interface PlotScales {
  readonly x: (frequencyHz: number) => number;
  readonly y: (gainDb: number) => number;
  readonly frequencyAt: (px: number) => number;
}

export function plotScales(
  box: PlotBox,
  frequencyRange: readonly [number, number],
  gainRange: readonly [number, number],
): PlotScales {
  const x = scaleLog()
    .domain(frequencyRange)
    .range([box.left, box.width - box.right])
    .clamp(true);
  const y = scaleLinear()
    .domain(gainRange)
    .range([box.height - box.bottom, box.top]);
  return { x: (f) => x(f), y: (g) => y(g), frequencyAt: (px) => x.invert(px) };
}

/** The path of one curve; points without an answer leave a gap. */
export function curvePath(scales: PlotScales, frequenciesHz: readonly number[], values: Values): string {
  const draw = line<number>()
    .defined((index) => values[index] !== null && values[index] !== undefined)
    .x((index) => scales.x(frequenciesHz[index] ?? 0))
    .y((index) => scales.y(values[index] ?? 0));
  return draw([...frequenciesHz.keys()]) ?? '';
}

/** Lowest and highest of several curves at every point; null where one of them has no answer. */
export function envelope(curves: readonly Values[]): { low: Values; high: Values } {
  const length = Math.max(0, ...curves.map((curve) => curve.length));
  const low: (number | null)[] = [];
  const high: (number | null)[] = [];
  for (let index = 0; index < length; index++) {
    const at = curves.map((curve) => curve[index] ?? null).filter((value) => value !== null);
    const complete = at.length === curves.length && at.length > 0;
    low.push(complete ? Math.min(...at) : null);
    high.push(complete ? Math.max(...at) : null);
  }
  return { low, high };
}

export function envelopePath(scales: PlotScales, frequenciesHz: readonly number[], curves: readonly Values[]): string {
  const { low, high } = envelope(curves);
  const draw = area<number>()
    .defined((index) => low[index] !== null)
    .x((index) => scales.x(frequenciesHz[index] ?? 0))
    .y0((index) => scales.y(low[index] ?? 0))
    .y1((index) => scales.y(high[index] ?? 0));
  return draw([...frequenciesHz.keys()]) ?? '';
}

/** The index of the point nearest to a frequency, on the logarithmic axis. */
export function nearestIndex(frequenciesHz: readonly number[], frequencyHz: number): number {
  let best = 0;
  let bestDistance = Infinity;
  frequenciesHz.forEach((each, index) => {
    const distance = Math.abs(Math.log(each / frequencyHz));
    if (distance < bestDistance) {
      best = index;
      bestDistance = distance;
    }
  });
  return best;
}

const ROOM_DB = 3;
/** Far below the interesting part a curve only costs height. */
const DEPTH_DB = 42;

/** A gain range that shows the tops and the −3 dB points of all curves, on steps of 10 dB (3 dB for flat pictures). */
export function gainRange(curves: readonly Values[], extra: readonly number[] = []): [number, number] {
  const values = [...curves.flat(), ...extra].filter((value) => value !== null);
  if (values.length === 0) return [-20, 20];
  const top = Math.max(...values);
  const tops = curves.map((curve) => Math.max(...curve.filter((value) => value !== null)));
  const lowestTop = Math.min(...tops.filter(Number.isFinite), ...extra, top);
  const floor = Math.max(Math.min(...values), lowestTop - DEPTH_DB / 2, top - DEPTH_DB * 2);
  const step = 10;
  return [Math.floor((floor - ROOM_DB) / step) * step, Math.ceil((top + ROOM_DB) / step) * step];
}

/** Round gain values for the axis. */
export function gainTicks(range: readonly [number, number], count = 6): number[] {
  return scaleLinear().domain(range).ticks(count);
}

/** 1-2-5 frequencies for the axis, with decades marked. */
export function frequencyTicks(range: readonly [number, number]): { frequencyHz: number; decade: boolean }[] {
  const ticks: { frequencyHz: number; decade: boolean }[] = [];
  for (let exponent = Math.floor(Math.log10(range[0])); exponent <= Math.ceil(Math.log10(range[1])); exponent++) {
    for (let mantissa = 1; mantissa < 10; mantissa++) {
      const frequencyHz = Number(`${mantissa}e${exponent}`);
      if (frequencyHz >= range[0] && frequencyHz <= range[1]) ticks.push({ frequencyHz, decade: mantissa === 1 });
    }
  }
  return ticks;
}

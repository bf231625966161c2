import { scaleLog } from 'd3-scale';
import type { FrequencyAxis, Lane } from '../../../api/types';

/** All positions are fractions of the lane's width, so that one drawing fits every column width. */
export interface LaneGeometry {
  /** Null: nothing is known to draw. */
  readonly solid: Span | null;
  readonly fading: Span | null;
  readonly tick: number | null;
  readonly typicalTick: number | null;
  readonly band: Span;
  /** The low corner is inside the axis. */
  readonly startsInside: boolean;
  /** The lane goes on beyond the axis. */
  readonly openEnded: boolean;
}

export interface Span {
  readonly from: number;
  readonly to: number;
}

export interface AxisTick {
  readonly at: number;
  readonly frequencyHz: number;
  /** Decades carry a label. */
  readonly decade: boolean;
}

export function frequencyScale(axis: FrequencyAxis): (frequencyHz: number) => number {
  return scaleLog().domain([axis.fromHz, axis.toHz]).range([0, 1]).clamp(true);
}

/** Narrow bands stay visible. */
const BAND_MINIMUM = 0.006;

function widened(from: number, to: number): Span {
  if (to - from >= BAND_MINIMUM) return { from, to };
  const middle = (from + to) / 2;
  return { from: Math.max(0, middle - BAND_MINIMUM / 2), to: Math.min(1, middle + BAND_MINIMUM / 2) };
}

function insideTick(axis: FrequencyAxis, frequencyHz: number | null): number | null {
  if (frequencyHz === null || frequencyHz < axis.fromHz || frequencyHz > axis.toHz) return null;
  return frequencyScale(axis)(frequencyHz);
}

export function laneGeometry(lane: Lane, axis: FrequencyAxis): LaneGeometry {
  const x = frequencyScale(axis);
  const start = lane.lowerHz === null ? 0 : x(lane.lowerHz);
  const band = widened(x(lane.bandLowHz), x(lane.bandHighHz));
  const common = {
    band,
    tick: insideTick(axis, lane.cornerHz),
    typicalTick: insideTick(axis, lane.typicalCornerHz),
    startsInside: lane.lowerHz !== null && lane.lowerHz > axis.fromHz,
  };
  const end = lane.cornerHz ?? lane.solidToHz;
  if (end === null) return { ...common, solid: null, fading: null, openEnded: false };
  const solidTo = Math.max(start, x(lane.solidToHz ?? end));
  const fadesTo = Math.max(solidTo, x(end));
  return {
    ...common,
    solid: solidTo > start ? { from: start, to: solidTo } : null,
    fading: fadesTo > solidTo ? { from: solidTo, to: fadesTo } : null,
    openEnded: end > axis.toHz,
  };
}

/** A lane without any limit on the upper side runs through to the end of the axis. */
export function unlimitedLane(lane: Lane, axis: FrequencyAxis): LaneGeometry {
  return { ...laneGeometry({ ...lane, solidToHz: axis.toHz, cornerHz: null }, axis), openEnded: true };
}

export function axisTicks(axis: FrequencyAxis): AxisTick[] {
  const x = frequencyScale(axis);
  const ticks: AxisTick[] = [];
  const first = Math.floor(Math.log10(axis.fromHz));
  const last = Math.ceil(Math.log10(axis.toHz));
  for (let exponent = first; exponent <= last; exponent++) {
    const frequencyHz = Number(`1e${exponent}`);
    if (frequencyHz < axis.fromHz || frequencyHz > axis.toHz) continue;
    ticks.push({ at: x(frequencyHz), frequencyHz, decade: true });
  }
  return ticks;
}

/** Labels that would stand on one another or run out of the column are left out. */
export function labelledTicks(ticks: readonly AxisTick[], minimumDistance: number): AxisTick[] {
  const kept: AxisTick[] = [];
  for (const tick of ticks) {
    const last = kept.at(-1);
    if (tick.at > 1 - minimumDistance / 3) continue;
    if (!last || tick.at - last.at >= minimumDistance) kept.push(tick);
  }
  return kept;
}

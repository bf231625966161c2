import { describe, expect, it } from 'vitest';

import type { Lane } from '../../../api/types';
import { axisTicks, labelledTicks, laneGeometry } from './lane-geometry';

const axis = { fromHz: 1e5, toHz: 1e9 };
const lane: Lane = {
  lowerHz: 1e6,
  solidToHz: 1e7,
  cornerHz: 1e8,
  typicalCornerHz: 2e8,
  bandLowHz: 3e6,
  bandHighHz: 7e6,
  description: '',
};

describe('laneGeometry', () => {
  it('places every mark on the logarithmic axis', () => {
    const drawn = laneGeometry(lane, axis);
    expect(drawn.solid?.from).toBeCloseTo(0.25, 12);
    expect(drawn.solid?.to).toBeCloseTo(0.5, 12);
    expect(drawn.fading).toEqual({ from: drawn.solid?.to, to: drawn.tick });
    expect(drawn.tick).toBeCloseTo(0.75, 12);
    expect(drawn.typicalTick).toBeCloseTo((Math.log10(2e8) - 5) / 4, 12);
    expect(drawn.startsInside).toBe(true);
    expect(drawn.openEnded).toBe(false);
  });

  it('has only a fading part when the target is met nowhere', () => {
    const drawn = laneGeometry({ ...lane, solidToHz: 5e5 }, axis);
    expect(drawn.solid).toBeNull();
    expect(drawn.fading?.from).toBeCloseTo(0.25, 12);
  });

  it('runs to the edge without a tick when the corner lies beyond the axis', () => {
    const drawn = laneGeometry({ ...lane, solidToHz: 2e9, cornerHz: 3e9 }, axis);
    expect(drawn.solid?.to).toBe(1);
    expect(drawn.fading).toBeNull();
    expect(drawn.tick).toBeNull();
    expect(drawn.openEnded).toBe(true);
  });

  it('draws nothing where nothing is known, but still the band', () => {
    const drawn = laneGeometry({ ...lane, solidToHz: null, cornerHz: null, typicalCornerHz: null }, axis);
    expect(drawn.solid).toBeNull();
    expect(drawn.fading).toBeNull();
    expect(drawn.band.to).toBeGreaterThan(drawn.band.from);
  });

  it('keeps a narrow band visible', () => {
    const drawn = laneGeometry({ ...lane, bandLowHz: 433.82e6, bandHighHz: 434.02e6 }, axis);
    expect(drawn.band.to - drawn.band.from).toBeCloseTo(0.006, 12);
  });
});

describe('axisTicks', () => {
  it('gives the decades inside the axis', () => {
    expect(axisTicks({ fromHz: 2e5, toHz: 5e8 }).map((tick) => tick.frequencyHz)).toEqual([1e6, 1e7, 1e8]);
  });

  it('labels only as many as there is room for', () => {
    const ticks = axisTicks({ fromHz: 1, toHz: 1e10 });
    expect(labelledTicks(ticks, 0.25).map((tick) => tick.frequencyHz)).toEqual([1, 1e3, 1e6, 1e9]);
  });
});

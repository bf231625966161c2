import { DEFAULT_POLICY, policyFrom } from '../policy';
import type { VoltageFeedbackDevice } from '../types';
import { lowerWorst, outputCurrentFor, outputResistanceFor, supplyCurrentFor, upperWorst } from './amplifier-values';
import { secondPoleFor } from './second-pole';
import { transimpedanceBandwidthOf } from './transimpedance-bandwidth';
import { columnOf, gbwFor, slewFor } from './used-values';

const device = (fields: Partial<VoltageFeedbackDevice>): VoltageFeedbackDevice => ({
  kind: 'voltage-feedback',
  id: 'd',
  partNumber: 'MRWG-G072',
  grade: 'general-purpose',
  channels: 1,
  gainBandwidthHz: { typ: 100e6 },
  ...fields,
});

describe('gbwFor(device, policy, corner)', () => {
  it.each([
    ['typical', { typ: 100e6, min: 75e6 }, 100e6, 'typ', 'typical'],
    ['minimum', { typ: 100e6, min: 75e6 }, 75e6, 'min', 'minimum'],
    ['minimum', { typ: 100e6 }, 70e6, 'typ-derated', 'typical × 0.7'],
    ['minimumHot', { typ: 100e6, min: 75e6 }, 60e6, 'min', 'minimum × 0.8 (hot)'],
    ['minimumHot', { typ: 100e6 }, 56e6, 'typ-derated', 'typical × 0.7 × 0.8 (hot)'],
    ['maximum', { typ: 100e6, max: 120e6 }, 120e6, 'max', 'maximum'],
    ['maximum', { typ: 100e6 }, 130e6, 'typ-derated', 'typical × 1.3'],
    ['typical', { min: 75e6 }, 75e6, 'min', 'minimum (typical not given)'],
  ] as const)('%s of %j', (corner, gainBandwidthHz, value, basis, text) => {
    const used = gbwFor(device({ gainBandwidthHz }), policyFrom({ temperatureFactor: 0.8 }), corner);
    expect(used.value).toBeCloseTo(value, 3);
    expect(used).toMatchObject({ basis, text });
  });

  it('carries page and condition of the datasheet', () => {
    const used = gbwFor(
      device({ gainBandwidthHz: { min: 1, page: '4', condition: 'G = 2' } }),
      DEFAULT_POLICY,
      'minimum',
    );
    expect(used).toMatchObject({ page: '4', condition: 'G = 2' });
  });
});

describe('other values', () => {
  it('slew counts with its minimum, else typ × derating, and is null when not entered', () => {
    expect(slewFor(device({ slewRateVPerS: { typ: 55e6, min: 40e6 } }), DEFAULT_POLICY)?.value).toBe(40e6);
    expect(slewFor(device({ slewRateVPerS: { typ: 60e6 } }), DEFAULT_POLICY)?.value).toBeCloseTo(42e6, 3);
    expect(slewFor(device({}), DEFAULT_POLICY)).toBeNull();
  });

  it('the worse column counts in the minimum cases where the datasheet gives it', () => {
    expect(upperWorst({ typ: 4, max: 5 }, 'minimum')?.value).toBe(5);
    expect(upperWorst({ typ: 4, max: 5 }, 'typical')?.value).toBe(4);
    expect(lowerWorst({ min: 3, typ: 4 }, 'minimumHot')?.value).toBe(3);
    expect(outputCurrentFor(device({ outputCurrentA: { typ: 0.05, min: 0.04 } }))?.value).toBe(0.04);
  });

  it('silent values are null or marked assumed, never a plain zero', () => {
    expect(columnOf(undefined, ['typ'])).toBeNull();
    expect(outputResistanceFor(device({}))).toMatchObject({ value: 0, basis: 'assumed' });
    expect(supplyCurrentFor(device({}), 'typical')).toBeNull();
  });
});

describe('secondPoleFor(device)', () => {
  it('f2 = (GBW/G)·sin φ·tan φ with the typical GBW: 150 MHz for 100 MHz and 60°', () => {
    const pole = secondPoleFor(device({ gainBandwidthHz: { typ: 100e6, min: 75e6 }, phaseMarginDeg: 60 }));
    expect(pole.frequencyHz).toBeCloseTo(150e6, 0);
    expect(pole.known).toBe(true);
  });

  it('is quoted at the minimum stable gain unless a gain is given', () => {
    const margin = { phaseMarginDeg: 60, minimumStableGain: 10 };
    expect(secondPoleFor(device(margin)).frequencyHz).toBeCloseTo(15e6, 0);
    expect(secondPoleFor(device({ ...margin, phaseMarginGain: 2 })).frequencyHz).toBeCloseTo(75e6, 0);
  });

  it('90° and more: none, assumed; nothing given: not known', () => {
    expect(secondPoleFor(device({ phaseMarginDeg: 90 }))).toMatchObject({
      frequencyHz: Infinity,
      known: true,
      assumed: true,
    });
    expect(secondPoleFor(device({}))).toMatchObject({ frequencyHz: Infinity, known: false, text: null });
    expect(secondPoleFor(device({ secondPoleHz: 3e6, phaseMarginDeg: 60 })).frequencyHz).toBe(3e6);
  });
});

describe('transimpedanceBandwidthOf(circuit)', () => {
  const ideal = {
    bandwidthHz: 150e6,
    noiseGain: 2,
    feedbackOhm: 1000,
    invertingInputOhm: 0,
    outputOhm: 0,
    openLoopOhm: 1e15,
    secondPoleHz: Infinity,
  };

  it('without parasitics is 2π·BW·Rf', () => {
    expect(transimpedanceBandwidthOf(ideal) / (2 * Math.PI * 150e9)).toBeCloseTo(1, 6);
  });

  it('with Rb is 2π·BW·(Rf + G·Rb)', () => {
    const k = transimpedanceBandwidthOf({ ...ideal, invertingInputOhm: 50 });
    expect(k / (2 * Math.PI * 150e6 * 1100)).toBeCloseTo(1, 6);
  });

  it('a second pole at twice the loop’s corner gives a Butterworth response: corner √2 higher', () => {
    const firstOrderHz = 150e6 / Math.SQRT2;
    const k = transimpedanceBandwidthOf({ ...ideal, secondPoleHz: 2 * firstOrderHz });
    expect(k / (2 * Math.PI * firstOrderHz * 1000)).toBeCloseTo(1, 6);
  });

  it('falls back to the first order where half power is never reached', () => {
    const k = transimpedanceBandwidthOf({ ...ideal, openLoopOhm: 100 });
    expect(k).toBeCloseTo(2 * Math.PI * 150e9, -3);
  });
});

import { handReceiver, handVoltageFeedback, nonInverting, inverting } from './hand-receiver.test-support';
import { analyzeChain } from './analyze-chain';
import type { ChainInput, VoltageSource } from '../types';
import { inputPeak, sourcePeak, swingAvailable } from './levels';

const device = {
  ...handVoltageFeedback('A', 100, 75),
  headroomPositiveV: { typ: 1.2, max: 1.5 },
  headroomNegativeV: { typ: 1 },
};
const voltage: VoltageSource = { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf' };

describe('sourcePeak(source, level)', () => {
  it('peak EMF, rms EMF and available power', () => {
    expect(sourcePeak(voltage, 1)).toBe(1);
    expect(sourcePeak({ ...voltage, levelKind: 'rms-emf' }, 1)).toBeCloseTo(Math.SQRT2, 12);
    // −45 dBm in 50 Ω: √(2 · 50 Ω · 10^−7.5 W) = 1.77828 mV peak at a matched input, twice that as EMF.
    expect(sourcePeak({ ...voltage, levelKind: 'available-power' }, -45)).toBeCloseTo(2 * 1.77828e-3, 7);
  });

  it('says when the level is not entered', () => {
    expect(inputPeak(voltage, 'largest')).toEqual({ value: null, reason: 'The largest input level is not entered.' });
  });
});

describe('swingAvailable(device, supply, offset)', () => {
  it('smaller of both sides with the worse headroom, offset off', () => {
    const swing = swingAvailable(device, { positiveV: 5, negativeV: -5 }, { value: 0.1 });
    expect(swing.value).toBeCloseTo(3.4, 12);
  });

  it('single supply: around the middle', () => {
    expect(swingAvailable(device, { positiveV: 5, negativeV: 0 }, { value: 0 }).value).toBeCloseTo(1, 12);
  });

  it('an offset that is not known is left out and marked', () => {
    const swing = swingAvailable(device, { positiveV: 5, negativeV: -5 }, { value: null, reason: '?' });
    expect(swing).toEqual({ value: 3.5, assumed: true });
  });
});

describe('output current', () => {
  const current = (input: ChainInput): number =>
    analyzeChain({ ...input, devices: [device] }).cases.minimum.stages[0].outputCurrentPeakA.value ?? NaN;

  it('load and feedback network: 10 mV into 1 kΩ ∥ 1 kΩ non-inverting', () => {
    expect(current(handReceiver([nonInverting('s', 'A', 10)]))).toBeCloseTo(10e-3 / 500, 9);
  });

  it('inverting: Rf goes to a virtual ground', () => {
    expect(current(handReceiver([inverting('s', 'A', 10)]))).toBeCloseTo(10e-3 / 500, 9);
  });

  it('an isolation resistor is in series with the load', () => {
    const stage = { ...nonInverting('s', 'A', 10), isolationOhm: 1000 };
    expect(current(handReceiver([stage]))).toBeCloseTo(10e-3 / 2000 + 10e-3 / 1000, 9);
  });
});

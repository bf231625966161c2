import { EngineInputError } from '../errors';
import type { Maybe } from '../analysis';
import type { ChainInput } from '../types';
import { analyzeChain } from './analyze-chain';
import {
  HAND_BASELINE,
  HAND_DRIVER_STAGE,
  handReceiver,
  handVoltageFeedback,
  inverting,
  nonInverting,
} from './hand-receiver.test-support';

const value = (maybe: Maybe): number => maybe.value ?? NaN;
const reason = (maybe: Maybe): string => (maybe.value === null ? maybe.reason : '');

/** Expected values: hand calculation with one pole, f_cl = GBW/NG, droop = −10·log(1 + (f/f_cl)²), printed digits. */
describe('analyzeChain(input), ultrasonic receiver with hand assumptions, minimum GBW', () => {
  const { minimum, typical } = analyzeChain(handReceiver(HAND_BASELINE)).cases;

  it.each([
    ['S1', 0, 120.0, -0.003, -0.008, -0.015],
    ['S2', 1, 6.818, -0.769, -1.869, -3.126],
    ['S3', 2, 52.0, -0.014, -0.04, -0.078],
    ['S4', 3, 150.0, -0.002, -0.005, -0.009],
  ])('%s: corner and droop at 3, 5 and 7 MHz', (_, index, cornerMhz, low, operating, high) => {
    const stage = minimum.stages[index];
    expect(value(stage.cornerUpperHz) / 1e6).toBeCloseTo(cornerMhz, 3);
    expect(value(stage.gainLowDb) - value(stage.idealGainDb)).toBeCloseTo(low, 3);
    expect(value(stage.gainOperatingDb) - value(stage.idealGainDb)).toBeCloseTo(operating, 3);
    expect(value(stage.gainHighDb) - value(stage.idealGainDb)).toBeCloseTo(high, 3);
  });

  it('judges S2 by its noise gain 11, not by its gain 10', () => {
    const s2 = minimum.stages[1];
    expect(s2.signalGain).toBe(-10);
    expect(s2.noiseGain).toBeCloseTo(11, 6);
    expect(value(s2.headroomOperating)).toBeCloseTo(1.364, 3);
    expect(value(s2.headroomTop)).toBeCloseTo(0.974, 3);
    expect(s2.runsOutHz).toBeCloseTo(75e6 / 11, -1);
    expect(s2.targetMetHz).toBeCloseTo(25e6 / 11, -1);
  });

  it('gives the chain’s gain, flatness, corner and droop', () => {
    expect(value(minimum.idealGainDb)).toBeCloseTo(60, 6);
    expect(value(minimum.gainOperatingDb)).toBeCloseTo(58.08, 2);
    expect(value(minimum.flatnessDb)).toBeCloseTo(2.44, 2);
    expect(value(minimum.worstDroopDb)).toBeCloseTo(-3.23, 2);
    expect(minimum.worstDroopHz).toBe(7e6);
    expect(value(minimum.cornerUpperHz) / 1e6).toBeCloseTo(6.67, 2);
    expect(value(typical.flatnessDb)).toBeCloseTo(1.62, 2);
    expect(minimum.inverted).toBe(false);
  });

  it('judges slew at ideal gain and the top edge: 4.4, 22 and 44 V/µs', () => {
    const slews = minimum.stages.map((stage) => value(stage.slewNeededVPerS) / 1e6);
    expect(slews[1]).toBeCloseTo(4.4, 1);
    expect(slews[2]).toBeCloseTo(22, 1);
    expect(slews[3]).toBeCloseTo(44, 1);
  });

  it('says what is not entered instead of guessing', () => {
    const s4 = minimum.stages[3];
    expect(reason(s4.fullPowerBandwidthHz)).toBe('Slew rate of TLYR-C220 is not entered.');
    expect(reason(s4.headroomTop)).toBe('Has no GBW (current feedback).');
    expect(reason(s4.supplyCurrentA)).toBe('Supply current of TLYR-C220 is not entered.');
    expect(reason(minimum.inputNoise)).toContain('Voltage noise and current noise of QUIL-D618 are not entered.');
    expect(reason(minimum.supplyCurrentA)).toContain('TLYR-C220');
    expect(reason(minimum.stages[1].swingAvailableV)).toContain('MRWG-G072');
  });

  it('one pole: about 90° of phase margin and no peaking', () => {
    const stability = analyzeChain(handReceiver(HAND_BASELINE)).stability.get('s2');
    expect(stability?.atMinimum.phaseMarginDeg).toBeCloseTo(90, 3);
    expect(stability?.atMinimum.crossingHz).toBeCloseTo(75e6 / 11, -1);
    expect(stability?.atMinimum.noiseGainAtCrossing).toBeCloseTo(11, 6);
    expect(stability?.atMinimum.peakingDb).toBeCloseTo(0, 3);
  });
});

describe('analyzeChain(input, options)', () => {
  it('computes only the cases asked for', () => {
    const { cases } = analyzeChain(handReceiver(HAND_BASELINE), { cases: ['typical'] });
    expect(Object.keys(cases)).toEqual(['typical']);
  });

  it('the hot case counts with the temperature factor', () => {
    const input = handReceiver(HAND_BASELINE);
    const hot = analyzeChain({ ...input, policy: { ...input.policy, temperatureFactor: 0.8 } }).cases.minimumHot;
    expect(value(hot.stages[1].headroomTop)).toBeCloseTo(0.974 * 0.8, 3);
    expect(hot.stages[1].gbw?.text).toBe('minimum × 0.8 (hot)');
  });

  it('without a temperature factor the hot case is the minimum case by another name', () => {
    const { minimum, minimumHot } = analyzeChain(handReceiver(HAND_BASELINE)).cases;
    expect(minimumHot).toEqual({ ...minimum, gbwCase: 'minimumHot' });
  });

  it('no stages: the source straight on the load', () => {
    const input = handReceiver([]);
    const source = { ...input.specification.source, resistanceOhm: 1000 };
    const { minimum } = analyzeChain({ ...input, specification: { ...input.specification, source } }).cases;
    expect(value(minimum.gainOperatingDb)).toBeCloseTo(-6.0206, 4);
    expect(minimum.stages).toEqual([]);
    expect(reason(minimum.shrinkage)).not.toBe('');
  });

  it('throws its own error with every issue', () => {
    const input = handReceiver([{ ...nonInverting('s1', 'nowhere', 10), gainOhm: -1 }]);
    expect(() => analyzeChain(input)).toThrow(EngineInputError);
  });
});

describe('gain basis', () => {
  const matched = (gainBasis: ChainInput['specification']['gainBasis']): ChainInput => {
    const input = handReceiver([]);
    const source = { ...input.specification.source, resistanceOhm: 50 };
    return { ...input, specification: { ...input.specification, source, load: { resistanceOhm: 50 }, gainBasis } };
  };

  it('a matched 0 dB chain reads −6.02 dB in voltage and 0 dB in transducer gain', () => {
    expect(value(analyzeChain(matched('voltage')).cases.minimum.gainOperatingDb)).toBeCloseTo(-6.0206, 4);
    expect(value(analyzeChain(matched('transducer')).cases.minimum.gainOperatingDb)).toBeCloseTo(0, 9);
  });

  it('gives the reason where the basis does not apply', () => {
    expect(reason(analyzeChain(matched('transimpedance')).cases.minimum.gainOperatingDb)).toContain('current source');
  });
});

describe('operating frequency beside the corners', () => {
  it('beyond the upper corner: searched downward, and said', () => {
    const input = handReceiver([inverting('s2', 'MRWG-G072', 10)]);
    const band = { lowHz: 10e6, operatingHz: 20e6, highHz: 30e6 };
    const stage = analyzeChain({ ...input, specification: { ...input.specification, band } }).cases.minimum.stages[0];
    expect(stage.operatingBeyondCorner).toBe(true);
    expect(value(stage.cornerUpperHz) / 1e6).toBeCloseTo(75 / 11, 3);
  });

  it('below the lower corner of a coupling: both corners are found upward', () => {
    // 100 nF into 1 kΩ: 1/(2π·RC) = 1591.5 Hz.
    const coupled = { ...nonInverting('s1', 'MRWG-G072', 10), couplingF: 100e-9, biasOhm: 1000 };
    const input = handReceiver([coupled]);
    const band = { lowHz: 50, operatingHz: 100, highHz: 200 };
    const stage = analyzeChain({ ...input, specification: { ...input.specification, band } }).cases.minimum.stages[0];
    expect(stage.operatingBeyondCorner).toBe(true);
    expect(value(stage.cornerLowerHz)).toBeCloseTo(1591.5, 0);
    expect(value(stage.cornerUpperHz) / 1e6).toBeCloseTo(7.5, 3);
  });

  it('a passive divider has no corners, with the reason', () => {
    const input = handReceiver([{ kind: 'rc-section', id: 'p', name: 'Pad', seriesOhm: 100, shuntOhm: 100 }]);
    const stage = analyzeChain(input).cases.minimum.stages[0];
    expect(reason(stage.cornerUpperHz)).toBe('No upper −3 dB corner below 1 THz.');
    expect(reason(stage.cornerLowerHz)).toBe('No lower −3 dB corner: passes DC.');
  });
});

describe('phase margin with a second pole', () => {
  it('a quoted 50° becomes 57° at 0.7 × and 45° at 1.3 × GBW', () => {
    const device = {
      ...handVoltageFeedback('QUOTED', 100, 70),
      secondPoleHz: undefined,
      phaseMarginDeg: 50,
      minimumStableGain: 1,
    };
    const follower = {
      ...nonInverting('s1', 'QUOTED', 1),
      topology: 'follower' as const,
      feedbackOhm: 0,
      gainOhm: null,
    };
    const input = { ...handReceiver([follower]), devices: [device] };
    const stability = analyzeChain(input).stability.get('s1');
    expect(Math.round(stability?.atMinimum.phaseMarginDeg ?? NaN)).toBe(57);
    expect(Math.round(stability?.atMaximum.phaseMarginDeg ?? NaN)).toBe(45);
    expect(stability?.worse).toBe('maximum');
  });
});

describe('transimpedance behind a photodiode', () => {
  const device = { ...handVoltageFeedback('DIODE-AMP', 100, 100), inputOffsetVoltageV: { typ: 0 } };
  const input: ChainInput = {
    ...handReceiver([
      {
        kind: 'voltage-feedback',
        id: 't',
        name: 'Transimpedance',
        topology: 'transimpedance',
        deviceId: 'DIODE-AMP',
        feedbackOhm: 10e3,
      },
    ]),
    devices: [{ ...device, inputBiasCurrentA: { typ: 0 } }],
  };
  const specification: ChainInput['specification'] = {
    ...input.specification,
    source: { kind: 'current', resistanceOhm: 1e9, capacitanceF: 10e-12, largestLevel: 1e-6, dcCurrentA: 2e-6 },
    gainBasis: 'transimpedance',
    band: { lowHz: 1e3, operatingHz: 10e3, highHz: 100e3 },
  };
  const { minimum } = analyzeChain({ ...input, specification }).cases;

  it('gain is Rf in dBΩ, inverted, and has no first-order figure', () => {
    expect(value(minimum.idealGainDb)).toBeCloseTo(80, 3);
    expect(value(minimum.gainOperatingDb)).toBeCloseTo(80, 3);
    expect(minimum.stages[0].signalGain).toBe(-10e3);
    expect(minimum.inverted).toBe(true);
    expect(reason(minimum.stages[0].cornerFirstOrderHz)).toContain('transimpedance');
  });

  it('dark current × Rf is the DC offset, level is I × Rf', () => {
    expect(value(minimum.outputOffsetV)).toBeCloseTo(20e-3, 6);
    expect(value(minimum.stages[0].outputPeakV)).toBeCloseTo(10e-3, 6);
  });
});

describe('DC offset', () => {
  const exact = {
    ...handVoltageFeedback('OFFSET', 100, 75),
    inputOffsetVoltageV: { typ: 1e-3 },
    inputBiasCurrentA: { typ: 0 },
  };
  const chain = (second: object): ChainInput => ({
    ...handReceiver([nonInverting('s1', 'OFFSET', 10), { ...nonInverting('s2', 'OFFSET', 5), ...second }]),
    devices: [exact],
  });

  it('is amplified along the chain: 1 mV × 10 × 5 + 1 mV × 5', () => {
    const { stages } = analyzeChain(chain({})).cases.minimum;
    expect(value(stages[0].outputOffsetV)).toBeCloseTo(10e-3, 9);
    expect(value(stages[1].outputOffsetV)).toBeCloseTo(55e-3, 9);
  });

  it('stops at a coupling capacitor', () => {
    const { stages } = analyzeChain(chain({ couplingF: 1e-6, biasOhm: 10e3 })).cases.minimum;
    expect(value(stages[1].outputOffsetV)).toBeCloseTo(5e-3, 9);
  });
});

describe('24 stages', () => {
  it('are analysed with finite figures', () => {
    const stages = Array.from({ length: 24 }, (_, k) => ({ ...HAND_DRIVER_STAGE, id: `s${k}` }));
    const { minimum } = analyzeChain(handReceiver(stages)).cases;
    expect(value(minimum.idealGainDb)).toBeCloseTo(24 * 6.0206, 2);
    expect(value(minimum.shrinkage)).toBeCloseTo(Math.sqrt(2 ** (1 / 24) - 1), 3);
  });
});

import { calculate } from '../index';
import type { Check, CheckId } from '../report';
import type { ChainInput, VoltageFeedbackDevice } from '../types';
import {
  chainInput,
  currentFeedbackDevice,
  currentFeedbackStage,
  matchedBlockDevice,
  matchedBlockStage,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from './chain-builder.test-support';

/** Expected values: arithmetic by hand, beside each. */
const device = (id: string, gbwHz: number, more: Partial<VoltageFeedbackDevice> = {}): VoltageFeedbackDevice =>
  voltageFeedbackDevice(id, gbwHz, {
    openLoopGainDb: { typ: 180 },
    outputResistanceOhm: { typ: 0 },
    secondPoleHz: 1e14,
    slewRateVPerS: { min: 1e9 },
    headroomPositiveV: { max: 1 },
    headroomNegativeV: { max: 1 },
    outputCurrentA: { min: 1 },
    supplyVoltageV: { min: 5, max: 12 },
    inputOffsetVoltageV: { max: 0 },
    inputBiasCurrentA: { max: 0 },
    ...more,
  });

const tenfold = (id: string, deviceId: string) => voltageFeedbackStage(id, deviceId, 'non-inverting', 900, 100);

function stageCheck(input: ChainInput, id: CheckId, index = 0): Check | undefined {
  return calculate(input).stages[index].checks.find((check) => check.id === id);
}

describe('which of several stages the chain names', () => {
  it('of two tight headrooms the smaller one', () => {
    // NG 10 at 7 MHz uses 70 MHz: 84/70 = 1.2 and 203/70 = 2.9, target 3.
    const stages = [tenfold('s1', 'near'), tenfold('s2', 'low')];
    const input = chainInput(stages, [device('near', 203e6), device('low', 84e6)]);
    const report = calculate(input);
    expect(report.stages.map(({ verdict }) => verdict.checkId)).toEqual(['gbw', 'gbw']);
    expect(report.verdict).toMatchObject({ verdict: 'tight', stageId: 's2' });
  });

  it('of two phase margins under the limit the smaller one', () => {
    // Crossings near √(100 MHz · f2): the lower the second pole, the smaller the margin.
    const poor = { secondPoleHz: 5e6 };
    const worse = { secondPoleHz: 0.2e6 };
    const stages = [tenfold('s1', 'poor'), tenfold('s2', 'worse')];
    const input = chainInput(stages, [device('poor', 1e9, poor), device('worse', 1e9, worse)], {
      band: { lowHz: 1e3, operatingHz: 1e4, highHz: 1e5 },
    });
    const margins = calculate(input).stages.map(({ cases }) => cases.minimum.figures.phaseMargin.value ?? NaN);
    expect(margins[1]).toBeLessThan(margins[0]);
    expect(calculate(input).verdict.stageId).toBe('s2');
  });
});

describe('a noise gain just under the minimum stable gain', () => {
  it('prints the digits that decide', () => {
    // 1 + 899.995/100 = 9.99995 under 10.
    const stage = { ...tenfold('s1', 'decompensated'), feedbackOhm: 899.995 };
    const check = stageCheck(
      chainInput([stage], [device('decompensated', 1e9, { minimumStableGain: 10 })]),
      'stability',
    );
    expect(check?.verdict).toBe('over');
    expect(check?.sentence).toContain('noise gain of 9.99995 is below 10');
  });

  it('shows the noise gain that was judged, not that of the resistors', () => {
    // Cf 100 pF across 900 Ω shorts Rf above 1.8 MHz: at the crossing near 1 GHz the noise gain has come down to about 1.
    const stage = { ...tenfold('s1', 'decompensated'), feedbackF: 100e-12 };
    const check = stageCheck(
      chainInput([stage], [device('decompensated', 1e9, { minimumStableGain: 5 })]),
      'stability',
    );
    expect(check?.verdict).toBe('over');
    expect(check?.actual?.value).toBeLessThan(1.1);
    expect(check?.sentence).toContain('where the loop gain crosses 1');
  });
});

describe('supply voltage', () => {
  it.each([
    // 3.3 + 1.8 is 5.1 but for the last binary digit: exactly met is met.
    [{ positiveV: 3.3, negativeV: -1.8 }, { min: 5.1, max: 12 }, 'clear'],
    [{ positiveV: 3.3, negativeV: -1.8 }, { min: 2.7, max: 5.1 }, 'clear'],
    [{ positiveV: 6.02, negativeV: -6.02 }, { min: 5, max: 12 }, 'over'],
  ])('%j within %j: %s', (supply, supplyVoltageV, verdict) => {
    const input = chainInput([tenfold('s1', 'a')], [device('a', 1e9, { supplyVoltageV })], { supply });
    expect(stageCheck(input, 'supply-voltage')?.verdict).toBe(verdict);
  });

  it('prints the digits that decide', () => {
    const supply = { positiveV: 6.02, negativeV: -6.02 };
    const check = stageCheck(chainInput([tenfold('s1', 'a')], [device('a', 1e9)], { supply }), 'supply-voltage');
    expect(check?.sentence).toContain('12.04 V in all');
  });
});

describe('compression', () => {
  const block = (outputP1dbDbm: { min?: number; typ?: number; max?: number }) =>
    chainInput([matchedBlockStage('s1', 'block')], [matchedBlockDevice('block', 50, 12.3, { outputP1dbDbm })], {
      source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'available-power', largestLevel: -5.1 },
      load: { resistanceOhm: 50 },
    });

  it.each([
    // −5.1 + 12.3 = 7.2 dBm.
    [7.2, 'tight'],
    [8.2, 'clear'],
    [7.19, 'over'],
  ])('7.2 dBm against %s dBm: %s', (min, verdict) => {
    expect(stageCheck(block({ min }), 'compression')?.verdict).toBe(verdict);
  });

  it('names the column of the datasheet', () => {
    expect(stageCheck(block({ max: 20 }), 'compression')?.sentence).toContain('20.00 dBm (maximum)');
  });
});

describe('cost', () => {
  it('over by one millionth is over, whatever the sum', () => {
    const quote = { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 2_000_000_001 }] };
    const input = chainInput([tenfold('s1', 'a')], [device('a', 1e9, { quote })], {
      requirements: { costMicros: 2_000_000_000 },
    });
    expect(calculate(input).checks.find((check) => check.id === 'cost')?.verdict).toBe('over');
  });
});

describe('feedback resistor of a current-feedback stage', () => {
  it('counts with the same Rb as the network: the maximum where no typical value is given', () => {
    // (900 + 2·50)/(1000 + 2·50) = 0.909; with 0 or the minimum it would be another share.
    const driver = currentFeedbackDevice('driver', 200e6, 2, 1000, {
      invertingInputResistanceOhm: { min: 10, max: 50 },
    });
    const stage = currentFeedbackStage('s1', 'driver', 'non-inverting', 900, 900);
    const check = stageCheck(chainInput([stage], [driver]), 'feedback-resistor');
    expect(check?.actual?.value).toBeCloseTo(1000 / 1100, 9);
  });
});

describe('what is not known is said', () => {
  it('swing without an offset voltage', () => {
    const silent = device('a', 1e9, { inputOffsetVoltageV: undefined });
    const check = stageCheck(chainInput([tenfold('s1', 'a')], [silent]), 'swing');
    expect(check?.sentence).toContain('offset not known, taken as 0');
  });

  it('the level has to come down by no less than what suffices', () => {
    // 4 V peak left, 3.9 V needed: 20·log(4/3.9) = 0.2199 dB; 1 − 0.2199 = 0.7801 dB, upwards 0.781.
    const source = { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf', largestLevel: 0.39 } as const;
    const check = stageCheck(chainInput([tenfold('s1', 'a')], [device('a', 1e9)], { source }), 'swing');
    expect(check?.verdict).toBe('tight');
    expect(check?.remedies[0]?.sentence).toContain('0.781 dB');
  });
});

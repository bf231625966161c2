import { calculate, working } from '../index';
import type { ChainInput, VoltageFeedbackDevice } from '../types';
import { chainInput, voltageFeedbackDevice, voltageFeedbackStage } from './chain-builder.test-support';

const amplifier = (id: string, more: Partial<VoltageFeedbackDevice> = {}): VoltageFeedbackDevice =>
  voltageFeedbackDevice(id, 1e9, {
    openLoopGainDb: { typ: 180 },
    outputResistanceOhm: { typ: 0 },
    secondPoleHz: 1e14,
    inputOffsetVoltageV: { typ: 1e-3, max: 5e-3, page: '3' },
    inputBiasCurrentA: { typ: 0, max: 0 },
    voltageNoiseVPerRtHz: { typ: 2e-9, max: 3e-9 },
    currentNoiseAPerRtHz: { typ: 1e-12 },
    ...more,
  });

const tenfold = voltageFeedbackStage('s1', 'a', 'non-inverting', 900, 100);

describe('working(input, request) names the value that was used', () => {
  const input = chainInput([tenfold], [amplifier('a')]);
  const data = (figure: string, gbwCase: 'minimum' | 'typical', label: string): string[] =>
    working(input, { stageId: 's1', figure, gbwCase })
      .data.filter((datum) => datum.label === label)
      .map((datum) => `${datum.value} ${datum.origin}`);

  // 5 mV · 10 = 50 mV with the maximum, 1 mV · 10 = 10 mV with the typical value.
  it.each([
    ['minimum', '50.0 mV', '5 mV A, maximum'],
    ['typical', '10.0 mV', '1 mV A, typical'],
  ] as const)('offset voltage, %s case', (gbwCase, result, datum) => {
    expect(working(input, { stageId: 's1', figure: 'outputOffset', gbwCase }).result).toBe(result);
    expect(data('outputOffset', gbwCase, 'Vos')).toEqual([datum]);
  });

  it.each([
    ['minimum', '3 nV/√Hz A, maximum'],
    ['typical', '2 nV/√Hz A, typical'],
  ] as const)('voltage noise, %s case', (gbwCase, datum) => {
    expect(data('noiseAdded', gbwCase, 'voltage noise')).toEqual([datum]);
  });
});

describe('working(input, request) multiplies what was multiplied', () => {
  it('a derating of two thirds starts from the typical value of the datasheet', () => {
    const input = chainInput(
      [tenfold],
      [amplifier('a', { gainBandwidthHz: { typ: 300e6 } })],
      {},
      { gbwDerating: 0.6667 },
    );
    const { steps } = working(input, { stageId: 's1', figure: 'gbwHave', gbwCase: 'minimum' });
    expect(steps.at(-1)?.substituted).toBe('300 MHz × 0.6667');
  });

  it('non-inverting without Rg: noise gain 1, not an infinite one', () => {
    const open = voltageFeedbackStage('s1', 'a', 'non-inverting', 900, null);
    const { result, steps } = working(chainInput([open], [amplifier('a')]), {
      stageId: 's1',
      figure: 'noiseGain',
      gbwCase: 'minimum',
    });
    expect([result, steps.at(-1)?.result]).toEqual(['×1', '×1']);
  });
});

describe('remedies never make another check fail', () => {
  // ×10 at 7 MHz uses 70 MHz of 120 MHz: ×1.71. Less gain, or two stages of ×3.162, would be under the stable gain of 8.
  const stable = amplifier('a', { gainBandwidthHz: { min: 120e6, typ: 160e6 }, minimumStableGain: 8 });
  const sentences = (input: ChainInput): string[] =>
    calculate(input).stages[0].checks.flatMap((check) => check.remedies.map(({ sentence }) => sentence));

  it('no smaller gain than the device is stable with', () => {
    const found = sentences(chainInput([tenfold], [stable])).join('\n');
    expect(found).toContain('It needs a GBW of at least 210 MHz');
    expect(found).not.toMatch(/Split|at most/);
  });

  it('a device of which data is missing is no remedy for what is only tight', () => {
    const silent = amplifier('b', { gainBandwidthHz: { min: 1e9 }, secondPoleHz: undefined });
    const complete = {
      slewRateVPerS: { min: 1e9 },
      headroomPositiveV: { max: 1 },
      headroomNegativeV: { max: 1 },
      outputCurrentA: { min: 1 },
      supplyVoltageV: { min: 5, max: 12 },
    };
    const input = chainInput(
      [tenfold],
      [
        { ...stable, ...complete },
        { ...silent, ...complete },
      ],
    );
    expect(calculate(input).stages[0].verdict.verdict).toBe('tight');
    expect(sentences(input).join('\n')).not.toContain('B at ×10');
  });
});

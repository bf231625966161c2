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
    expect([result, steps.at(-1)?.result]).toEqual(['1', '1']);
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

describe('working(input, request) of an output offset', () => {
  it('adds what the first stage carries into the second', () => {
    // S1: 1 mV·10 + 1 µA·50 Ω·10 + 1 µA·900 Ω = 11.4 mV; S2 behind 0 Ω: 11.4·10 + 1·10 + 0.9 = 124.9 mV.
    const sized = amplifier('a', { inputOffsetVoltageV: { max: 1e-3 }, inputBiasCurrentA: { max: 1e-6 } });
    const input = chainInput([tenfold, { ...tenfold, id: 's2' }], [sized]);
    const at = (stageId: string) => working(input, { stageId, figure: 'outputOffset', gbwCase: 'minimum' });
    expect(at('s1').steps.at(-1)).toEqual({
      formula: 'Vos·NG + Ib·Rp·NG + Ib−·Rf + carried',
      substituted: '1 mV · 10 + 1 µA · 50 Ω · 10 + 1 µA · 900 Ω + 0 V',
      result: '11.4 mV',
    });
    expect(at('s2').steps.at(-1)).toMatchObject({
      substituted: '1 mV · 10 + 1 µA · 0 Ω · 10 + 1 µA · 900 Ω + 114 mV',
      result: '125 mV',
    });
  });
});

describe('headline', () => {
  it('shows the noise figure where it fails and the density passes', () => {
    // √(3² + …) nV behind 50 Ω is far above 3 dB; a density of 1 µV/√Hz is kept.
    const requirements = { inputNoise: 1e-6, noiseFigureDb: 3 };
    const report = calculate(chainInput([tenfold], [amplifier('a')], { requirements }));
    expect(report.headline.minimum.find((item) => item.key === 'noise')).toMatchObject({
      label: 'Noise figure',
      verdict: 'over',
      requirement: 'limit 3.00 dB',
    });
  });
});

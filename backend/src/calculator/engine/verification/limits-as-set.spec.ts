import { calculate } from '../index';
import type { CheckId, Check } from '../report';
import type { ChainInput, Requirements, Stage, VoltageFeedbackDevice } from '../types';
import { chainInput, voltageFeedbackDevice, voltageFeedbackStage } from './chain-builder.test-support';

/** Expected values: one-pole arithmetic by hand, beside each. */
const device = (gbwHz: number, more: Partial<VoltageFeedbackDevice> = {}): VoltageFeedbackDevice =>
  voltageFeedbackDevice('amplifier', gbwHz, {
    openLoopGainDb: { typ: 180 },
    outputResistanceOhm: { typ: 0 },
    secondPoleHz: 1e14,
    ...more,
  });

const tenfold = voltageFeedbackStage('s1', 'amplifier', 'non-inverting', 900, 100);

function chain(
  stage: Stage,
  gbwHz: number,
  requirements: Requirements,
  more: Partial<ChainInput['specification']> = {},
) {
  return chainInput([stage], [device(gbwHz)], { requirements, ...more });
}

function chainCheck(input: ChainInput, id: CheckId): Check | undefined {
  return calculate(input).checks.find((check) => check.id === id);
}

describe('limits are printed as they were set', () => {
  it('a flatness of 0.127 dB against 0.125 dB does not look as if it kept 0.13 dB', () => {
    // One pole at fc: 10·log((1 + (7/fc)²)/(1 + (3/fc)²)) = 0.127 dB at fc = 36.8 MHz.
    const check = chainCheck(chain(tenfold, 368e6, { flatnessDb: 0.125 }), 'flatness');
    expect(check?.verdict).toBe('over');
    expect(check?.sentence).toContain('the limit is 0.125 dB');
    expect(check?.limit?.digits).toBe(3);
  });

  it('the edge of a window with three decimals keeps them', () => {
    // 20 dB against 20.5 ± 0.125: the window starts at 20.375 dB.
    const check = chainCheck(chain(tenfold, 1e12, { gainDb: { target: 20.5, tolerance: 0.125 } }), 'gain');
    expect(check?.sentence).toContain('below 20.375 dB');
  });
});

describe('an operating frequency outside the corners', () => {
  it('beyond the upper corner of a chain that goes down to DC: a lower corner is no limit', () => {
    // 30 MHz/10 = 3 MHz, operated at 5 MHz.
    const input = chain(tenfold, 30e6, { lowerCornerHz: 1e6, upperCornerHz: 2e6 });
    expect(chainCheck(input, 'chain-lower-corner')).toMatchObject({ verdict: 'clear' });
    expect(chainCheck(input, 'upper-corner')?.sentence).toContain('operating frequency is beyond');
  });

  it('below the lower corner it is not said to be beyond the upper one', () => {
    // 100 pF into 100 Ω: 1/(2π·RC) = 15.9 MHz; the upper corner is at 1 GHz/10 = 100 MHz.
    const coupled = { ...tenfold, couplingF: 100e-12, biasOhm: 100 };
    const input = chain(coupled, 1e9, { upperCornerHz: 50e6, lowerCornerHz: 1e6 });
    const [stage] = calculate(input).stages;
    const sentences = [...calculate(input).checks, ...stage.checks].map((check) => check.sentence);
    expect(sentences.filter((sentence) => /already beyond|is beyond/.test(sentence))).toEqual([]);
    expect(chainCheck(input, 'chain-lower-corner')?.verdict).toBe('over');
  });
});

describe('gain requirements', () => {
  it('a one-sided requirement reads as a sentence', () => {
    const check = chainCheck(chain(tenfold, 1e12, { minimumGainDb: 15 }), 'gain');
    expect(check?.sentence).toMatch(/^The gain at 5 MHz is 20\.00 dB; required is at least 15 dB\.$/);
  });
});

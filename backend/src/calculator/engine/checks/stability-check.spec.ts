import type { StabilityAnalysis, StabilityPoint, StageAnalysis } from '../analysis';
import type { ChainFacts, StageFacts } from '../report/facts';
import type { VoltageFeedbackDevice } from '../types';
import {
  chainInput,
  currentFeedbackDevice,
  currentFeedbackStage,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from '../verification/chain-builder.test-support';
import { stabilityCheck } from './stability-check';

const POINT: StabilityPoint = {
  noCrossing: false,
  phaseMarginDeg: 60,
  crossingHz: 10e6,
  noiseGainAtCrossing: 10,
  peakingDb: 0,
};

interface Given {
  readonly device?: Partial<VoltageFeedbackDevice>;
  readonly point?: Partial<StabilityPoint>;
  readonly stability?: Partial<StabilityAnalysis>;
}

/** The check of one voltage-feedback stage whose loop was found to be like this. */
function check({ device, point, stability }: Given) {
  const each = { ...POINT, ...point };
  const input = chainInput([voltageFeedbackStage('s', 'd', 'non-inverting', 900, 100)], []);
  const facts = { input, policy: input.policy } as ChainFacts;
  const stage = {
    label: 'S1',
    stage: input.stages[0],
    device: voltageFeedbackDevice('d', 100e6, { minimumStableGain: 1, ...device }),
    analysis: { noiseGain: 10 } as StageAnalysis,
    stability: {
      stageId: 's',
      atMinimum: each,
      atMaximum: each,
      worse: 'maximum',
      minimumGbw: { value: 75e6, basis: 'min', text: 'minimum' },
      maximumGbw: { value: 130e6, basis: 'typ-derated', text: 'typical × 1.3' },
      secondPoleHz: 200e6,
      secondPoleText: 'as entered',
      outputResistanceKnown: true,
      loadCapacitive: false,
      ...stability,
    },
  } as StageFacts;
  return stabilityCheck(facts, stage)!;
}

const SILENT = { secondPoleHz: null, secondPoleText: null };

describe('stability, limits 30° and 45°', () => {
  it.each([
    [-5, 'over'],
    [29.99, 'over'],
    [30, 'tight'],
    [44.99, 'tight'],
    [45, 'clear'],
    [90, 'clear'],
  ] as const)('a phase margin of %s° is %s', (phaseMarginDeg, verdict) => {
    expect(check({ point: { phaseMarginDeg } }).verdict).toBe(verdict);
  });

  it('says at which end of the GBW range, and that a negative margin oscillates', () => {
    const { sentence } = check({ point: { phaseMarginDeg: -5 } });
    expect(sentence).toContain('at the maximum GBW (130 MHz: typical × 1.3, assumed)');
    expect(sentence).toContain('It oscillates.');
  });

  it('prints as many digits as show the side of the limit', () => {
    expect(check({ point: { phaseMarginDeg: 44.996 } }).sentence).toContain('44.996°');
  });

  it.each([
    [9.99, 'over'],
    [10, 'clear'],
  ] as const)('a noise gain of %s at the crossing against a minimum stable gain of 10 is %s', (gain, verdict) => {
    expect(check({ device: { minimumStableGain: 10 }, point: { noiseGainAtCrossing: gain } }).verdict).toBe(verdict);
  });

  it('no crossing is clear, a margin that cannot be told unknown', () => {
    expect(check({ point: { noCrossing: true, phaseMarginDeg: null, noiseGainAtCrossing: null } }).verdict).toBe(
      'clear',
    );
    expect(check({ point: { phaseMarginDeg: null } }).verdict).toBe('unknown');
  });
});

describe('stability by a silent datasheet: no phase margin and no second pole', () => {
  it.each([
    [25, 'over'],
    [40, 'tight'],
    [88, 'clear'],
  ] as const)('the one-pole margin is an upper bound: %s° is %s', (phaseMarginDeg, verdict) => {
    expect(check({ point: { phaseMarginDeg }, stability: SILENT }).verdict).toBe(verdict);
  });

  it('is clear only on the ground of a minimum stable gain, and says so', () => {
    expect(check({ point: { phaseMarginDeg: 88 }, stability: SILENT }).sentence).toContain(
      'Judged by the minimum stable gain only',
    );
    const without = check({
      device: { minimumStableGain: undefined },
      point: { phaseMarginDeg: 88 },
      stability: SILENT,
    });
    expect(without.verdict).toBe('unknown');
    expect(without.sentence).toContain('Enter one on its device page.');
  });

  it('a capacitive load without output resistance is unknown, unless the margin is over already', () => {
    const stability = { loadCapacitive: true, outputResistanceKnown: false };
    expect(check({ stability }).verdict).toBe('unknown');
    expect(check({ stability, point: { phaseMarginDeg: 40 } }).verdict).toBe('unknown');
    expect(check({ stability, point: { phaseMarginDeg: 20 } }).verdict).toBe('over');
    expect(check({ stability }).sentence).toContain('no output resistance entered');
  });
});

describe('stability of current feedback without a second pole', () => {
  const silent = (feedbackOhm: number, feedbackF = 0) => {
    const input = chainInput([currentFeedbackStage('s', 'd', 'non-inverting', feedbackOhm, 250, { feedbackF })], []);
    const stage = {
      label: 'S1',
      stage: input.stages[0],
      device: currentFeedbackDevice('d', 150e6, 3, 500),
      analysis: { noiseGain: 3 } as StageAnalysis,
      stability: {
        atMinimum: POINT,
        atMaximum: POINT,
        worse: 'maximum',
        minimumGbw: { value: 150e6, basis: 'min', text: 'minimum' },
        maximumGbw: { value: 195e6, basis: 'typ-derated', text: 'typical × 1.3' },
        ...SILENT,
        outputResistanceKnown: true,
        loadCapacitive: false,
      },
    } as unknown as StageFacts;
    return stabilityCheck({ input, policy: input.policy } as ChainFacts, stage)!;
  };

  it('is clear when its loop is no faster than the reference circuit, unknown otherwise', () => {
    expect(silent(500).verdict).toBe('clear');
    expect(silent(500).sentence).toContain("datasheet's reference circuit");
    expect(silent(400).verdict).toBe('unknown');
    expect(silent(500, 1e-12).verdict).toBe('unknown');
    expect(silent(500, 1e-12).sentence).toContain('capacitor across Rf');
  });
});

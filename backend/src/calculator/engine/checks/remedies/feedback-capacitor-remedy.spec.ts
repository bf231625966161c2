import { calculate } from '../..';
import type { Check, VoltageFeedbackStage } from '../..';
import { chainInput, voltageFeedbackDevice, voltageFeedbackStage } from '../../verification/chain-builder.test-support';

/**
 * 100 kΩ, 230 MHz and 23.3 pF at the inverting node, one pole, no output resistance: the loop
 * T = (GBW/jf)·(1 + jωRfCf)/(1 + jωRf(C + Cf)) was solved for |T| = 1 outside this project.
 */
describe('feedbackCapacitorRemedy(trials, stage) for a transimpedance stage', () => {
  const device = voltageFeedbackDevice('d', 230e6, {
    gainBandwidthHz: { min: 230e6, typ: 230e6, max: 230e6 },
    minimumStableGain: 1,
    secondPoleHz: 1e13,
    outputResistanceOhm: { typ: 0 },
    openLoopGainDb: { typ: 160 },
    commonModeCapacitanceF: { typ: 3.3e-12 },
  });
  const stability = (change: Partial<VoltageFeedbackStage>): Check => {
    const stage = voltageFeedbackStage('s', 'd', 'transimpedance', 100e3, null, change);
    const source = { kind: 'current', resistanceOhm: 1e12, capacitanceF: 20e-12, largestLevel: 1e-6 } as const;
    const report = calculate(
      chainInput([stage], [device], {
        source,
        gainBasis: 'transimpedance',
        band: { lowHz: 1e3, operatingHz: 1e5, highHz: 1e6 },
      }),
    );
    return report.stages[0].checks.find((check) => check.id === 'stability')!;
  };

  it('without a capacitor the margin is 1° and the next E12 value to the rule for about 45° gives 51°', () => {
    const check = stability({});
    expect(check.verdict).toBe('over');
    expect(check.sentence).toContain(' is 0.987°');
    const remedy = check.remedies.find(({ action }) => action?.includes('across Rf'))!;
    expect(remedy.sentence).toContain('phase margin to 51.1°');
    const [replaced] = remedy.stages as VoltageFeedbackStage[];
    expect(replaced.feedbackF! / 0.39e-12).toBeCloseTo(1, 12);
    expect(stability({ feedbackF: replaced.feedbackF }).verdict).toBe('clear');
  });

  it('is not offered where the capacitor is there already', () => {
    const actions = stability({ feedbackF: 0.56e-12 }).remedies.map(({ action }) => action);
    expect(actions.some((action) => action?.includes('across Rf'))).toBe(false);
  });
});

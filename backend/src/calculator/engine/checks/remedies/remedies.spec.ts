import { calculate } from '../..';
import type { ChainInput, Remedy, Stage, VoltageFeedbackStage } from '../..';
import {
  chainInput,
  currentFeedbackDevice,
  currentFeedbackStage,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from '../../verification/chain-builder.test-support';
import { asNonInverting, resistorGain, splitInTwo, withGain } from './replacement-stages';
import { derivedStageId } from './stage-id';

type RatioStage = VoltageFeedbackStage & { gainOhm: number };

const inverting = voltageFeedbackStage('s', 'd', 'inverting', 1000, 100, { couplingF: 1e-9 }) as RatioStage;
const nonInverting = voltageFeedbackStage('s', 'd', 'non-inverting', 900, 100) as RatioStage;
const gainOf = (stage: Stage | null): number => resistorGain(stage as RatioStage);

describe('derivedStageId(id, taken)', () => {
  it('gives the same UUID for the same id, and another one when that is taken', () => {
    const first = derivedStageId('a', new Set());
    expect(first).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
    expect(derivedStageId('a', new Set())).toBe(first);
    expect(derivedStageId('b', new Set())).not.toBe(first);
    expect(derivedStageId('a', new Set([first]))).not.toBe(first);
  });

  it('does not collide over ten thousand ids', () => {
    const ids = Array.from({ length: 10_000 }, (_, index) => derivedStageId(`stage-${index}`, new Set()));
    expect(new Set(ids).size).toBe(10_000);
  });
});

describe('replacement stages', () => {
  it('as non-inverting of the same size: Rf stays, a coupled input gets the old Rg as its DC return', () => {
    const replacement = asNonInverting(inverting) as RatioStage;
    expect(gainOf(replacement)).toBeCloseTo(10, 12);
    expect(replacement).toMatchObject({ topology: 'non-inverting', feedbackOhm: 1000, biasOhm: 100, wantedGain: 10 });
    expect(asNonInverting({ ...inverting, couplingF: null })).toMatchObject({ biasOhm: null });
  });

  it('an inverting stage of at most ×1 cannot be non-inverting', () => {
    expect(asNonInverting({ ...inverting, feedbackOhm: 100 })).toBeNull();
    expect(asNonInverting(nonInverting)).toBeNull();
  });

  it('split in two equal stages: coupling in front, isolation behind, gains multiply to the old one', () => {
    const [first, second] = splitInTwo({ ...inverting, isolationOhm: 22 }, [inverting])!;
    expect(gainOf(first) * gainOf(second)).toBeCloseTo(10, 12);
    expect(first).toMatchObject({ id: 's', couplingF: 1e-9, isolationOhm: 0 });
    expect(second).toMatchObject({ couplingF: null, isolationOhm: 22 });
    const pair = splitInTwo(nonInverting, [nonInverting])!;
    expect(gainOf(pair[0]) * gainOf(pair[1])).toBeCloseTo(10, 12);
  });

  it('a chain of 24 stages cannot be split further', () => {
    const full = Array.from({ length: 24 }, (_, index) => ({ ...inverting, id: `s${index}` }));
    expect(splitInTwo(inverting, full)).toBeNull();
  });

  it('another size of gain keeps Rg and the sign', () => {
    expect(gainOf(withGain(inverting, 2.57))).toBeCloseTo(-2.57, 12);
    expect(gainOf(withGain(nonInverting, 2.57))).toBeCloseTo(2.57, 12);
    expect(withGain(nonInverting, 1)).toBeNull();
  });
});

const COMPLETE = {
  openLoopGainDb: { typ: 200 },
  minimumStableGain: 1,
  slewRateVPerS: { min: 100e6 },
  headroomPositiveV: { max: 1 },
  headroomNegativeV: { max: 1 },
  outputCurrentA: { min: 50e-3 },
  supplyVoltageV: { min: 5, max: 12 },
} as const;

function remediesOf(input: ChainInput, id: string): readonly Remedy[] {
  return calculate(input).stages[0].checks.find((check) => check.id === id)?.remedies ?? [];
}

/** The chain with the remedy applied to its first stage. */
function apply(input: ChainInput, remedy: Remedy): ReturnType<typeof calculate> {
  return calculate({ ...input, stages: [...(remedy.stages ?? []), ...input.stages.slice(1)] });
}

describe('remedies by check, each holding what it says', () => {
  it('lower corner: the next larger E6 coupling that meets the target', () => {
    const device = voltageFeedbackDevice('d', 1e9, {
      ...COMPLETE,
      phaseMarginDeg: 60,
      outputResistanceOhm: { typ: 0 },
    });
    // 100 pF into 1 kΩ: 1.59 MHz, above half of the 3 MHz at which the band starts.
    const stage = voltageFeedbackStage('s', 'd', 'inverting', 2000, 1000, { couplingF: 100e-12 });
    const input = chainInput([stage], [device]);
    const [remedy] = remediesOf(input, 'lower-corner');
    expect(remedy).toMatchObject({ action: 'Use 150 pF', verdict: 'clear' });
    const corner = apply(input, remedy).stages[0].cases.minimum.figures.cornerLower.value!;
    // 1/(2π · (1 kΩ + 50 Ω) · 150 pF) = 1.0105 MHz; the amplifier's own input adds 0.2 %.
    expect(corner / 1e6).toBeCloseTo(1.01, 2);
    expect(remedy.sentence).toContain('1.01 MHz');
  });

  it('a capacitive load: the smallest of a few isolation resistors that brings the phase margin back', () => {
    const device = voltageFeedbackDevice('d', 300e6, {
      ...COMPLETE,
      phaseMarginDeg: 60,
      outputResistanceOhm: { typ: 50 },
    });
    const stage = voltageFeedbackStage('s', 'd', 'non-inverting', 300, 100);
    const input = chainInput([stage], [device], { load: { resistanceOhm: 1000, capacitanceF: 100e-12 } });
    const before = calculate(input).stages[0];
    expect(before.checks.find((check) => check.id === 'stability')?.verdict).not.toBe('clear');
    const remedy = remediesOf(input, 'stability').find((each) => each.action?.includes('isolation'))!;
    const after = apply(input, remedy).stages[0];
    expect(after.checks.find((check) => check.id === 'stability')?.verdict).toBe('clear');
    const margin = after.cases.minimum.figures.phaseMargin.value!;
    expect(margin).toBeGreaterThan(before.cases.minimum.figures.phaseMargin.value!);
    expect(remedy.sentence).toContain(`${margin.toPrecision(3)}°`);
  });

  it('current feedback: the reference resistor, the gain kept', () => {
    const device = currentFeedbackDevice('d', 150e6, 3, 500, COMPLETE);
    const input = chainInput([currentFeedbackStage('s', 'd', 'inverting', 300, 150)], [device]);
    const [remedy] = remediesOf(input, 'feedback-resistor');
    expect(remedy.stages).toEqual([expect.objectContaining({ feedbackOhm: 500, gainOhm: 250 })]);
    expect(apply(input, remedy).stages[0].checks.find((check) => check.id === 'feedback-resistor')?.verdict).toBe(
      'clear',
    );
  });

  it('a clear stage gets none', () => {
    const device = voltageFeedbackDevice('d', 1e9, {
      ...COMPLETE,
      phaseMarginDeg: 60,
      outputResistanceOhm: { typ: 0 },
    });
    const report = calculate(chainInput([voltageFeedbackStage('s', 'd', 'non-inverting', 900, 100)], [device]));
    expect(report.stages[0].checks.every((check) => check.remedies.length === 0)).toBe(true);
  });

  it('a change that would stay over is not offered', () => {
    const device = voltageFeedbackDevice('d', 1e6, COMPLETE);
    const input = chainInput([voltageFeedbackStage('s', 'd', 'inverting', 10_000, 100)], [device]);
    const actions = remediesOf(input, 'gbw').map((remedy) => remedy.action);
    expect(actions).toEqual([undefined]);
  });

  it('devices beside those of the input are proposed, unless they are at the end of their life', () => {
    const device = voltageFeedbackDevice('d', 50e6, { ...COMPLETE, phaseMarginDeg: 60 });
    const input = chainInput([voltageFeedbackStage('s', 'd', 'non-inverting', 900, 100)], [device]);
    const faster = { ...device, id: 'f', partNumber: 'FAST-1', gainBandwidthHz: { min: 500e6 } };
    const actions = (alternatives: (typeof faster)[]) =>
      calculate(input, alternatives).stages[0].checks.flatMap((check) => check.remedies.map((each) => each.action));
    expect(actions([])).not.toContain('Use FAST-1');
    expect(actions([faster])).toContain('Use FAST-1');
    expect(actions([{ ...faster, lifecycle: 'obsolete' } as typeof faster])).not.toContain('Use FAST-1');
  });
});

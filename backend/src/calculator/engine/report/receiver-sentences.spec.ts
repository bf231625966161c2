import { calculate, summarize } from '..';
import type { ChainReport, Check } from '..';
import { completeReceiver } from '../verification/complete-receiver.test-support';

/**
 * What is said of the invented ultrasonic receiver (hand assumptions: one pole, A0 → ∞, nothing parasitic).
 * Figures by hand: noise gain 11 at 7 MHz takes 77 MHz of 75 MHz, 0.974; as non-inverting 10 × 7 = 70 MHz, 1.071; split
 * into 3.162 each 4.162 × 7 = 29.1 MHz, 2.574; ×3 takes 231 MHz; MRWG-V300 260/77 = 3.377.
 */
const baseline = calculate(completeReceiver('Baseline'));
const check = (owner: { readonly checks: readonly Check[] }, id: string): Check =>
  owner.checks.find((each) => each.id === id)!;
const remedies = check(baseline.stages[1], 'gbw').remedies;

describe('Baseline: what breaks first', () => {
  it('is said of stage, chain and list in the same words', () => {
    expect(baseline.verdict).toMatchObject({ verdict: 'over', stageId: 'S2', checkId: 'gbw' });
    expect(baseline.verdict.lead).toBe('S2 spends more than it has.');
    expect(baseline.verdict.text).toBe(
      'At 7 MHz its noise gain of 11 uses 77.0 MHz; MRWG-G072 guarantees 75.0 MHz (minimum, p. 4). ' +
        'It needs 231 MHz for the target ×3. ' +
        'MRWG-V300 at −10 would leave ×3.38 for 0.83 USD more. ' +
        'As non-inverting ×10 it would use 70.0 MHz (×1.07, tight) and turn the polarity over.',
    );
    expect(baseline.stages[1].verdict).toEqual(baseline.verdict);
    expect(summarize(completeReceiver('Baseline'))).toMatchObject({
      verdict: 'over',
      lead: baseline.verdict.lead,
      worstHeadroomStage: 'S2 Gain',
      cost: { amountMicros: 8_120_000, currency: 'USD' },
    });
  });

  it('the other stages are clear, with their margin in words', () => {
    expect(baseline.stages.map((stage) => stage.verdict.verdict)).toEqual(['clear', 'over', 'clear', 'clear']);
    expect(baseline.stages[0].verdict.text).toBe(
      'At 7 MHz its noise gain of 10 uses 70.0 MHz; QUIL-D618 guarantees 1.20 GHz (minimum, p. 4): headroom ×17.1.',
    );
  });

  it('gain and flatness name the stage that loses most, with the hand droops 1.869 of 1.92 dB and 2.357 of 2.44 dB', () => {
    expect(check(baseline, 'gain').sentence).toBe(
      'The gain at 5 MHz is 58.08 dB, below 59.00 dB (60 ±1 dB). S2 contributes most: 1.87 dB of 1.92 dB.',
    );
    expect(check(baseline, 'flatness').sentence).toBe(
      'From 3 MHz to 7 MHz the gain changes by 2.44 dB; the limit is 1.00 dB. S2 contributes most: 2.36 dB of 2.44 dB.',
    );
  });
});

describe('Baseline: what would help, each from the full model of the changed chain', () => {
  const remedy = (words: RegExp) => remedies.find((each) => words.test(each.sentence))!;
  const applied = (words: RegExp): ChainReport => {
    const input = completeReceiver('Baseline');
    const stages = [input.stages[0], ...(remedy(words).stages ?? []), ...input.stages.slice(2)];
    return calculate({ ...input, stages });
  };

  it('the GBW it needs: 77 × 3 = 231 MHz, 77 MHz just not to be over', () => {
    expect(remedies[0]).toEqual({
      sentence: 'It needs a GBW of at least 231 MHz for the headroom target ×3 (77 MHz for ×1).',
      verdict: 'clear',
    });
  });

  it('the cheapest device that is clear here', () => {
    expect(remedy(/V300/)).toMatchObject({ verdict: 'clear', action: 'Use MRWG-V300' });
    expect(applied(/V300/).stages[1].cases.minimum.figures.headroom.value).toBeCloseTo(260 / 77, 6);
  });

  it('non-inverting spends 10 instead of 11 and turns the polarity over', () => {
    expect(remedy(/non-inverting/)).toMatchObject({ verdict: 'tight', action: 'Make it non-inverting ×10' });
    const report = applied(/non-inverting/);
    expect(report.stages[1].cases.minimum.figures.headroom.value).toBeCloseTo(75 / 70, 6);
    expect([baseline.polarity, report.polarity]).toEqual(['in-phase', 'inverted']);
  });

  it('split in two takes 29.1 MHz each, and says that flatness still fails at 1.07 dB', () => {
    expect(remedy(/Split/).sentence).toBe(
      'Split into two stages of −3.162 with the same device, each would use at most 29.1 MHz (×2.57, tight) for ' +
        '0.62 USD more; the polarity turns over. The chain would still fail: flatness 1.07 dB.',
    );
    const report = applied(/Split/);
    expect(report.stages).toHaveLength(5);
    expect(report.cases.minimum.figures.flatness.value).toBeCloseTo(1.07, 2);
    expect(report.cases.minimum.figures.gainOperating.value).toBeCloseTo(59.3, 2);
    expect(report.cost.amountMicros).toBe(8_740_000);
  });

  it('new stages get ids that are UUIDs, the same every time', () => {
    const ids = (remedy(/Split/).stages ?? []).map((stage) => stage.id);
    expect(ids[0]).toBe('S2');
    expect(ids[1]).toMatch(/^[0-9a-f]{8}-[0-9a-f]{4}-4[0-9a-f]{3}-[89ab][0-9a-f]{3}-[0-9a-f]{12}$/);
    expect(check(calculate(completeReceiver('Baseline')).stages[1], 'gbw').remedies).toEqual(remedies);
  });

  it('the largest gain of this device: noise gain 75/(3·7) = 3.571, so −2.57', () => {
    expect(remedy(/at most −2\.57 /)).toMatchObject({ action: 'Set −2.57' });
    const report = applied(/at most −2\.57 /);
    expect(report.stages[1].cases.minimum.figures.headroom.value).toBeGreaterThanOrEqual(3);
    expect(report.stages[1].cases.minimum.figures.signalGain.value).toBeCloseTo(-2.57, 9);
  });

  it('no sentence of the report shouts or claims a number that is none', () => {
    expect(JSON.stringify(baseline)).not.toMatch(/!|NaN|Infinity|undefined/);
  });
});

describe('options A, B and C', () => {
  it('A: only the cost is tight', () => {
    const report = calculate(completeReceiver('A'));
    expect(report.stages.every((stage) => stage.verdict.verdict === 'clear')).toBe(true);
    expect(report.verdict).toMatchObject({
      verdict: 'tight',
      lead: 'The chain is tight: cost.',
      text: 'Cost is 8.95 USD, 0.05 under 9.00. S1 takes 4.10.',
    });
  });

  it('B: every stage passes, flatness fails, and the sentence says who loses most and what would help', () => {
    const report = calculate(completeReceiver('B'));
    expect(report.stages.map((stage) => stage.verdict.verdict)).not.toContain('over');
    expect(report.verdict).toMatchObject({ verdict: 'over', checkId: 'flatness', stageId: null });
    expect(report.verdict.lead).toBe('The chain is not flat enough.');
    expect(report.verdict.text).toMatch(
      /^From 3 MHz to 7 MHz the gain changes by 1\.07 dB; the limit is 1\.00 dB\. S2 contributes most: 0\.49 dB of 1\.07 dB\./,
    );
    expect(report.verdict.text).toContain('MRWG-V300 as S2 would give flatness 0.62 dB');
  });

  it('C: passes, S2 is tight at 75/35 = 2.14', () => {
    const report = calculate(completeReceiver('C'));
    expect(report.verdict).toMatchObject({ verdict: 'tight', lead: 'S2 has little GBW to spare.' });
    expect(report.verdict.text).toContain('headroom ×2.14, target ×3');
    expect(report.polarity).toBe('inverted');
  });
});

describe('headline of the Baseline', () => {
  const items = baseline.headline.minimum;

  it('has six figures with the requirement beside each', () => {
    expect(items.map((item) => [item.label, item.requirement, item.verdict])).toEqual([
      ['Gain at 5 MHz', 'below 59.00 (60 ±1 dB)', 'over'],
      ['Flatness 3 – 7 MHz', 'limit 1.00 dB', 'over'],
      ['Upper corner, −3 dB', 'band ends at 7 MHz', null],
      ['Worst headroom', 'S2 at 7 MHz; target ×3', 'over'],
      ['Input noise', 'limit 10 nV/√Hz', 'clear'],
      ['Devices, per board at 250', '0.88 under 9.00 USD', 'tight'],
    ]);
  });

  it('verdicts stay on the case of the project, figures follow the case shown', () => {
    const typical = baseline.headline.typical;
    expect(typical[3].verdict).toBe('over');
    expect(typical[3].figure?.value).toBeCloseTo(100 / 77, 6);
    expect(typical[0].requirement).toBe('below 59.00 (60 ±1 dB)');
  });
});

describe('slew: a fault that no split can mend', () => {
  it('is said, with the slew rate and the level that would do', () => {
    const input = completeReceiver('Baseline');
    const devices = input.devices.map((device) =>
      device.id === 'mrwg-v300' ? { ...device, slewRateVPerS: { min: 10e6 } } : device,
    );
    const slew = check(calculate({ ...input, devices }).stages[2], 'slew');
    // 2π · 7 MHz · 0.5 V = 21.99 V/µs, twice that 43.98.
    expect(slew.verdict).toBe('over');
    expect(slew.sentence).toBe(
      '500 mV peak at 7 MHz needs 22.0 V/µs; MRWG-V300 guarantees 10.0 V/µs (minimum): ×0.455.',
    );
    expect(slew.remedies[0].sentence).toBe(
      'It needs at least 44 V/µs for the target ×2 (22 V/µs for ×1). ' +
        'Splitting the gain cannot help: the output has to swing as far.',
    );
  });
});

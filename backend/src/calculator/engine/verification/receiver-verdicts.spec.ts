import { calculate } from '../index';
import type { ChainReport, CheckId, StageReport, Verdict } from '../report';
import { ALTERNATE, ReceiverOption, receiver } from './ultrasonic-receiver.test-support';

const stageOf = (report: ChainReport, k: number): StageReport => report.stages[k];
const checkOf = (owner: ChainReport | StageReport, id: CheckId) => owner.checks.find((check) => check.id === id);
const verdictOf = (owner: ChainReport | StageReport, id: CheckId): Verdict | undefined => checkOf(owner, id)?.verdict;

/** What is said of the invented receiver, at its minimum GBW and with the hand assumptions. */
describe('verdicts of the ultrasonic receiver', () => {
  const baseline = calculate(receiver('Baseline'));

  it('Baseline: S2 is over its GBW limit by 0.974 at 7 MHz, and the chain says so', () => {
    expect(baseline.verdict).toMatchObject({ verdict: 'over', stageId: 'S2', checkId: 'gbw' });
    expect(verdictOf(stageOf(baseline, 1), 'gbw')).toBe('over');
    expect(stageOf(baseline, 1).cases.minimum.figures.headroom.value).toBeCloseTo(0.974, 3);
    // 7 MHz × 11 = 77 MHz of 75 MHz.
    expect(checkOf(stageOf(baseline, 1), 'gbw')!.sentence).toMatch(/77\.0 MHz.*75\.0 MHz/);
    expect(baseline.cases.minimum.worstHeadroomStageId).toBe('S2');
    expect(baseline.cases.minimum.worstHeadroomHz! / 7e6).toBeCloseTo(1, 9);
  });

  it('Baseline: gain and flatness fail, supply passes', () => {
    expect(verdictOf(baseline, 'gain')).toBe('over');
    expect(verdictOf(baseline, 'flatness')).toBe('over');
    expect(verdictOf(baseline, 'supply-current')).toBe('clear');
  });

  it.each<[ReceiverOption, string, Verdict, Verdict]>([
    ['Baseline', '8.12', 'over', 'over'],
    ['A', '8.95', 'clear', 'clear'],
    ['B', '8.74', 'over', 'clear'],
    ['C', '8.12', 'tight', 'clear'],
  ])('%s: cost %s USD, flatness %s, gain %s', (option, cost, flatness, gain) => {
    const report = calculate(receiver(option));
    expect((report.cost.amountMicros! / 1e6).toFixed(2)).toBe(cost);
    expect(report.cost.currency).toBe('USD');
    const flatnessVerdict = verdictOf(report, 'flatness');
    // 0.80 dB stands on the edge between clear and tight (20 % of 1.0 dB): 0.8045 is inside the last fifth.
    expect(flatnessVerdict).toBe(flatness);
    expect([gain, 'tight']).toContain(verdictOf(report, 'gain'));
  });

  it('the alternate preamplifier: over at a noise gain of 10, stable at 20', () => {
    const stability = (option: ReceiverOption): Verdict | undefined =>
      verdictOf(stageOf(calculate(receiver(option, {}, ALTERNATE)), 0), 'stability');
    expect(stability('Baseline')).toBe('over');
    expect(stability('B')).toBe('over');
    expect(stability('A')).toBe('clear');
    expect(stability('C')).toBe('clear');
  });

  it('the case switch changes figures, not verdicts', () => {
    expect(stageOf(baseline, 1).cases.typical.figures.headroom.value).toBeCloseTo(100 / 77, 6);
    expect(baseline.gbwCase).toBe('minimum');
    expect(baseline.headline.typical.map(({ verdict }) => verdict)).toEqual(
      baseline.headline.minimum.map(({ verdict }) => verdict),
    );
  });

  it('the driver has no GBW, no headroom, and no GBW check', () => {
    const driver = stageOf(baseline, 3);
    expect(driver.hasGbw).toBe(false);
    expect(driver.cases.minimum.figures.gbwHave.value).toBeNull();
    expect(driver.cases.minimum.figures.headroom.value).toBeNull();
    expect(checkOf(driver, 'gbw')).toBeUndefined();
  });
});

import { calculate, curves, summarize, tryDevices, working } from '.';
import { completeReceiver } from './verification/complete-receiver.test-support';

/**
 * The examples that stand in the doc blocks of the door, on the receiver whose figures follow by hand: a noise gain of 11
 * at 7 MHz takes 77 MHz of the 75 MHz that S2 has (0.974); 260 MHz would leave 260/77 = 3.38, above the target of 3.
 */
describe('the examples of the door', () => {
  const input = completeReceiver('Baseline');
  const stageId = 'S2';

  it('calculate(input).verdict.lead', () => {
    expect(calculate(input).verdict.lead).toBe('S2 spends more than it has.');
  });

  it('curves(input, request).chain.minimum.gainDb.length', () => {
    expect(curves(input, { fromHz: 1e6, toHz: 1e8, points: 401 }).chain.minimum.gainDb).toHaveLength(401);
  });

  it('working(input, request).result', () => {
    expect(working(input, { stageId, figure: 'headroom', gbwCase: 'minimum' }).result).toBe('×0.974');
  });

  it('tryDevices(input, stageId, devices).candidates[0].verdict', () => {
    expect(tryDevices(input, stageId, input.devices).candidates[0].verdict).toBe('clear');
  });

  it('summarize(input).worstHeadroomStage', () => {
    expect(summarize(input).worstHeadroomStage).toBe('S2 Gain');
  });
});

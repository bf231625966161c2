import { computeCurves } from './curves';
import { HAND_BASELINE, handReceiver } from './hand-receiver.test-support';

describe('computeCurves(input, request)', () => {
  const curves = computeCurves(handReceiver(HAND_BASELINE), { fromHz: 1e5, toHz: 1e9, points: 5 });

  it('gives a logarithmic grid with both ends and one curve a case and stage', () => {
    expect(curves.frequenciesHz).toHaveLength(5);
    expect(curves.frequenciesHz[2]).toBeCloseTo(1e7, 0);
    expect(curves.frequenciesHz[4]).toBe(1e9);
    expect(curves.stages.map((stage) => stage.label)).toEqual(['S1', 'S2', 'S3', 'S4']);
    expect(curves.idealGainDb).toBeCloseTo(60, 9);
  });

  it('follows the phase of four poles towards −360° even with one point a decade', () => {
    const phase = curves.chain.minimum.phaseDeg;
    expect(phase[0]).toBeGreaterThan(-3);
    const corners = [120e6, 75e6 / 11, 52e6, 150e6];
    const byHand = -corners.reduce((sum, corner) => sum + (Math.atan(1e9 / corner) * 180) / Math.PI, 0);
    expect(phase[4]).toBeCloseTo(byHand, 1);
  });

  it('one pole falls by 10·log(1 + (f/f_cl)²)', () => {
    const s2 = curves.stages[1];
    expect(s2.cases.minimum.gainDb[2]).toBeCloseTo(20 - 10 * Math.log10(1 + (10 / (75 / 11)) ** 2), 3);
  });

  it('typical lies above minimum', () => {
    const { typical, minimum } = curves.chain;
    expect(typical.gainDb[2] ?? NaN).toBeGreaterThan(minimum.gainDb[2] ?? NaN);
  });
});

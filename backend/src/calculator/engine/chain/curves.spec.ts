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

  it('a chain in phase reads near 0° at the operating frequency, whatever its couplings do below', () => {
    const coupled = HAND_BASELINE.map((stage) => ({
      ...stage,
      couplingF: 1e-6,
      ...(stage.topology === 'non-inverting' ? { biasOhm: 100 } : {}),
    }));
    const request = { fromHz: 50, toHz: 5e8, points: 701 };
    const phase = computeCurves(handReceiver(coupled), request).chain.minimum.phaseDeg;
    // 100 points a decade: the 500th stands at 5 MHz, where couplings of 0.3 to 1.6 kHz turn the phase by less than 0.1°.
    const lags = [120e6, 75e6 / 11, 52e6, 150e6].reduce((sum, corner) => sum + Math.atan(5e6 / corner), 0);
    expect(phase[500]).toBeCloseTo((-lags * 180) / Math.PI, 0);
    expect(phase[0]).toBeGreaterThan(300);
  });
});

import { Complex, complex, divide, multiply } from '../complex';
import { smallestPhaseMargin } from './loop-crossings';

const pole = (hz: number, f: number): Complex => complex(1, f / hz);

/** Phase margins of textbook loops, worked out by hand from arctangents. */
describe('smallestPhaseMargin(loop, fromHz, toHz)', () => {
  it('one pole: 90° plus what the corner still gives', () => {
    const margin = smallestPhaseMargin((f) => divide(complex(100), pole(1, f)), 1e-3, 1e6);
    expect(margin.crossingHz).toBeCloseTo(Math.sqrt(9999), 6);
    expect(margin.phaseMarginDeg).toBeCloseTo(180 - (Math.atan(Math.sqrt(9999)) * 180) / Math.PI, 6);
  });

  it('three poles with much gain: the margin is negative, which a principal value cannot show', () => {
    const loop = (f: number) => divide(complex(1e4), multiply(pole(1, f), multiply(pole(1, f), pole(1, f))));
    const { phaseMarginDeg } = smallestPhaseMargin(loop, 1e-3, 1e6);
    const crossing = Math.sqrt(1e4 ** (2 / 3) - 1);
    expect(phaseMarginDeg).toBeCloseTo(180 - (3 * Math.atan(crossing) * 180) / Math.PI, 6);
    expect(phaseMarginDeg).toBeLessThan(-60);
  });

  it('four poles: beyond −270° the margin stays below −90°', () => {
    const two = (f: number) => multiply(pole(1, f), pole(1, f));
    const { phaseMarginDeg } = smallestPhaseMargin((f) => divide(complex(1e8), multiply(two(f), two(f))), 1e-3, 1e6);
    expect(phaseMarginDeg).toBeLessThan(-170);
  });

  it('no crossing: none', () => {
    const margin = smallestPhaseMargin((f) => divide(complex(0.5), pole(1, f)), 1e-3, 1e6);
    expect(margin).toEqual({ noCrossing: true, phaseMarginDeg: null, crossingHz: null, crossingsHz: [] });
  });

  it('a sharp resonance after the first crossing counts: three crossings, the smallest margin wins', () => {
    const resonance = (f: number) => complex(1 - (f / 1e3) ** 2, (0.001 * f) / 1e3);
    const loop = (f: number) => divide(complex(10), multiply(pole(1, f), resonance(f)));
    const margin = smallestPhaseMargin(loop, 1e-3, 1e6, 8);
    expect(margin.crossingsHz).toHaveLength(3);
    expect(margin.phaseMarginDeg).toBeLessThan(0);
  });
});

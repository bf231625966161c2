import { add, angleDeg, complex, divide, magnitude, magnitudeSquared, multiply, reciprocal, scale } from './complex';
import { availablePowerToPeakEmf, dbToPower, dbToRatio, degrees, powerToDb, ratioToDb } from './units';

describe('complex arithmetic', () => {
  it('add, multiply, divide, scale', () => {
    expect(add(complex(1, 2), complex(3, -1))).toEqual({ re: 4, im: 1 });
    expect(multiply(complex(0, 1), complex(0, 1))).toEqual({ re: -1, im: 0 });
    expect(divide(complex(1), complex(0, 1))).toEqual({ re: 0, im: -1 });
    expect(scale(complex(1, 2), 3)).toEqual({ re: 3, im: 6 });
  });

  it('magnitude and angle', () => {
    expect(magnitude(complex(3, 4))).toBe(5);
    expect(magnitudeSquared(complex(3, 4))).toBe(25);
    expect(angleDeg(complex(0, 2))).toBe(90);
    expect(angleDeg(complex(-1, 0))).toBe(180);
  });

  it('the reciprocal of 0 is an open circuit', () => {
    expect(reciprocal(complex(0))).toEqual({ re: Infinity, im: 0 });
    expect(reciprocal(complex(0, 2))).toEqual({ re: 0, im: -0.5 });
  });

  it('a division by 0 is not a number', () => {
    expect(divide(complex(1), complex(0)).re).toBeNaN();
  });
});

/** Expected values: definitions; 0 dBm in 50 Ω is 223.6 mV rms. */
describe('units', () => {
  it('dB of ratios and powers, both ways', () => {
    expect(ratioToDb(10)).toBeCloseTo(20, 12);
    expect(powerToDb(2)).toBeCloseTo(3.0103, 4);
    expect(dbToRatio(-20)).toBeCloseTo(0.1, 12);
    expect(dbToPower(3)).toBeCloseTo(1.9953, 4);
  });

  it('0 dBm available from 50 Ω is an EMF of 2 × 223.6 mV rms', () => {
    expect(availablePowerToPeakEmf(0, 50) / Math.SQRT2).toBeCloseTo(2 * 0.2236, 4);
  });

  it('degrees', () => {
    expect(degrees(Math.PI)).toBeCloseTo(180, 12);
  });
});

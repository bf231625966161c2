import {
  chainInput,
  currentFeedbackDevice,
  currentFeedbackStage,
  matchedBlockDevice,
  matchedBlockStage,
  rcSection,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from './chain-builder.test-support';
import {
  Complex,
  ComplexMatrix,
  Factorisation,
  add,
  complex,
  divide,
  magnitude,
  multiply,
  relativeDifference,
} from './complex-matrix.test-support';
import { NodalChain } from './nodal-chain.test-support';
import { SeededRandom } from './random-chains.test-support';

const K_BOLTZMANN = 1.380649e-23;

/** The nodal solver is what the calculator is held to; here it is itself held to circuits that are solved by hand. */
describe('nodal solver', () => {
  it('solves random complex systems to rounding', () => {
    const random = new SeededRandom(7);
    for (let n = 1; n <= 40; n += 3) {
      const matrix = new ComplexMatrix(n);
      const x: Complex[] = [];
      for (let i = 0; i < n; i++) {
        x.push(complex(random.between(-1, 1), random.between(-1, 1)));
        for (let j = 0; j < n; j++) {
          matrix.add(i, j, complex(random.between(-1, 1) * 10 ** random.between(-6, 6), random.between(-1, 1)));
        }
      }
      const right = x.map((_, i) => ({
        row: i,
        value: x.reduce(
          (sum, value, j) => add(sum, multiply(complex(matrix.re[i * n + j], matrix.im[i * n + j]), value)),
          complex(0),
        ),
      }));
      new Factorisation(matrix).solve(right).forEach((value, i) => {
        expect(relativeDifference(value, x[i])).toBeLessThan(1e-8);
      });
    }
  });

  it('refuses a singular circuit', () => {
    const matrix = new ComplexMatrix(2);
    for (const [i, j] of [
      [0, 0],
      [0, 1],
      [1, 0],
      [1, 1],
    ]) {
      matrix.add(i, j, complex(1));
    }
    expect(() => new Factorisation(matrix)).toThrow('singular');
  });

  it('a loaded divider: gain R2/(R1 + R2), output resistance and noise of R1 ∥ R2', () => {
    const chain = new NodalChain(
      chainInput([rcSection('pad', { seriesOhm: 150, shuntOhm: 200 })], [], {
        load: { resistanceOhm: null },
        ambientK: 300,
      }),
      'typical',
      1e6,
    );
    expect(chain.gain().re).toBeCloseTo(0.5, 12);
    expect(chain.port(0).impedance.re).toBeCloseTo(100, 10);
    expect(chain.inputImpedance(0).re).toBeCloseTo(350, 10);
    // 150 Ω of 200 Ω in front and 200 Ω of shunt, each through the divider; the source's 50 Ω is not added noise.
    const expected = 4 * K_BOLTZMANN * 300 * (150 * 0.25 + 200 * 0.25);
    expect(chain.noiseAtLoad() / expected).toBeCloseTo(1, 12);
  });

  it('a non-inverting amplifier with no output resistance: A/(1 + A/NG), loop gain A/NG', () => {
    const device = voltageFeedbackDevice('a', 1e6, { openLoopGainDb: { typ: 100 } });
    const chain = new NodalChain(
      chainInput([voltageFeedbackStage('s', 'a', 'non-inverting', 9000, 1000)], [device]),
      'minimum',
      1e4,
    );
    const openLoop = divide(complex(1e5), complex(1, 1e4 / 10));
    const expected = divide(openLoop, add(complex(1), divide(openLoop, complex(10))));
    expect(relativeDifference(chain.gain(), expected)).toBeLessThan(1e-12);
    expect(relativeDifference(chain.loopGain(0)!, divide(openLoop, complex(10)))).toBeLessThan(1e-12);
    expect(relativeDifference(chain.noiseGain(0)!, complex(10))).toBeLessThan(1e-9);
  });

  it('an inverting amplifier from 50 Ω: noise gain 1 + Rf/(Rs + Rg), input resistance near Rg', () => {
    const device = voltageFeedbackDevice('a', 1e9, { openLoopGainDb: { typ: 160 } });
    const chain = new NodalChain(
      chainInput([voltageFeedbackStage('s', 'a', 'inverting', 1000, 50)], [device]),
      'minimum',
      1e3,
    );
    expect(relativeDifference(chain.noiseGain(0)!, complex(11))).toBeLessThan(1e-9);
    expect(chain.gain().re).toBeCloseTo(-10, 4);
    expect(chain.inputImpedance(0).re).toBeCloseTo(50, 4);
  });

  it('a current-feedback amplifier is at half power at its bandwidth in its reference circuit', () => {
    const device = currentFeedbackDevice('c', 120e6, 3, 500, {
      invertingInputResistanceOhm: { typ: 30 },
      openLoopTransimpedanceOhm: { typ: 5e5 },
      outputResistanceOhm: { typ: 20 },
      secondPoleHz: 300e6,
    });
    const source = { kind: 'voltage', resistanceOhm: 1e-9, levelKind: 'peak-emf' } as const;
    const stage = currentFeedbackStage('s', 'c', 'non-inverting', 500, 250);
    const input = chainInput([stage], [device], { source, load: { resistanceOhm: null } });
    const chain = new NodalChain(input, 'minimum', 120e6);
    expect(magnitude(chain.gain()) / 3).toBeCloseTo(Math.SQRT1_2, 9);
    expect(relativeDifference(chain.noiseGain(0)!, complex(3))).toBeLessThan(1e-9);
  });

  it('two matched blocks multiply, and the noise of the second is divided by the gain of the first', () => {
    const devices = [
      matchedBlockDevice('b1', 50, 20, { noiseFigureDb: { typ: 3 } }),
      matchedBlockDevice('b2', 50, 10, { noiseFigureDb: { typ: 6 } }),
    ];
    const input = chainInput([matchedBlockStage('s1', 'b1'), matchedBlockStage('s2', 'b2')], devices, {
      load: { resistanceOhm: 50 },
    });
    const chain = new NodalChain(input, 'typical', 1e8);
    // Half of the EMF reaches a matched load.
    expect(magnitude(chain.gain())).toBeCloseTo(0.5 * 10 ** 1.5, 9);
    const factor = 1 + chain.noiseAtLoad() / (magnitude(chain.gain()) ** 2 * 4 * K_BOLTZMANN * 290 * 50);
    expect(factor).toBeCloseTo(10 ** 0.3 + (10 ** 0.6 - 1) / 100, 9);
  });
});

import fc from 'fast-check';
import { analyzeChain } from '../chain/analyze-chain';
import { probeChain } from '../chain/probe';
import type { Maybe } from '../analysis';
import type { ChainInput, RcSectionStage } from '../types';
import { chainInput, matchedBlockDevice, matchedBlockStage, rcSection } from './chain-builder.test-support';
import { Complex, add, complex, divide, multiply, relativeDifference } from './complex-matrix.test-support';
import { gainStage, known } from './engine-figures.test-support';
import { randomChain } from './random-chains.test-support';
import { scaleImpedances } from './scaled-chain.test-support';

const seed = fc.integer({ min: 1, max: 1_000_000 });
const RUNS = { numRuns: 60, seed: 20260 };
const logBetween = (low: number, high: number): fc.Arbitrary<number> =>
  fc.double({ min: Math.log(low), max: Math.log(high), noNaN: true }).map(Math.exp);

function expectClose(actual: Complex, expected: Complex, tolerance = 1e-9): void {
  expect(relativeDifference(actual, expected)).toBeLessThan(tolerance);
}

/** Same value to 1e-7, or no value on both sides. */
function expectSame(actual: Maybe, expected: Maybe): void {
  if (expected.value === null) expect(actual.value).toBeNull();
  else expect(Math.abs(known(actual) - expected.value)).toBeLessThanOrEqual(1e-7 * Math.abs(expected.value) + 1e-9);
}

describe('properties of the network', () => {
  it('scaling all impedances changes no gain, no loop gain and no noise gain', () => {
    fc.assert(
      fc.property(seed, logBetween(0.05, 20), logBetween(1e3, 1e8), (drawn, k, hz) => {
        const input = randomChain(drawn);
        const before = probeChain(input, 'minimum', hz);
        const after = probeChain(scaleImpedances(input, k), 'minimum', hz);
        expectClose(after.gain, before.gain);
        after.stages.forEach((stage, i) => {
          expectClose(stage.node, before.stages[i].node);
          if (stage.loopGain) expectClose(stage.loopGain, before.stages[i].loopGain!);
          if (stage.noiseGain) expectClose(stage.noiseGain, before.stages[i].noiseGain!);
          expectClose(stage.outputImpedance, multiply(before.stages[i].outputImpedance, complex(k)));
        });
      }),
      RUNS,
    );
  });

  it('scaling all impedances changes no corner, no gain figure and no headroom', () => {
    fc.assert(
      fc.property(seed, logBetween(0.05, 20), (drawn, k) => {
        const input = { ...randomChain(drawn) };
        const before = analyzeChain(input).cases.minimum;
        const after = analyzeChain(scaleImpedances(input, k)).cases.minimum;
        if (input.specification.source.kind === 'voltage') {
          expectSame(after.gainOperatingDb, before.gainOperatingDb);
          expectSame(after.idealGainDb, before.idealGainDb);
        }
        expectSame(after.cornerUpperHz, before.cornerUpperHz);
        expectSame(after.flatnessDb, before.flatnessDb);
        after.stages.forEach((stage, i) => {
          expectSame(stage.headroomTop, before.stages[i].headroomTop);
          expectSame(stage.cornerUpperHz, before.stages[i].cornerUpperHz);
          expectSame(stage.cornerFirstOrderHz, before.stages[i].cornerFirstOrderHz);
        });
      }),
      { ...RUNS, numRuns: 30 },
    );
  });

  it('the fold to the right and the fold to the left meet at every node', () => {
    fc.assert(
      fc.property(seed, logBetween(1e2, 1e9), (drawn, hz) => {
        const probe = probeChain(randomChain(drawn), 'typical', hz);
        probe.stages.forEach((stage, k) => {
          const behind = probe.stages[k + 1]?.inputImpedance ?? probe.load;
          if (!Number.isFinite(behind.re)) {
            expectClose(stage.node, stage.openCircuit);
            return;
          }
          const divided = divide(multiply(stage.openCircuit, behind), add(stage.outputImpedance, behind));
          expectClose(divided, stage.node);
        });
        expectClose(probe.stages[probe.stages.length - 1].node, probe.gain);
      }),
      RUNS,
    );
  });

  it('passive chains are reciprocal: load current per EMF is the same from either end', () => {
    const ohms = logBetween(10, 1e5);
    const section = fc.record({
      seriesOhm: ohms,
      seriesF: logBetween(1e-12, 1e-6),
      shuntOhm: ohms,
      shuntF: logBetween(1e-13, 1e-8),
    });
    fc.assert(
      fc.property(
        fc.array(section, { minLength: 1, maxLength: 5 }),
        ohms,
        ohms,
        logBetween(1e3, 1e8),
        (parts, left, right, hz) => {
          const forward = parts.map((part, k) => rcSection(`s${k}`, part));
          // Read from the other end a section is its shunt part followed by its series part.
          const backward = [...parts]
            .reverse()
            .flatMap((part, k): RcSectionStage[] => [
              rcSection(`p${k}`, { shuntOhm: part.shuntOhm, shuntF: part.shuntF }),
              rcSection(`q${k}`, { seriesOhm: part.seriesOhm, seriesF: part.seriesF }),
            ]);
          const there = currentGain(passive(forward, left, right), right, hz);
          const back = currentGain(passive(backward, right, left), left, hz);
          expectClose(there, back);
        },
      ),
      RUNS,
    );
  });

  it('matched blocks between their own impedance: noise figure as Friis, gain as the product', () => {
    const block = fc.record({
      gainDb: fc.double({ min: -10, max: 25, noNaN: true }),
      noiseFigureDb: fc.double({ min: 0.1, max: 15, noNaN: true }),
    });
    fc.assert(
      fc.property(fc.array(block, { minLength: 1, maxLength: 6 }), (blocks) => {
        const devices = blocks.map(({ gainDb, noiseFigureDb }, k) =>
          matchedBlockDevice(`b${k}`, 50, gainDb, { noiseFigureDb: { typ: noiseFigureDb } }),
        );
        const stages = devices.map(({ id }) => matchedBlockStage(`s-${id}`, id));
        const input = chainInput(stages, devices, { load: { resistanceOhm: 50 }, gainBasis: 'transducer' });
        const chain = analyzeChain(input).cases.typical;
        let factor = 1;
        let gain = 1;
        for (const { gainDb, noiseFigureDb } of blocks) {
          factor += (10 ** (noiseFigureDb / 10) - 1) / gain;
          gain *= 10 ** (gainDb / 10);
        }
        expect(10 ** (known(chain.noiseFigureDb) / 10) / factor).toBeCloseTo(1, 9);
        expect(known(chain.gainOperatingDb)).toBeCloseTo(10 * Math.log10(gain), 9);
      }),
      RUNS,
    );
  });
});

describe('properties of the GBW figures', () => {
  it('more GBW gives more headroom and a higher first-order corner, in proportion', () => {
    const gain = fc.constantFrom(1, 2, 5, 20, 100, -1, -3, -10);
    fc.assert(
      fc.property(gain, logBetween(1e7, 1e9), logBetween(1.01, 10), (signalGain, gbw, factor) => {
        const figures = (hz: number) => analyzeChain(gainStage(signalGain, hz, 1e5)).cases.minimum.stages[0];
        const [low, high] = [figures(gbw), figures(gbw * factor)];
        expect(known(high.headroomTop) / known(low.headroomTop)).toBeCloseTo(factor, 9);
        expect(known(high.cornerFirstOrderHz) / known(low.cornerFirstOrderHz)).toBeCloseTo(factor, 9);
        expect(known(high.gainHighDb)).toBeGreaterThan(known(low.gainHighDb));
      }),
      RUNS,
    );
  });

  it('headroom: minimum hot ≤ minimum ≤ typical', () => {
    fc.assert(
      fc.property(seed, (drawn) => {
        const { typical, minimum, minimumHot } = analyzeChain(randomChain(drawn)).cases;
        minimum.stages.forEach((stage, k) => {
          if (stage.headroomTop.value === null) return;
          expect(known(minimumHot.stages[k].headroomTop)).toBeLessThanOrEqual(stage.headroomTop.value);
          expect(stage.headroomTop.value).toBeLessThanOrEqual(known(typical.stages[k].headroomTop));
          expect(known(minimumHot.stages[k].headroomOperating)).toBeLessThanOrEqual(known(stage.headroomOperating));
        });
      }),
      { ...RUNS, numRuns: 40 },
    );
  });
});

function passive(stages: readonly RcSectionStage[], sourceOhm: number, loadOhm: number): ChainInput {
  return chainInput(stages, [], {
    source: { kind: 'voltage', resistanceOhm: sourceOhm, levelKind: 'peak-emf' },
    load: { resistanceOhm: loadOhm },
  });
}

const currentGain = (input: ChainInput, loadOhm: number, hz: number): Complex =>
  divide(probeChain(input, 'minimum', hz).gain, complex(loadOhm));

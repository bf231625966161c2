import { analyzeChain } from '../chain/analyze-chain';
import type { ChainInput } from '../types';
import { chainCircuit, chainContext, wholeChain } from './chain-circuit.test-support';
import { GROUND, Injection, Solution } from './circuit.test-support';
import { magnitude } from './complex-matrix.test-support';
import { AmplifierNodes } from './device-models.test-support';
import { known } from './engine-figures.test-support';
import { withIdealAmplifiers } from './ideal-input.test-support';
import { randomChain } from './random-chains.test-support';

/** So low that every capacitor blocks to a part in 10⁸. */
const NEARLY_DC_HZ = 1e-10;
/** What the drawn devices have. */
const OFFSET_V = 1e-3;
const BIAS_A = 1e-6;
const SOURCE_A = 1e-9;

function offsetSources(amplifier: AmplifierNodes): { readonly injection: Injection; readonly size: number }[] {
  const { branch, factor } = amplifier.inputEmf;
  const sources: { injection: Injection; size: number }[] = [
    { injection: { kind: 'emf', branch, factor }, size: OFFSET_V },
    { injection: { kind: 'current', from: GROUND, to: amplifier.inverting }, size: BIAS_A },
  ];
  if (amplifier.plus !== GROUND) {
    sources.push({ injection: { kind: 'current', from: GROUND, to: amplifier.plus }, size: BIAS_A });
  }
  return sources;
}

/** Magnitudes of all contributions added, at every amplifier's output pin and at the load. */
function nodalOffsets(input: ChainInput): { readonly pins: ReadonlyMap<number, number>; readonly load: number } {
  const context = chainContext(withIdealAmplifiers(input), 'minimum', NEARLY_DC_HZ);
  const { circuit, nodes, amplifiers, sourceEmf } = chainCircuit(context, wholeChain(context));
  const solver = circuit.solver();
  const contributions: { solution: Solution; size: number }[] = [];
  const { source } = input.specification;
  if (source.kind === 'current') {
    contributions.push({ solution: solver.solve(sourceEmf!), size: SOURCE_A * source.resistanceOhm });
  }
  for (const amplifier of amplifiers.values()) {
    for (const { injection, size } of offsetSources(amplifier)) {
      contributions.push({ solution: solver.solve(injection), size });
    }
  }
  const at = (node: number): number =>
    contributions.reduce((sum, { solution, size }) => sum + magnitude(solution.voltage(node)) * size, 0);
  return {
    pins: new Map([...amplifiers].map(([k, { out }]) => [k, at(out)])),
    load: at(nodes[input.stages.length]),
  };
}

describe('DC offset of random chains against the nodal solution with every source injected', () => {
  it('at every output and at the load, 120 chains', () => {
    let compared = 0;
    for (let seed = 4001; seed <= 4120; seed++) {
      const chain = randomChain(seed);
      const input = { ...chain, specification: { ...chain.specification, load: { resistanceOhm: 2000 } } };
      const { stages, outputOffsetV } = analyzeChain(input, { cases: ['minimum'] }).cases.minimum;
      const nodal = nodalOffsets(input);
      for (const [k, offset] of nodal.pins) {
        expect({ seed, k, ratio: known(stages[k].outputOffsetV) / offset }).toEqual({
          seed,
          k,
          ratio: expect.closeTo(1, 5) as number,
        });
        compared++;
      }
      // Behind a series capacitor the nodal solution keeps a leak far below a nanovolt.
      expect(Math.abs(known(outputOffsetV) - nodal.load)).toBeLessThanOrEqual(1e-5 * nodal.load + 1e-9);
    }
    expect(compared).toBeGreaterThan(200);
  });
});

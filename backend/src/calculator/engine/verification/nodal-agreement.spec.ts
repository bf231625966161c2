import { ChainProbe, StageProbe, probeChain } from '../chain/probe';
import { GBW_CASES, type ChainInput } from '../types';
import { Complex, magnitude, relativeDifference } from './complex-matrix.test-support';
import { NodalChain } from './nodal-chain.test-support';
import { SeededRandom, randomChain } from './random-chains.test-support';

const CHAINS = 320;
const TOLERANCE = 1e-9;

interface Drawn {
  readonly seed: number;
  readonly input: ChainInput;
  readonly frequencyHz: number;
  readonly probe: ChainProbe;
  readonly nodal: NodalChain;
}

/** Every chain at a low, a middle and a high frequency, in a GBW case of its own. */
function drawings(): Drawn[] {
  const drawn: Drawn[] = [];
  for (let seed = 1; seed <= CHAINS; seed++) {
    const random = new SeededRandom(seed + 100000);
    const input = randomChain(seed);
    const gbwCase = random.pick(GBW_CASES);
    for (const [low, high] of [
      [10, 1e4],
      [1e4, 1e6],
      [1e6, 3e8],
    ]) {
      const frequencyHz = random.logBetween(low, high);
      const nodal = new NodalChain(input, gbwCase, frequencyHz);
      drawn.push({ seed, input, frequencyHz, nodal, probe: probeChain(input, gbwCase, frequencyHz) });
    }
  }
  return drawn;
}

type Difference = { readonly seed: number; readonly where: string; readonly difference: number };

/** Collects what differs by more than the tolerance, the worst first, so that one failure shows the whole picture. */
class Comparison {
  private readonly differences: Difference[] = [];
  compared = 0;

  constructor(private readonly seed: number) {}

  complex(where: string, engine: Complex | null, nodal: Complex | null): void {
    this.compared++;
    if (engine === null || nodal === null) {
      if (engine !== nodal) this.differences.push({ seed: this.seed, where, difference: Infinity });
      return;
    }
    if (!Number.isFinite(engine.re) && magnitude(nodal) > 1e14) return;
    const difference = relativeDifference(engine, nodal);
    if (!(difference <= TOLERANCE)) this.differences.push({ seed: this.seed, where, difference });
  }

  real(where: string, engine: number, nodal: number): void {
    this.complex(where, { re: engine, im: 0 }, { re: nodal, im: 0 });
  }

  get worst(): readonly Difference[] {
    return [...this.differences].sort((a, b) => b.difference - a.difference).slice(0, 8);
  }
}

let drawn: readonly Drawn[] = [];

function compare(figures: (comparison: Comparison, probe: ChainProbe, nodal: NodalChain) => void): void {
  const differences: Difference[] = [];
  let compared = 0;
  for (const { seed, frequencyHz, probe, nodal } of drawn) {
    const comparison = new Comparison(seed);
    figures(comparison, probe, nodal);
    differences.push(...comparison.worst.map((one) => ({ ...one, where: `${one.where} at ${frequencyHz} Hz` })));
    compared += comparison.compared;
  }
  expect(differences.sort((a, b) => b.difference - a.difference).slice(0, 8)).toEqual([]);
  expect(compared).toBeGreaterThanOrEqual(3 * CHAINS);
}

function compareStages(
  figures: (comparison: Comparison, stage: StageProbe, nodal: NodalChain, k: number, where: string) => void,
): void {
  compare((comparison, probe, nodal) =>
    probe.stages.forEach((stage, k) => {
      const { kind } = nodal.context.input.stages[k];
      figures(comparison, stage, nodal, k, `${k + 1} of ${probe.stages.length}, ${kind}`);
    }),
  );
}

/** The engine's folds of closed forms against a nodal solution of the whole circuit, 320 random chains of all kinds. */
describe('agreement with the nodal solution to 1e-9', () => {
  beforeAll(() => {
    drawn = drawings();
  });

  it('gain from EMF to load', () => {
    compare((comparison, probe, nodal) => comparison.complex('gain', probe.gain, nodal.gain()));
  });

  it('voltage of every node with everything connected', () => {
    compareStages((comparison, stage, nodal, k, where) =>
      comparison.complex(`node ${where}`, stage.node, nodal.node(k)),
    );
  });

  it('open-circuit voltage, output impedance and added noise behind every stage', () => {
    compareStages((comparison, stage, nodal, k, where) => {
      const port = nodal.port(k);
      comparison.complex(`open circuit ${where}`, stage.openCircuit, port.openCircuit);
      comparison.complex(`output impedance ${where}`, stage.outputImpedance, port.impedance);
      comparison.real(`added noise ${where}`, stage.addedNoiseV2PerHz, port.noiseV2PerHz);
    });
  });

  it('input impedance of every stage with everything behind it', () => {
    compareStages((comparison, stage, nodal, k, where) =>
      comparison.complex(`input impedance ${where}`, stage.inputImpedance, nodal.inputImpedance(k)),
    );
  });

  it('loop gain as return ratio of every amplifier in the complete chain', () => {
    compareStages((comparison, stage, nodal, k, where) =>
      comparison.complex(`loop gain ${where}`, stage.loopGain, nodal.loopGain(k)),
    );
  });

  it('noise gain of every amplifier', () => {
    compareStages((comparison, stage, nodal, k, where) =>
      comparison.complex(`noise gain ${where}`, stage.noiseGain, nodal.noiseGain(k)),
    );
  });

  it('every noise source of every stage', () => {
    const descending = (values: readonly number[]): number[] => [...values].sort((a, b) => b - a);
    compareStages((comparison, stage, nodal, k, where) => {
      const engine = descending(stage.noiseSources.map(({ v2PerHzAtOutput }) => v2PerHzAtOutput));
      const own = descending(nodal.port(k).ownNoiseV2PerHz);
      // A resistor across a node held by 0 Ω makes no noise: exactly none in closed form, rounding in the nodal one.
      const nothing = 1e-24 * own.reduce((sum, value) => sum + value, 0);
      for (let i = 0; i < Math.max(engine.length, own.length); i++) {
        const [there, here] = [engine[i] ?? 0, own[i] ?? 0];
        if (there > nothing || here > nothing) comparison.real(`noise source ${i + 1} ${where}`, there, here);
      }
    });
  });

  it('the draw covers every kind, every topology and 1 to 8 stages', () => {
    const seen = new Set<string>();
    for (const { input } of drawn) {
      seen.add(String(input.stages.length));
      seen.add(input.specification.source.kind);
      for (const stage of input.stages) seen.add('topology' in stage ? `${stage.kind} ${stage.topology}` : stage.kind);
    }
    const stages = ['1', '2', '3', '4', '5', '6', '7', '8'];
    const vfa = ['non-inverting', 'follower', 'inverting', 'transimpedance'].map((name) => `voltage-feedback ${name}`);
    const cfa = ['current-feedback non-inverting', 'current-feedback inverting'];
    const expected = [...stages, ...vfa, ...cfa, 'rc-section', 'matched-block', 'voltage', 'current'];
    expect([...seen].sort()).toEqual(expected.sort());
  });
});

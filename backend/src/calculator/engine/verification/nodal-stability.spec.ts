import { analyzeChain } from '../chain/analyze-chain';
import type { ChainInput, Stage } from '../types';
import { argument, divide, magnitude } from './complex-matrix.test-support';
import { deviceModel } from './device-models.test-support';
import { NodalChain } from './nodal-chain.test-support';
import { randomChain } from './random-chains.test-support';

const POINTS_PER_DECADE = 16;

/** Where a loop's walk ends: a hundred times its GBW or second pole. */
function limitHz(input: ChainInput, stage: Stage): number {
  const device = input.devices.find((candidate) => 'deviceId' in stage && candidate.id === stage.deviceId)!;
  const model = deviceModel(device, 'minimum', input.policy);
  if (model.kind === 'matched-block') return 0;
  const second = Number.isFinite(model.secondPoleHz) ? model.secondPoleHz : 0;
  return 100 * Math.max(model.kind === 'voltage-feedback' ? model.gbwHz : 0, second);
}

/** Smallest unwrapped margin over the crossings of the nodal return ratio, and where. */
function walk(input: ChainInput, k: number): { readonly marginDeg: number; readonly crossingHz: number } | null {
  const at = (hz: number) => new NodalChain(input, 'minimum', hz).loopGain(k)!;
  const end = limitHz(input, input.stages[k]);
  let worst: { marginDeg: number; crossingHz: number } | null = null;
  let fromHz = 1;
  let from = at(fromHz);
  let phase = argument(from);
  while (fromHz < end) {
    const toHz = Math.min(end, fromHz * 10 ** (1 / POINTS_PER_DECADE));
    const to = at(toHz);
    if (magnitude(from) >= 1 !== magnitude(to) >= 1) {
      const above = magnitude(from) >= 1;
      let [low, high] = [fromHz, toHz];
      for (let i = 0; i < 40; i++) {
        const middle = Math.sqrt(low * high);
        if (magnitude(at(middle)) >= 1 === above) low = middle;
        else high = middle;
      }
      const marginDeg = 180 + ((phase + argument(divide(at(low), from))) * 180) / Math.PI;
      if (!worst || marginDeg < worst.marginDeg) worst = { marginDeg, crossingHz: low };
    }
    phase += argument(divide(to, from));
    from = to;
    fromHz = toHz;
  }
  return worst;
}

/** Phase margins that are reported, against a walk along the nodal return ratio of the complete chain. */
describe('phase margin of every loop of random chains against the nodal return ratio', () => {
  // Chain 175 has a pair of crossings within a fifth of a decade.
  const seeds = [175, ...Array.from({ length: 12 }, (_, i) => 3001 + i)];

  it.each(seeds)('chain %i', (seed) => {
    const input = randomChain(seed);
    const { stability } = analyzeChain(input, { cases: ['minimum'] });
    input.stages.forEach((stage, k) => {
      if (stage.kind !== 'voltage-feedback') return;
      const { noCrossing, phaseMarginDeg, crossingHz } = stability.get(stage.id)!.atMinimum;
      const nodal = walk(input, k);
      expect(noCrossing).toBe(nodal === null);
      if (!nodal) return;
      expect(phaseMarginDeg).toBeCloseTo(nodal.marginDeg, 4);
      expect(crossingHz! / nodal.crossingHz).toBeCloseTo(1, 6);
    });
  });
});

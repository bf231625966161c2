import type { ChainCaseAnalysis } from '../analysis';
import { analyzeChain } from '../chain/analyze-chain';
import type { ChainInput } from '../types';
import { sourceImpedance } from './chain-circuit.test-support';
import { Complex, add, complex, magnitude, magnitudeSquared, multiply } from './complex-matrix.test-support';
import { known } from './engine-figures.test-support';
import { idealInput } from './ideal-input.test-support';
import { NodalChain } from './nodal-chain.test-support';
import { SeededRandom, randomChain } from './random-chains.test-support';

const CHAINS = 60;
const FOUR_K_T0 = 4 * 1.380649e-23 * 290;
const decibel = (ratio: number): number => 20 * Math.log10(ratio);

interface Drawn {
  readonly input: ChainInput;
  readonly figures: ChainCaseAnalysis;
  readonly at: (frequencyHz: number) => NodalChain;
}

const drawn: readonly Drawn[] = Array.from({ length: CHAINS }, (_, k) => {
  const chain = randomChain(k + 2000);
  const random = new SeededRandom(k + 9000);
  const operatingHz = random.logBetween(1e4, 1e7);
  const band = { lowHz: operatingHz / 2, operatingHz, highHz: operatingHz * 1.5 };
  const input = { ...chain, specification: { ...chain.specification, band } };
  const figures = analyzeChain(input, { cases: ['minimum'] }).cases.minimum;
  return { input, figures, at: (hz) => new NodalChain(input, 'minimum', hz) };
});

/** V_load/E, with a current source V_load/I. */
function transfer({ input, at }: Drawn, frequencyHz: number): Complex {
  const gain = at(frequencyHz).gain();
  const { source } = input.specification;
  if (source.kind === 'voltage') return gain;
  return multiply(gain, sourceImpedance(source, 2 * Math.PI * frequencyHz));
}

const bandOf = ({ input }: Drawn) => input.specification.band;

/** The figures that are reported, not the probe, against the nodal solution of the same chains. */
describe('figures of 60 random chains against the nodal solution', () => {
  it('gain at the operating frequency and both band edges', () => {
    for (const one of drawn) {
      const { lowHz, operatingHz, highHz } = bandOf(one);
      expect(known(one.figures.gainLowDb)).toBeCloseTo(decibel(magnitude(transfer(one, lowHz))), 7);
      expect(known(one.figures.gainOperatingDb)).toBeCloseTo(decibel(magnitude(transfer(one, operatingHz))), 7);
      expect(known(one.figures.gainHighDb)).toBeCloseTo(decibel(magnitude(transfer(one, highHz))), 7);
    }
  });

  it('ideal gain: ideal amplifiers, coupling shorted, shunt capacitances removed', () => {
    for (const one of drawn) {
      const ideal = { ...one, at: (hz: number) => new NodalChain(idealInput(one.input), 'minimum', hz) };
      const { source } = one.input.specification;
      const perCurrent = source.kind === 'current' ? source.resistanceOhm : 1;
      const expected = ideal.at(1).gain().re * perCurrent;
      expect(known(one.figures.idealGainDb)).toBeCloseTo(decibel(Math.abs(expected)), 6);
      expect(one.figures.inverted).toBe(expected < 0);
    }
  });

  it('upper corner: the first frequency above with half the power of the ideal gain', () => {
    let checked = 0;
    for (const one of drawn) {
      const { cornerUpperHz, operatingBeyondCorner, idealGainDb } = one.figures;
      if (cornerUpperHz.value === null || operatingBeyondCorner || cornerUpperHz.value > 1e11) continue;
      const ideal = 10 ** (known(idealGainDb) / 20);
      const relative = (hz: number): number => magnitudeSquared(transfer(one, hz)) / ideal ** 2;
      expect(relative(cornerUpperHz.value)).toBeCloseTo(0.5, 6);
      const { operatingHz } = bandOf(one);
      for (let i = 0; i < 40; i++) {
        expect(relative(operatingHz * (cornerUpperHz.value / operatingHz) ** (i / 40))).toBeGreaterThan(0.5);
      }
      checked++;
    }
    expect(checked).toBeGreaterThan(15);
  });

  it('flatness and worst droop on a walk through the band', () => {
    for (const one of drawn.slice(0, 30)) {
      const { lowHz, highHz } = bandOf(one);
      const gains = Array.from({ length: 121 }, (_, i) =>
        decibel(magnitude(transfer(one, lowHz * (highHz / lowHz) ** (i / 120)))),
      );
      const [highest, lowest] = [Math.max(...gains), Math.min(...gains)];
      const flatness = known(one.figures.flatnessDb);
      expect(flatness).toBeGreaterThanOrEqual(highest - lowest - 1e-7);
      expect(flatness).toBeLessThanOrEqual(highest - lowest + 0.02);
      expect(known(one.figures.worstDroopDb)).toBeLessThanOrEqual(lowest - known(one.figures.idealGainDb) + 1e-7);
    }
  });

  it('added noise referred to the source, and noise figure', () => {
    for (const one of drawn) {
      const { operatingHz } = bandOf(one);
      const nodal = one.at(operatingHz);
      const noise = nodal.noiseAtLoad();
      expect(known(one.figures.inputNoise) ** 2 / (noise / magnitudeSquared(transfer(one, operatingHz)))).toBeCloseTo(
        1,
        8,
      );
      const source = sourceImpedance(one.input.specification.source, 2 * Math.PI * operatingHz);
      const factor = 1 + noise / (magnitudeSquared(nodal.gain()) * FOUR_K_T0 * source.re);
      expect(known(one.figures.noiseFigureDb)).toBeCloseTo(10 * Math.log10(factor), 7);
    }
  });

  it('loop gain and vector error of every stage at the operating frequency', () => {
    for (const one of drawn) {
      const nodal = one.at(bandOf(one).operatingHz);
      one.figures.stages.forEach((stage, k) => {
        const loopGain = nodal.loopGain(k);
        if (!loopGain) {
          expect(stage.loopGain.value).toBeNull();
          return;
        }
        expect(known(stage.loopGain) / magnitude(loopGain)).toBeCloseTo(1, 8);
        expect(known(stage.vectorError) * magnitude(add(complex(1), loopGain))).toBeCloseTo(1, 8);
      });
    }
  });

  it('noise gain and headroom of every voltage-feedback stage at the top edge', () => {
    for (const one of drawn) {
      const { highHz } = bandOf(one);
      const nodal = one.at(highHz);
      one.figures.stages.forEach((stage, k) => {
        if (stage.headroomTop.value === null) return;
        const noiseGain = magnitude(nodal.noiseGain(k)!);
        expect(stage.noiseGainTop! / noiseGain).toBeCloseTo(1, 8);
        expect((stage.headroomTop.value * noiseGain * highHz) / stage.gbw!.value).toBeCloseTo(1, 8);
      });
    }
  });
});

import { calculate, curves, summarize, tryDevices, validateChain, working } from '../index';
import { analyzeChain } from '../chain/analyze-chain';
import { CHAIN_FIGURES, STAGE_FIGURES } from '../report';
import type { ChainInput, Requirements } from '../types';
import { extremeChain } from './extreme-chains.test-support';
import { SeededRandom, randomChain } from './random-chains.test-support';
import { faultsOf } from './result-walk.test-support';

const CHAINS = 300;

const REQUIREMENTS: Requirements = {
  gainDb: { target: 40, tolerance: 1 },
  minimumGainDb: 20,
  maximumGainDb: 80,
  flatnessDb: 1,
  upperCornerHz: 1e7,
  lowerCornerHz: 1e4,
  loopGainDb: 20,
  inputNoise: 1e-9,
  noiseFigureDb: 6,
  outputOffsetV: 0.1,
  supplyCurrentA: 0.05,
  supplyPowerW: 0.5,
  costMicros: 9_000_000,
  polarity: 'in-phase',
};

/** Every second chain with all requirements, in bands from 1 kHz to 300 MHz. */
function drawn(seed: number): ChainInput {
  const input = randomChain(seed);
  const random = new SeededRandom(seed + 5000);
  const operatingHz = random.logBetween(1e3, 3e8);
  const band = {
    lowHz: operatingHz / random.between(1, 3),
    operatingHz,
    highHz: operatingHz * random.between(1, 3),
  };
  const requirements = seed % 2 === 0 ? REQUIREMENTS : {};
  return { ...input, specification: { ...input.specification, band, requirements } };
}

describe('no answer carries NaN, Infinity or a missing value without a reason', () => {
  it(`calculate ${CHAINS} random chains, summarize every fifth`, () => {
    const faults: string[] = [];
    for (let seed = 1; seed <= CHAINS; seed++) {
      const input = drawn(seed);
      faults.push(...faultsOf(calculate(input)).map((fault) => `${seed}: ${fault}`));
      if (seed % 5 === 0) faults.push(...faultsOf(summarize(input)).map((fault) => `${seed} summary: ${fault}`));
    }
    expect(faults.slice(0, 10)).toEqual([]);
  });

  it('the analysis below the report', () => {
    const faults: string[] = [];
    for (let seed = 1; seed <= CHAINS; seed += 10) {
      const { cases } = analyzeChain(drawn(seed));
      faults.push(...faultsOf(cases).map((fault) => `${seed}: ${fault}`));
    }
    expect(faults.slice(0, 10)).toEqual([]);
  });

  it('extreme but accepted values', () => {
    const faults: string[] = [];
    for (let seed = 1; seed <= 150; seed++) {
      const input = extremeChain(seed);
      expect(validateChain(input)).toEqual([]);
      const { cases, stability } = analyzeChain(input);
      faults.push(...faultsOf([cases, stability]).map((fault) => `${seed}: ${fault}`));
    }
    expect(faults.slice(0, 10)).toEqual([]);
  });

  it('curves', () => {
    const faults: string[] = [];
    for (let seed = 1; seed <= CHAINS; seed += 10) {
      const answer = curves(drawn(seed), { fromHz: 1, toHz: 1e10, points: 41 });
      expect(answer.frequenciesHz).toHaveLength(41);
      faults.push(...faultsOf(answer).map((fault) => `${seed}: ${fault}`));
    }
    expect(faults.slice(0, 10)).toEqual([]);
  });

  it('working of every figure of stages and chain', () => {
    const faults: string[] = [];
    for (const seed of [9, 24]) {
      const input = drawn(seed);
      for (const figure of CHAIN_FIGURES) {
        faults.push(...faultsOf(working(input, { stageId: null, figure, gbwCase: 'minimum' })));
      }
      for (const { id } of input.stages) {
        for (const figure of STAGE_FIGURES) {
          faults.push(...faultsOf(working(input, { stageId: id, figure, gbwCase: 'minimumHot' })));
        }
      }
    }
    expect(faults.slice(0, 10)).toEqual([]);
  });

  it('devices tried in a stage', () => {
    const faults: string[] = [];
    for (let seed = 1; seed <= CHAINS; seed += 30) {
      const input = drawn(seed);
      const stage = input.stages.find((candidate) => 'deviceId' in candidate);
      if (stage)
        faults.push(...faultsOf(tryDevices(input, stage.id, input.devices)).map((fault) => `${seed}: ${fault}`));
    }
    expect(faults.slice(0, 10)).toEqual([]);
  });

  it('the walk finds what it looks for', () => {
    const bad = { a: NaN, b: [1, Infinity], figure: { value: null, unit: 'Hz' }, text: 'up to NaN MHz' };
    expect(faultsOf(bad)).toEqual([
      'answer.a is NaN',
      'answer.b.1 is Infinity',
      'answer.figure.value is null without a reason',
      'answer.text says "up to NaN MHz"',
    ]);
    expect(faultsOf({ value: null, reason: 'Ro is missing' })).toEqual([]);
  });
});

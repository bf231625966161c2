import { probeChain } from '../chain/probe';
import { magnitude } from './complex-matrix.test-support';
import { rcSection } from './chain-builder.test-support';
import { analysed, known } from './engine-figures.test-support';
import { NodalChain } from './nodal-chain.test-support';
import { ALTERNATE, Departure, ReceiverOption, receiver } from './ultrasonic-receiver.test-support';
import type { ChainInput } from '../types';

/** Half of the last printed digit. */
function expectPrinted(actual: number, printed: string): void {
  const decimals = printed.split('.')[1]?.length ?? 0;
  expect(actual.toFixed(decimals)).toBe(printed);
}

const OPTIONS: readonly ReceiverOption[] = ['Baseline', 'A', 'B', 'C'];
const baseline = receiver('Baseline');

/** An invented receiver worked out by hand with one-pole formulas; the assumptions are in its support file. */
describe('ultrasonic receiver, hand assumptions: Baseline at minimum GBW', () => {
  const { stages, ...chain } = analysed(baseline);

  it.each([
    ['S1', '120.0', '-0.003', '-0.008', '-0.015'],
    ['S2', '6.8', '-0.769', '-1.869', '-3.126'],
    ['S3', '52.0', '-0.014', '-0.040', '-0.078'],
    ['S4', '150.0', '-0.002', '-0.005', '-0.009'],
  ])('%s: corner %s MHz, droop at 3 / 5 / 7 MHz %s / %s / %s dB', (id, corner, low, operating, high) => {
    const stage = stages.find(({ stageId }) => stageId === id)!;
    const ideal = known(stage.idealGainDb);
    expectPrinted(known(stage.cornerFirstOrderHz) / 1e6, corner);
    expectPrinted(known(stage.cornerUpperHz) / 1e6, corner);
    expectPrinted(known(stage.gainLowDb) - ideal, low);
    expectPrinted(known(stage.gainOperatingDb) - ideal, operating);
    expectPrinted(known(stage.gainHighDb) - ideal, high);
  });

  it('S2: corner 6.818 MHz from 75 MHz over a noise gain of 11', () => {
    expectPrinted(known(stages[1].cornerFirstOrderHz) / 1e6, '6.818');
    expectPrinted(known(stages[1].cornerUpperHz) / 1e6, '6.818');
    expect(stages[1].noiseGain).toBeCloseTo(11, 9);
    expect(stages[1].gbw).toMatchObject({ value: 75e6, basis: 'min' });
  });

  it('S2: headroom 1.364 at 5 MHz and 0.974 at 7 MHz', () => {
    expectPrinted(known(stages[1].headroomOperating), '1.364');
    expectPrinted(known(stages[1].headroomTop), '0.974');
  });

  it('S4 has no GBW and no headroom', () => {
    expect(stages[3].gbw).toBeNull();
    expect(stages[3].headroomOperating.value).toBeNull();
    expect(stages[3].headroomTop.value).toBeNull();
  });

  it('chain: droop −0.79 / −1.92 / −3.23 dB, −3 dB at 6.67 MHz', () => {
    const ideal = known(chain.idealGainDb);
    expectPrinted(ideal, '60.00');
    expectPrinted(known(chain.gainLowDb) - ideal, '-0.79');
    expectPrinted(known(chain.gainOperatingDb) - ideal, '-1.92');
    expectPrinted(known(chain.gainHighDb) - ideal, '-3.23');
    expectPrinted(known(chain.cornerUpperHz) / 1e6, '6.67');
    expect(chain.worstDroopHz / 7e6).toBeCloseTo(1, 9);
  });

  it('chain: gain 58.08 dB at 5 MHz, flatness 2.44 dB; 1.62 dB with typical values', () => {
    expectPrinted(known(chain.gainOperatingDb), '58.08');
    expectPrinted(known(chain.flatnessDb), '2.44');
    expectPrinted(known(analysed(baseline, 'typical').flatnessDb), '1.62');
  });

  it('slew needed 4.4 / 22 / 44 V/µs in S2 / S3 / S4', () => {
    expectPrinted(known(stages[1].slewNeededVPerS) / 1e6, '4.4');
    expectPrinted(known(stages[2].slewNeededVPerS) / 1e6, '22');
    expectPrinted(known(stages[3].slewNeededVPerS) / 1e6, '44');
    expectPrinted(known(chain.outputPeakV), '1.00');
  });
});

describe('ultrasonic receiver, hand assumptions: options at minimum GBW', () => {
  it.each([
    ['Baseline', '2.44', '58.08', '38'],
    ['A', '0.21', '59.87', '41'],
    ['B', '1.07', '59.30', '42'],
    ['C', '0.80', '59.47', '38'],
  ] as const)('%s: flatness %s dB, gain %s dB, supply %s mA', (option, flatness, gain, supply) => {
    const chain = analysed(receiver(option));
    expectPrinted(known(chain.flatnessDb), flatness);
    expectPrinted(known(chain.gainOperatingDb), gain);
    expectPrinted(known(chain.supplyCurrentA) * 1e3, supply);
  });

  it('B and C turn the polarity over against Baseline and A', () => {
    expect(OPTIONS.map((option) => analysed(receiver(option)).inverted)).toEqual([false, false, true, true]);
  });
});

/** Flatness by the engine, and by the nodal solver on a walk through the band. */
function flatness(input: ChainInput): { readonly engine: number; readonly nodal: number } {
  const gains: number[] = [];
  for (let hz = 3e6; hz <= 7.0001e6; hz += 0.05e6) {
    gains.push(20 * Math.log10(magnitude(new NodalChain(input, 'minimum', hz).gain())));
  }
  return { engine: known(analysed(input).flatnessDb), nodal: Math.max(...gains) - Math.min(...gains) };
}

function expectFlatness(input: ChainInput, printed: string): void {
  const { engine, nodal } = flatness(input);
  expect(engine).toBeCloseTo(nodal, 3);
  expectPrinted(engine, printed);
}

/** Couplings at the + inputs, at the driver and at the load; none in series with the Rg of a general stage. */
function coupledOutsideLoops(option: ReceiverOption): ChainInput {
  const coupled = receiver(option, { couplingHz: 159e3 });
  const plain = receiver(option).stages;
  const last = coupled.stages.length - 1;
  const stages = coupled.stages.map((stage, k) => (k === 0 || k >= last - 1 ? stage : plain[k]));
  const seriesF = 1 / (2 * Math.PI * 159e3 * 1000);
  return { ...coupled, stages: [...stages, rcSection('out', { seriesF })] };
}

/** 30 Ω in every amplifier, 100 Ω as every Rg, 1 kΩ at the end. */
function withOutputResistance(option: ReceiverOption): ChainInput {
  const departure: Departure = { outputOhm: 30, gainOhm: 100 };
  const input = receiver(option, departure);
  return {
    ...input,
    stages: input.stages.map((stage) =>
      stage.kind === 'current-feedback' ? { ...stage, feedbackOhm: 200, gainOhm: 100 } : stage,
    ),
    devices: input.devices.map((device) =>
      device.kind === 'current-feedback' ? { ...device, referenceFeedbackOhm: 200 } : device,
    ),
  };
}

describe('ultrasonic receiver: departures from the hand assumptions', () => {
  it.each([
    ['Baseline', '2.28'],
    ['A', '0.17'],
    ['B', '0.83'],
    ['C', '0.65'],
  ] as const)('second pole from 60° of phase margin, %s: flatness %s dB', (option, printed) => {
    expectFlatness(receiver(option, { phaseMarginDeg: 60 }), printed);
  });

  it.each([
    ['Baseline', '2.40'],
    ['A', '0.17'],
    ['B', '1.03'],
    ['C', '0.77'],
  ] as const)('four couplings at 159 kHz outside the loops, %s: flatness %s dB', (option, printed) => {
    expectFlatness(coupledOutsideLoops(option), printed);
  });

  it('a coupling in series with the Rg of S2 belongs to its loop and gives 2.47 dB', () => {
    expectFlatness(receiver('Baseline', { couplingHz: 159e3 }), '2.47');
  });

  it.each([
    ['Baseline', '2.63'],
    ['C', '0.93'],
  ] as const)('30 Ω of output resistance with Rg 100 Ω, %s: flatness %s dB', (option, printed) => {
    expectFlatness(withOutputResistance(option), printed);
  });

  it('30 Ω of output resistance with Rg 100 Ω, A and B: as the nodal solver says, B far over 1 dB', () => {
    expectFlatness(withOutputResistance('A'), '0.34');
    expectFlatness(withOutputResistance('B'), '1.72');
  });

  it('the alternate preamplifier at 2900 MHz gains bandwidth in every option', () => {
    for (const option of OPTIONS) {
      const alternate = analysed(receiver(option, {}, ALTERNATE)).stages[0];
      const noiseGain = option === 'Baseline' || option === 'B' ? 10 : 20;
      expect(known(alternate.cornerFirstOrderHz) / (2900e6 / noiseGain)).toBeCloseTo(1, 9);
    }
  });

  it('the probe and the nodal solver agree on the receiver with every departure at once', () => {
    const departure: Departure = { phaseMarginDeg: 60, outputOhm: 30, gainOhm: 100, couplingHz: 159e3 };
    for (const option of OPTIONS) {
      const input = receiver(option, departure);
      const engine = probeChain(input, 'minimum', 6e6).gain;
      const nodal = new NodalChain(input, 'minimum', 6e6).gain();
      expect(engine.re / nodal.re).toBeCloseTo(1, 9);
      expect(engine.im / nodal.im).toBeCloseTo(1, 9);
    }
  });
});

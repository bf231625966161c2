import { analyzeChain } from '../chain/analyze-chain';
import { validateChain } from '../chain/validate';
import { EngineInputError, type EngineIssueCode } from '../errors';
import type { ChainInput, Device, Specification, Stage } from '../types';
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
import { randomChain } from './random-chains.test-support';

const DEVICES: readonly Device[] = [
  voltageFeedbackDevice('v', 100e6),
  currentFeedbackDevice('c', 100e6, 2, 500, { invertingInputResistanceOhm: { typ: 30 } }),
  matchedBlockDevice('b', 50, 10, { noiseFigureDb: { typ: 3 } }),
];
const nonInverting = voltageFeedbackStage('s', 'v', 'non-inverting', 900, 100);
const inverting = voltageFeedbackStage('s', 'v', 'inverting', 1000, 100);

const withStages = (...stages: readonly Stage[]): ChainInput => chainInput(stages, DEVICES);
const withDevice = (device: Device): ChainInput => chainInput([nonInverting], [device]);
const withSpecification = (part: Partial<Specification>): ChainInput => chainInput([nonInverting], DEVICES, part);
const followers = (count: number): Stage[] =>
  Array.from({ length: count }, (_, k) => voltageFeedbackStage(`s${k}`, 'v', 'follower', 0, null));

/** Refused with this code at this path, and thrown by the analysis with the same issues. */
function expectRefused(input: ChainInput, code: EngineIssueCode, path: string): void {
  const issues = validateChain(input);
  expect(issues.map((issue) => `${issue.code} ${issue.path}`)).toContain(`${code} ${path}`);
  expect(issues.every(({ message }) => message.length > 10)).toBe(true);
  try {
    analyzeChain(input);
  } catch (error) {
    expect(error).toBeInstanceOf(EngineInputError);
    expect((error as EngineInputError).issues).toEqual(issues);
    return;
  }
  throw new Error('the analysis did not refuse the input');
}

describe('edges: what is accepted', () => {
  it('300 random chains, and no stages at all', () => {
    for (let seed = 1; seed <= 300; seed++) expect(validateChain(randomChain(seed))).toEqual([]);
    expect(validateChain(withStages())).toEqual([]);
    expect(analyzeChain(withStages()).cases.minimum.gainOperatingDb.value).toBeCloseTo(20 * Math.log10(1000 / 1050), 9);
  });

  it('24 stages', () => {
    expect(validateChain(withStages(...followers(24)))).toEqual([]);
    expect(analyzeChain(withStages(...followers(24))).cases.minimum.stages).toHaveLength(24);
  });

  it('a band of no width, an open load, Rf of 0 Ω in a follower', () => {
    expect(validateChain(withSpecification({ band: { lowHz: 1e6, operatingHz: 1e6, highHz: 1e6 } }))).toEqual([]);
    expect(validateChain(withSpecification({ load: { resistanceOhm: null } }))).toEqual([]);
    expect(validateChain(withStages(...followers(1)))).toEqual([]);
  });
});

describe('edges: chains that are refused', () => {
  it('25 stages', () => expectRefused(withStages(...followers(25)), 'too_many_stages', 'stages'));

  it.each<[string, Stage, EngineIssueCode, string]>([
    ['Rf missing', { ...inverting, feedbackOhm: undefined as never }, 'feedback_resistor_missing', 'feedbackOhm'],
    ['Rf of 0 Ω in an inverting stage', { ...inverting, feedbackOhm: 0 }, 'feedback_resistor_missing', 'feedbackOhm'],
    ['Rg of 0 Ω in an inverting stage', { ...inverting, gainOhm: 0 }, 'inverting_fed_from_zero_ohm', 'gainOhm'],
    ['Rg missing in an inverting stage', { ...inverting, gainOhm: null }, 'required', 'gainOhm'],
    ['a coupled + input without bias', { ...nonInverting, couplingF: 1e-9 }, 'input_without_dc_return', 'biasOhm'],
    ['negative Rf', { ...inverting, feedbackOhm: -1000 }, 'out_of_range', 'feedbackOhm'],
    ['negative zero', { ...inverting, isolationOhm: -0 }, 'out_of_range', 'isolationOhm'],
    ['NaN', { ...inverting, gainOhm: NaN }, 'not_finite', 'gainOhm'],
    ['infinite', { ...inverting, feedbackOhm: Infinity }, 'not_finite', 'feedbackOhm'],
    ['a resistance below any wire', { ...inverting, gainOhm: 1e-190 }, 'out_of_range', 'gainOhm'],
    ['a coupling below any gap', { ...inverting, couplingF: 1e-190 }, 'out_of_range', 'couplingF'],
    ['text for a number', { ...inverting, strayF: '1p' as never }, 'not_finite', 'strayF'],
    ['a coupling of 0 F', { ...inverting, couplingF: 0 }, 'out_of_range', 'couplingF'],
    ['unknown device', { ...inverting, deviceId: 'nothing' }, 'device_unknown', 'deviceId'],
    ['device of the wrong kind', { ...inverting, deviceId: 'c' }, 'device_kind_mismatch', 'deviceId'],
    ['a block device in a feedback stage', { ...inverting, deviceId: 'b' }, 'device_kind_mismatch', 'deviceId'],
  ])('%s', (_, stage, code, name) => expectRefused(withStages(stage), code, `stages.0.${name}`));

  it('a transimpedance stage behind 0 Ω', () => {
    const transimpedance = voltageFeedbackStage('t', 'v', 'transimpedance', 1000, null);
    expectRefused(withStages(nonInverting, transimpedance), 'inverting_fed_from_zero_ohm', 'stages.1.gainOhm');
    expect(validateChain(withStages({ ...nonInverting, isolationOhm: 50 }, transimpedance))).toEqual([]);
  });

  it('a + input behind a series capacitor without a shunt resistor', () => {
    const series = rcSection('r', { seriesF: 1e-9 });
    expectRefused(withStages(series, nonInverting), 'input_without_dc_return', 'stages.1.biasOhm');
    expect(validateChain(withStages({ ...series, shuntOhm: 1e4 }, nonInverting))).toEqual([]);
  });

  it('the third of several stages is named by its index', () => {
    const bad = currentFeedbackStage('x', 'v', 'inverting', 500, 250);
    expectRefused(
      withStages(nonInverting, matchedBlockStage('m', 'b'), bad),
      'device_kind_mismatch',
      'stages.2.deviceId',
    );
  });

  it('collects everything that is wrong', () => {
    const input = withStages({ ...inverting, feedbackOhm: -1, gainOhm: NaN, deviceId: 'nothing' });
    expect(validateChain(input).length).toBeGreaterThanOrEqual(3);
  });
});

describe('edges: devices that are refused', () => {
  it.each<[string, Partial<Device>, EngineIssueCode, string]>([
    [
      'minimum above typical',
      { gainBandwidthHz: { min: 2e8, typ: 1e8 } } as never,
      'min_above_typ',
      'gainBandwidthHz.min',
    ],
    [
      'typical above maximum',
      { outputResistanceOhm: { typ: 50, max: 20 } },
      'typ_above_max',
      'outputResistanceOhm.typ',
    ],
    ['no GBW', { gainBandwidthHz: undefined } as never, 'required', 'gainBandwidthHz.typ'],
    ['GBW with a maximum only', { gainBandwidthHz: { max: 1e8 } } as never, 'required', 'gainBandwidthHz.typ'],
    ['GBW of zero', { gainBandwidthHz: { typ: 0 } } as never, 'out_of_range', 'gainBandwidthHz.typ'],
    ['phase margin 0°', { phaseMarginDeg: 0 } as never, 'phase_margin_out_of_range', 'phaseMarginDeg'],
    ['phase margin 120°', { phaseMarginDeg: 120 } as never, 'phase_margin_out_of_range', 'phaseMarginDeg'],
    ['phase margin below 0°', { phaseMarginDeg: -10 } as never, 'phase_margin_out_of_range', 'phaseMarginDeg'],
    ['minimum stable gain below 1', { minimumStableGain: 0.5 } as never, 'out_of_range', 'minimumStableGain'],
    ['negative noise', { voltageNoiseVPerRtHz: { typ: -1e-9 } }, 'out_of_range', 'voltageNoiseVPerRtHz.typ'],
    ['infinite capacitance', { commonModeCapacitanceF: { typ: Infinity } }, 'not_finite', 'commonModeCapacitanceF.typ'],
  ] as [string, Partial<Device>, EngineIssueCode, string][])('%s', (_, part, code, name) =>
    expectRefused(withDevice({ ...DEVICES[0], ...part } as Device), code, `devices.0.${name}`),
  );
});

describe('edges: specifications that are refused', () => {
  it.each<[string, Partial<Specification>, EngineIssueCode, string]>([
    ['band reversed', { band: { lowHz: 7e6, operatingHz: 5e6, highHz: 3e6 } }, 'band_reversed', 'band.highHz'],
    [
      'operating frequency outside',
      { band: { lowHz: 1e6, operatingHz: 9e6, highHz: 3e6 } },
      'band_reversed',
      'band.operatingHz',
    ],
    ['a frequency of 0 Hz', { band: { lowHz: 0, operatingHz: 1e6, highHz: 3e6 } }, 'out_of_range', 'band.lowHz'],
    ['an infinite frequency', { band: { lowHz: 1, operatingHz: 1e6, highHz: Infinity } }, 'not_finite', 'band.highHz'],
    [
      'a source of 0 Ω',
      { source: { kind: 'voltage', resistanceOhm: 0, levelKind: 'peak-emf' } },
      'out_of_range',
      'source.resistanceOhm',
    ],
    ['a load of 0 Ω', { load: { resistanceOhm: 0 } }, 'out_of_range', 'load.resistanceOhm'],
    ['a negative rail above 0 V', { supply: { positiveV: 5, negativeV: 1 } }, 'out_of_range', 'supply.negativeV'],
    ['a temperature of 0 K', { ambientK: 0 }, 'out_of_range', 'ambientK'],
  ])('%s', (_, part, code, name) => expectRefused(withSpecification(part), code, `specification.${name}`));

  it('a missing part of the input is said, not thrown', () => {
    const input = { ...withStages(inverting), specification: undefined as never };
    expect(validateChain(input).map(({ code }) => code)).toContain('required');
    expect(validateChain({ ...withStages(inverting), stages: null as never })[0].path).toBe('stages');
  });

  it('null as a stage or a device is said, not thrown', () => {
    expect(validateChain(withStages(null as never)).length).toBeGreaterThan(0);
    expect(validateChain(chainInput([inverting], [null as never])).length).toBeGreaterThan(0);
  });
});

import type { ChainInput, Device, Stage } from '../types';
import { handReceiver, HAND_BASELINE, HAND_DEVICES, inverting, nonInverting } from './hand-receiver.test-support';
import { validateChain } from './validate';

const codes = (input: ChainInput): string[] => validateChain(input).map(({ code, path }) => `${code} ${path}`);
const withStage = (stage: object): ChainInput => handReceiver([stage as Stage]);
const withDevice = (fields: object): ChainInput => ({
  ...handReceiver([]),
  devices: [{ ...HAND_DEVICES[0], ...fields } as Device],
});
const withSpecification = (fields: object): ChainInput => {
  const input = handReceiver([]);
  return { ...input, specification: { ...input.specification, ...fields } };
};
const amplifier = nonInverting('s1', 'MRWG-G072', 10);

describe('validateChain(input)', () => {
  it('accepts the receiver and a chain without stages', () => {
    expect(codes(handReceiver(HAND_BASELINE))).toEqual([]);
    expect(codes(handReceiver([]))).toEqual([]);
  });

  it('24 stages are accepted, 25 refused', () => {
    const stages = (count: number) => Array.from({ length: count }, (_, k) => nonInverting(`s${k}`, 'MRWG-G072', 2));
    expect(codes(handReceiver(stages(24)))).toEqual([]);
    expect(codes(handReceiver(stages(25)))).toEqual(['too_many_stages stages']);
  });

  it.each([
    ['reversed', { lowHz: 7e6, operatingHz: 5e6, highHz: 3e6 }, 'band_reversed specification.band.highHz'],
    ['operated outside', { lowHz: 3e6, operatingHz: 8e6, highHz: 7e6 }, 'band_reversed specification.band.operatingHz'],
    ['NaN', { lowHz: NaN, operatingHz: 5e6, highHz: 7e6 }, 'not_finite specification.band.lowHz'],
    ['infinite', { lowHz: 1, operatingHz: 5e6, highHz: Infinity }, 'not_finite specification.band.highHz'],
    ['zero', { lowHz: 0, operatingHz: 5e6, highHz: 7e6 }, 'out_of_range specification.band.lowHz'],
    ['text', { lowHz: 'NaN', operatingHz: 5e6, highHz: 7e6 }, 'not_finite specification.band.lowHz'],
    ['missing', { operatingHz: 5e6, highHz: 7e6 }, 'required specification.band.lowHz'],
  ])('band %s', (_, band, issue) => {
    expect(codes(withSpecification({ band }))).toEqual([issue]);
  });

  it('band edges are named with SI prefixes', () => {
    const band = { lowHz: 7e6, operatingHz: 5e6, highHz: 50e3 };
    const [issue] = validateChain(withSpecification({ band }));
    expect(issue.message).toBe('The upper band edge (50 kHz) is below the lower (7 MHz).');
  });

  it('a band of one frequency is a band', () => {
    expect(codes(withSpecification({ band: { lowHz: 5e6, operatingHz: 5e6, highHz: 5e6 } }))).toEqual([]);
  });

  it.each([
    ['gain', { minimumGainDb: 60, maximumGainDb: 20 }, ['out_of_range specification.requirements.maximumGainDb']],
    ['corners', { lowerCornerHz: 2e6, upperCornerHz: 1e6 }, ['out_of_range specification.requirements.upperCornerHz']],
    ['equal gains', { minimumGainDb: 20, maximumGainDb: 20 }, []],
    ['one of them', { minimumGainDb: 60, upperCornerHz: 1e6 }, []],
  ])('requirements that contradict each other: %s', (_, requirements, issues) => {
    expect(codes(withSpecification({ requirements }))).toEqual(issues);
  });

  it('a hot device is not better than a cold one', () => {
    const receiver = handReceiver([]);
    const hot = (temperatureFactor: number) =>
      codes({ ...receiver, policy: { ...receiver.policy, temperatureFactor } });
    expect(hot(1)).toEqual([]);
    expect(hot(1.01)).toEqual(['out_of_range policy.temperatureFactor']);
  });

  it.each([
    ['Rf missing', { ...amplifier, feedbackOhm: undefined }, 'feedback_resistor_missing stages.0.feedbackOhm'],
    ['Rf 0 inverting', { ...inverting('s', 'MRWG-G072', 0) }, 'feedback_resistor_missing stages.0.feedbackOhm'],
    ['Rf negative', { ...amplifier, feedbackOhm: -1 }, 'out_of_range stages.0.feedbackOhm'],
    ['Rf −0', { ...inverting('s', 'MRWG-G072', 1), feedbackOhm: -0 }, 'feedback_resistor_missing stages.0.feedbackOhm'],
    ['Riso −0', { ...amplifier, isolationOhm: -0 }, 'out_of_range stages.0.isolationOhm'],
    ['Rg 0', { ...inverting('s', 'MRWG-G072', 1), gainOhm: 0 }, 'inverting_fed_from_zero_ohm stages.0.gainOhm'],
    ['Rg missing', { ...inverting('s', 'MRWG-G072', 1), gainOhm: null }, 'required stages.0.gainOhm'],
    ['coupled', { ...amplifier, couplingF: 1e-6 }, 'input_without_dc_return stages.0.biasOhm'],
    ['unknown device', { ...amplifier, deviceId: 'x' }, 'device_unknown stages.0.deviceId'],
    ['other kind', { ...amplifier, deviceId: 'TLYR-C220' }, 'device_kind_mismatch stages.0.deviceId'],
    ['other topology', { ...amplifier, topology: 'sideways' }, 'out_of_range stages.0.topology'],
    ['Cf NaN', { ...amplifier, feedbackF: NaN }, 'not_finite stages.0.feedbackF'],
  ])('stage: %s', (_, stage, issue) => {
    expect(codes(withStage(stage))).toEqual([issue]);
  });

  it('a transimpedance node behind an amplifier without a resistor is refused, behind one with it accepted', () => {
    const node = { ...amplifier, id: 't', topology: 'transimpedance' as const, gainOhm: null };
    expect(codes(handReceiver([amplifier, node]))).toEqual(['inverting_fed_from_zero_ohm stages.1.gainOhm']);
    expect(codes(handReceiver([{ ...amplifier, isolationOhm: 100 }, node]))).toEqual([]);
  });

  it('a series capacitor in a section takes the DC return of the + input behind it, a shunt resistor gives it', () => {
    const section = { kind: 'rc-section' as const, id: 'c', name: 'Coupling', seriesF: 1e-6 };
    expect(codes(handReceiver([section, amplifier]))).toEqual(['input_without_dc_return stages.1.biasOhm']);
    expect(codes(handReceiver([{ ...section, shuntOhm: 1000 }, amplifier]))).toEqual([]);
    expect(codes(handReceiver([section, { ...amplifier, terminationOhm: 50 }]))).toEqual([]);
  });

  it.each([0, -10, 120, 180])('phase margin %d° is refused', (phaseMarginDeg) => {
    expect(codes(withDevice({ phaseMarginDeg }))).toEqual(['phase_margin_out_of_range devices.0.phaseMarginDeg']);
  });

  it.each([1, 60, 90, 95])('phase margin %d° is accepted', (phaseMarginDeg) => {
    expect(codes(withDevice({ phaseMarginDeg }))).toEqual([]);
  });

  it.each([
    [{ min: 2e6, typ: 1e6 }, ['min_above_typ devices.0.gainBandwidthHz.min']],
    [{ typ: 2e6, max: 1e6 }, ['typ_above_max devices.0.gainBandwidthHz.typ']],
    [{ min: 2e6, max: 1e6 }, ['min_above_typ devices.0.gainBandwidthHz.min']],
    [{ max: 1e6 }, ['required devices.0.gainBandwidthHz.typ']],
    [{}, ['required devices.0.gainBandwidthHz.typ']],
    [{ typ: Number('1e400') }, ['not_finite devices.0.gainBandwidthHz.typ']],
    [{ typ: -1 }, ['out_of_range devices.0.gainBandwidthHz.typ']],
  ])('GBW %j', (gainBandwidthHz, issues) => {
    expect(codes(withDevice({ gainBandwidthHz }))).toEqual(issues);
  });

  it('null as a stage or device is said, not thrown', () => {
    const input = handReceiver([null as unknown as Stage]);
    expect(codes(input)).toEqual(['required stages.0']);
    expect(codes({ ...input, stages: [], devices: [null as unknown as Device] })).toEqual(['required devices.0']);
  });

  it('gives all issues at once and does not throw on missing parts', () => {
    const input = withStage({ ...amplifier, feedbackOhm: -1, gainOhm: -1, deviceId: 'x' });
    expect(codes(input)).toHaveLength(3);
    expect(codes({} as ChainInput)).toContain('required specification');
  });

  it('a policy with reversed phase margins is refused', () => {
    const input = handReceiver([]);
    const policy = { ...input.policy, phaseMarginOverDeg: 60 };
    expect(codes({ ...input, policy })).toEqual(['out_of_range policy.phaseMarginTightDeg']);
  });
});

import { DEFAULT_POLICY } from '../policy';
import type { MatchedBlockDevice, RcSectionStage, VoltageFeedbackDevice, VoltageFeedbackStage } from '../types';
import type { LoadPort, Port } from './port';
import { prepareStage } from './prepare-stage';

const context = { policy: DEFAULT_POLICY, corner: 'typical' as const, ambientK: 300 };
const portOf = (ohm: number): Port => ({ emfRe: 1, emfIm: 0, impedanceRe: ohm, impedanceIm: 0 });
const loadOf = (siemens: number): LoadPort => ({ admittanceRe: siemens, admittanceIm: 0 });
/** SI Brochure, 9th ed. (2019): exact. */
const BOLTZMANN = 1.380649e-23;

describe('RC section', () => {
  const section = (parts: Partial<RcSectionStage>) =>
    prepareStage({ kind: 'rc-section', id: 'p', name: 'p', ...parts }, null, context).network;

  it('a low-pass is at −3.01 dB and −45° at 1/(2πRC)', () => {
    const port = portOf(600);
    section({ seriesOhm: 400, shuntF: 1e-9 }).advance(port, 1 / (1000 * 1e-9));
    expect(port.emfRe).toBeCloseTo(0.5, 12);
    expect(port.emfIm).toBeCloseTo(-0.5, 12);
  });

  it('looked into from the left: series parts plus the shunt beside the load', () => {
    const load = loadOf(1 / 100);
    section({ seriesOhm: 50, shuntOhm: 100 }).inputImpedance(load, 1);
    expect(1 / load.admittanceRe).toBeCloseTo(100, 9);
  });

  it('with nothing in it passes everything on', () => {
    const port = portOf(50);
    const load = loadOf(0);
    section({}).advance(port, 1);
    section({}).inputImpedance(load, 1);
    expect(port).toEqual(portOf(50));
    expect(load).toEqual(loadOf(0));
  });

  it('own noise is that of a lossy two-port: 4kT·(Re Zout − |H|²·Re Zs)', () => {
    const network = section({ seriesOhm: 30, shuntOhm: 200, seriesF: 1e-9, shuntF: 2e-10 });
    const omega = 2e7;
    const port = portOf(75);
    network.advance(port, omega);
    const gain = port.emfRe ** 2 + port.emfIm ** 2;
    const byTwoPort = 4 * BOLTZMANN * 300 * (port.impedanceRe - gain * 75);
    const { sources } = network.ownNoise(portOf(75), omega);
    expect(sources.reduce((sum, next) => sum + next.v2PerHzAtOutput, 0) / byTwoPort).toBeCloseTo(1, 9);
  });
});

describe('matched block', () => {
  const device: MatchedBlockDevice = {
    kind: 'matched-block',
    id: 'b',
    partNumber: 'TLYR-B15',
    grade: 'rf',
    channels: 1,
    impedanceOhm: 50,
    gainDb: { typ: 20 },
    upperCornerHz: { typ: 1e9 },
    lowerCornerHz: { typ: 1e6 },
    noiseFigureDb: { typ: 3.0103 },
  };
  const network = (fields: Partial<MatchedBlockDevice>) => {
    const stage = { kind: 'matched-block' as const, id: 'b', name: 'b', deviceId: 'b' };
    return prepareStage(stage, { ...device, ...fields }, context).network;
  };
  const flat = { upperCornerHz: undefined, lowerCornerHz: undefined };

  it('between matched ends the EMF behind it is S21 times the EMF in front', () => {
    const port = portOf(50);
    network(flat).advance(port, 1e8);
    expect(port.emfRe).toBeCloseTo(10, 9);
    expect(port.impedanceRe).toBe(50);
  });

  it('is at half power at either corner', () => {
    for (const cornerHz of [1e6, 1e9]) {
      const port = portOf(50);
      network({}).advance(port, 2 * Math.PI * cornerHz);
      expect(port.emfRe ** 2 + port.emfIm ** 2).toBeCloseTo(50, 3);
    }
  });

  it('F = 2 adds 4·k·290 K·Z0·|S21|², whatever the source', () => {
    const own = network(flat).ownNoise(portOf(10), 1e8).sources[0].v2PerHzAtOutput;
    expect(own / (4 * BOLTZMANN * 290 * 50 * 100)).toBeCloseTo(1, 5);
  });

  it('a loss without a noise figure counts as a passive; gain without one is missing', () => {
    const loss = { ...flat, noiseFigureDb: undefined, gainDb: { typ: -3.0103 } };
    const own = network(loss).ownNoise(portOf(50), 1e8).sources[0].v2PerHzAtOutput;
    expect(own / (4 * BOLTZMANN * 290 * 50 * 0.5)).toBeCloseTo(1, 5);
    expect(network({ ...flat, noiseFigureDb: undefined }).ownNoise(portOf(50), 1e8).missing).toEqual(['noise figure']);
  });
});

describe('voltage-feedback stage', () => {
  const device: VoltageFeedbackDevice = {
    kind: 'voltage-feedback',
    id: 'a',
    partNumber: 'QUIL-D618',
    grade: 'rf',
    channels: 1,
    gainBandwidthHz: { typ: 1e9 },
    openLoopGainDb: { typ: 240 },
    voltageNoiseVPerRtHz: { typ: 5.5e-9 },
    currentNoiseAPerRtHz: { typ: 3.1e-12 },
  };
  const stage: VoltageFeedbackStage = {
    kind: 'voltage-feedback',
    id: 'a',
    name: 'a',
    topology: 'non-inverting',
    deviceId: 'a',
    feedbackOhm: 402,
    gainOhm: 402,
  };

  /**
   * Source: TI data sheet SBOS223H (Oct 2024), noise performance section, eqs. 1–2: a stage of gain +2 with
   * eni 5.5 nV, both currents 3.1 pA, Rs 200 Ω, 402 Ω resistors, 4kT = 1.6e-20 J: 12.3 nV/√Hz at the output.
   */
  it('output noise of the published gain-of-2 stage', () => {
    const published = { ...context, ambientK: 1.6e-20 / (4 * BOLTZMANN) };
    const { sources } = prepareStage(stage, device, published).network.ownNoise(portOf(200), 2 * Math.PI * 1e3);
    const own = sources.reduce((sum, next) => sum + next.v2PerHzAtOutput, 0);
    const source = 1.6e-20 * 200 * 4;
    expect(Math.sqrt(own + source) * 1e9).toBeCloseTo(12.3, 0);
    expect(Math.abs(Math.sqrt(own + source) * 1e9 - 12.3)).toBeLessThan(0.1);
  });

  it('DC-like gain is 1 + Rf/Rg and −Rf/(Zs + Rg)', () => {
    const port = portOf(200);
    prepareStage(stage, device, context).network.advance(port, 1);
    expect(port.emfRe).toBeCloseTo(2, 9);
    const inverting = portOf(200);
    prepareStage({ ...stage, topology: 'inverting' }, device, context).network.advance(inverting, 1);
    expect(inverting.emfRe).toBeCloseTo(-402 / 602, 9);
  });

  it('an inverting input is Rg, termination beside it, and an open + input is open', () => {
    const load = loadOf(0);
    const terminated = { ...stage, topology: 'inverting' as const, terminationOhm: 57.1 };
    prepareStage(terminated, device, context).network.inputImpedance(load, 1);
    expect(1 / load.admittanceRe).toBeCloseTo((402 * 57.1) / (402 + 57.1), 6);
    const open = loadOf(1);
    prepareStage(stage, device, context).network.inputImpedance(open, 1);
    expect(open).toEqual({ admittanceRe: 0, admittanceIm: 0 });
  });

  it('noise data that is not there is named once', () => {
    const silent = { ...device, voltageNoiseVPerRtHz: undefined, currentNoiseAPerRtHz: undefined };
    const { missing } = prepareStage(stage, silent, context).network.ownNoise(portOf(50), 1);
    expect(missing).toEqual(['voltage noise', 'current noise']);
  });
});

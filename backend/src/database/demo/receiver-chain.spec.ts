import { DEFAULT_POLICY, calculate } from '../../calculator/engine';
import type { ChainInput, Device, GbwCase } from '../../calculator/engine';
// eslint-disable-next-line import-x/no-restricted-paths -- the independent solver lies with the engine's own tests
import { NodalChain } from '../../calculator/engine/verification/nodal-chain.test-support';
import { demoDevices, priceBreaks } from './device-bodies';
import { DEVICE_REMARKS } from './device-remarks';
import { PHOTODIODE_SPECIFICATION, photodiodeOptions } from './photodiode-chain';
import { RECEIVER_SPECIFICATION, receiverOptions } from './receiver-chain';

const DEVICES = demoDevices().map(({ part, body, price }) => ({
  ...body,
  id: part,
  ...(price === undefined
    ? {}
    : { quote: { currency: 'USD', breaks: priceBreaks(price, DEVICE_REMARKS[part]?.breaks) } }),
})) as unknown as readonly Device[];

const OPTIONS = new Map(receiverOptions((part) => part).map(({ name, stages }) => [name, stages]));

const input = (name: string): ChainInput => ({
  specification: RECEIVER_SPECIFICATION,
  policy: DEFAULT_POLICY,
  stages: OPTIONS.get(name) ?? [],
  devices: DEVICES,
  currency: 'USD',
  buildQuantity: 250,
});

type Sheet = { readonly min?: number; readonly typ?: number } | undefined;

/** The solver reads one column only: the guaranteed open-loop gain counts in the minimum cases, the typical one else. */
function withOneColumn(device: Device, gbwCase: GbwCase): Device {
  const column = (sheet: Sheet) => (gbwCase === 'typical' ? sheet : { typ: sheet?.min ?? sheet?.typ });
  if (device.kind === 'voltage-feedback') return { ...device, openLoopGainDb: column(device.openLoopGainDb) };
  if (device.kind === 'matched-block') return device;
  return { ...device, openLoopTransimpedanceOhm: column(device.openLoopTransimpedanceOhm) };
}

function nodalGainDb(chain: ChainInput, gbwCase: GbwCase, frequencyHz: number): number {
  const { re, im } = new NodalChain(chain, gbwCase, frequencyHz).gain();
  return 20 * Math.log10(Math.hypot(re, im));
}

/** Largest minus smallest gain over the band by the nodal solution alone, at 401 frequencies. */
function nodalFlatnessDb(chain: ChainInput, gbwCase: GbwCase): number {
  const { lowHz, highHz } = chain.specification.band;
  const gains = Array.from({ length: 401 }, (_, k) =>
    nodalGainDb(chain, gbwCase, lowHz + ((highHz - lowHz) * k) / 400),
  );
  return Math.max(...gains) - Math.min(...gains);
}

describe('the demo’s receiver', () => {
  describe.each(['Baseline', 'A', 'B', 'C'])('option %s', (name) => {
    it.each(['typical', 'minimum', 'minimumHot'] as const)('agrees with the nodal solution, %s', (gbwCase) => {
      const { figures } = calculate(input(name)).cases[gbwCase];
      const chain = { ...input(name), devices: DEVICES.map((device) => withOneColumn(device, gbwCase)) };
      expect(figures.gainLow.value).toBeCloseTo(nodalGainDb(chain, gbwCase, 3e6), 6);
      expect(figures.gainOperating.value).toBeCloseTo(nodalGainDb(chain, gbwCase, 5e6), 6);
      expect(figures.gainHigh.value).toBeCloseTo(nodalGainDb(chain, gbwCase, 7e6), 6);
      expect(figures.flatness.value).toBeCloseTo(nodalFlatnessDb(chain, gbwCase), 3);
    });
  });

  it('has its second stage over the limit: 75 MHz for a noise gain of 11 at 7 MHz, by hand ×0.974', () => {
    const report = calculate(input('Baseline'));
    const second = report.stages[1]!;
    expect(report.verdict).toMatchObject({ verdict: 'over', checkId: 'gbw', stageId: second.stageId });
    const { figures, gbwBasis } = second.cases.minimum;
    expect(figures.noiseGain.value).toBeCloseTo(11, 3);
    expect(figures.headroom.value).toBeCloseTo(0.974, 3);
    expect(gbwBasis).toContain('p. 4');
    expect(report.stages.filter((stage) => stage.verdict.verdict === 'over')).toHaveLength(1);
  });

  // By hand, from the unit prices and the quiescent currents of the datasheets.
  it.each([
    ['Baseline', 'over', 8_120_000, 38],
    ['A', 'tight', 8_950_000, 41],
    ['B', 'tight', 8_740_000, 42],
    ['C', 'tight', 8_120_000, 38],
  ])('option %s is %s at %d millionths of a dollar and %d mA', (name, verdict, costMicros, supplyMa) => {
    const report = calculate(input(name));
    expect(report.verdict.verdict).toBe(verdict);
    expect(report.cost.amountMicros).toBe(costMicros);
    expect(report.cases.minimum.figures.supplyCurrent.value).toBeCloseTo(supplyMa / 1000, 9);
  });

  it('has an alternate for its first stage that is stable from a noise gain of 12 on only', () => {
    const swapped = (name: string) => {
      const chain = input(name);
      const stages = chain.stages.map((stage, k) => (k === 0 ? { ...stage, deviceId: 'QUIL-D852' } : stage));
      const first = calculate({ ...chain, stages } as ChainInput).stages[0]!;
      return first.checks.find((check) => check.id === 'stability')?.verdict;
    };
    expect(swapped('Baseline')).toBe('over');
    expect(swapped('A')).not.toBe('over');
    expect(swapped('C')).not.toBe('over');
  });
});

describe('the demo’s photodiode channel', () => {
  it('is clear', () => {
    const [option] = photodiodeOptions((part) => part);
    const chain = { ...input('Baseline'), specification: PHOTODIODE_SPECIFICATION, stages: option!.stages };
    expect(calculate(chain).verdict.verdict).toBe('clear');
  });
});

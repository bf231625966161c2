import { working, CHAIN_FIGURES, GBW_CASES, STAGE_FIGURES, calculate, EngineInputError } from '..';
import type { ChainInput, GbwCase, Working } from '..';
import { formatFigure } from '../text/si-format';
import { receiver } from '../verification/ultrasonic-receiver.test-support';
import { randomChain } from '../verification/random-chains.test-support';

/** Every word of a working that a reader sees. */
function texts(each: Working): string[] {
  return [
    each.title,
    each.result,
    each.source,
    ...each.assumptions,
    ...each.validity,
    ...each.steps.flatMap((step) => [step.formula, step.substituted, step.result]),
    ...each.data.flatMap((datum) => [datum.label, datum.value, datum.origin]),
  ];
}

function expectComplete(each: Working, printed: string): void {
  expect(each.result).toBe(printed);
  expect(each.steps.length).toBeGreaterThan(0);
  expect([each.title, each.steps[each.steps.length - 1].result]).toEqual([each.title, printed]);
  expect(each.source).not.toBe('');
  expect(texts(each).join(' ')).not.toMatch(/NaN|Infinity|undefined|\[object|!/);
}

function expectEveryWorking(input: ChainInput, cases: readonly GbwCase[]): void {
  const report = calculate(input);
  for (const gbwCase of cases) {
    for (const stage of report.stages) {
      for (const figure of STAGE_FIGURES) {
        const printed = formatFigure(stage.cases[gbwCase].figures[figure]);
        expectComplete(working(input, { stageId: stage.stageId, figure, gbwCase }), printed);
      }
    }
    for (const figure of CHAIN_FIGURES) {
      const printed = formatFigure(report.cases[gbwCase].figures[figure]);
      expectComplete(working(input, { stageId: null, figure, gbwCase }), printed);
    }
  }
}

describe('working', () => {
  it('of every figure of the receiver ends in the figure printed', () => {
    expectEveryWorking(
      receiver('Baseline', { phaseMarginDeg: 60, outputOhm: 30, gainOhm: 100, couplingHz: 159e3 }),
      GBW_CASES,
    );
  });

  it('of every figure of random chains ends in the figure printed, computed a second way from what it substitutes', () => {
    for (const seed of [1, 3, 4, 6, 8, 11]) {
      expectEveryWorking(randomChain(seed), [GBW_CASES[seed % GBW_CASES.length]]);
    }
  });

  it('of a headroom names noise gain, frequency and the datasheet column', () => {
    const input = receiver('Baseline');
    const each = working(input, { stageId: 'S2', figure: 'headroom', gbwCase: 'minimum' });
    expect(each.title).toBe('Headroom of S2 S2 at 7 MHz');
    expect(each.steps).toEqual([
      { formula: 'H = GBW / (|NG(j2πf)| · f)', substituted: '75 MHz / (11 · 7 MHz)', result: '×0.974' },
    ]);
    expect(each.data[0]).toMatchObject({ label: 'GBW', value: '75 MHz', origin: 'MRWG-G072, minimum', assumed: false });
  });

  it('of a derated value names the derating and marks it assumed', () => {
    const input = receiver('Baseline');
    const each = working(input, { stageId: 'S2', figure: 'slewAvailable', gbwCase: 'minimum' });
    expect(each.steps[0]).toEqual({
      formula: 'slew rate: typical × 0.7',
      substituted: '55 V/µs × 0.7',
      result: '38.5 V/µs',
    });
    expect(each.data).toContainEqual(expect.objectContaining({ label: 'slew rate', assumed: true }));
  });

  it('of a current-feedback stage names its bandwidth and reference circuit, never a GBW', () => {
    const input = receiver('Baseline');
    const labelsOf = (figure: string): string[] =>
      working(input, { stageId: 'S4', figure, gbwCase: 'minimum' }).data.map((datum) => datum.label);
    expect(labelsOf('cornerUpper')).toEqual(
      expect.arrayContaining(['reference bandwidth', 'its feedback resistor', 'its noise gain']),
    );
    const margin = working(input, { stageId: 'S4', figure: 'phaseMargin', gbwCase: 'minimum' });
    expect(margin.data.map((datum) => datum.label)).toEqual(
      expect.arrayContaining(['bandwidth, lower end', 'bandwidth, upper end']),
    );
    expect(texts(margin).join(' ')).not.toContain('GBW');
  });

  it('of costs ends in the money printed', () => {
    const input = receiver('Baseline');
    expect(working(input, { stageId: 'S2', figure: 'unitCost', gbwCase: 'minimum' }).result).toBe('0.62 USD');
    const cost = working(input, { stageId: null, figure: 'cost', gbwCase: 'minimum' });
    expect(cost.result).toBe('8.12 USD');
    expect(cost.steps[0].substituted).toBe('4.10 + 0.62 + 1.45 + 1.95');
  });

  it('refuses a figure or a stage that is not there', () => {
    const input = receiver('Baseline');
    expect(() => working(input, { stageId: 'S9', figure: 'headroom', gbwCase: 'minimum' })).toThrow(EngineInputError);
    expect(() => working(input, { stageId: null, figure: 'toString', gbwCase: 'minimum' })).toThrow(EngineInputError);
  });
});

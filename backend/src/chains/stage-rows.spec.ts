import type { Stage } from '../calculator/engine';
import { deviceIdsOf, stageColumns, stageOf } from './stage-rows';

const STAGES: readonly Stage[] = [
  { id: 'a', name: 'Filter', kind: 'rc-section', seriesOhm: 0, shuntOhm: null, shuntF: 1e-12 },
  {
    id: 'b',
    name: 'Gain',
    kind: 'voltage-feedback',
    topology: 'inverting',
    deviceId: 'd1',
    wantedGain: -10,
    feedbackOhm: 1000,
    gainOhm: 100,
  },
  { id: 'c', name: '', kind: 'matched-block', deviceId: 'd1' },
];

describe('stageColumns(optionId, stage, position) and stageOf(row)', () => {
  it.each(STAGES)('bring a $kind back as it was', (stage) => {
    const columns = stageColumns('option', stage, 4);
    expect(columns).toMatchObject({ optionId: 'option', position: 4, parameters: { schemaVersion: 1 } });
    expect(stageOf(columns)).toEqual(stage);
  });

  it('refuse parameters of a schema that is not known', () => {
    const columns = stageColumns('option', STAGES[0]!, 0);
    const later = { ...columns, parameters: { ...columns.parameters, schemaVersion: 2 } };
    expect(() => stageOf(later as never)).toThrow('unknown schema 2');
  });
});

describe('deviceIdsOf(stages)', () => {
  it('names each device once', () => expect(deviceIdsOf(STAGES)).toEqual(['d1']));
  it('is empty without stages', () => expect(deviceIdsOf([])).toEqual([]));
});

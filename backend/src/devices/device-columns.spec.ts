import { columnsOf, valuesDiffer } from './device-columns';
import type { DeviceBodyDto } from './dto/device-body.dto';

const body = (change: Record<string, unknown> = {}): DeviceBodyDto =>
  ({
    kind: 'voltage-feedback',
    partNumber: 'TSTV-1',
    grade: 'rf',
    channels: 1,
    gainBandwidthHz: { typ: 1e6, page: '4' },
    notes: 'first',
    ...change,
  }) as DeviceBodyDto;

describe('columnsOf(body)', () => {
  it('puts datasheet values and nothing else into the parameters', () => {
    const columns = columnsOf(body({ datasheet: { revision: 'B' }, version: 3 }));
    expect(columns.parameters).toEqual({ gainBandwidthHz: { typ: 1e6, page: '4' } });
    expect(columns).toMatchObject({ maker: '', package: null, datasheetRevision: 'B', notes: 'first' });
  });
});

describe('valuesDiffer(a, b)', () => {
  const original = columnsOf(body());

  it.each([
    ['a value', { gainBandwidthHz: { typ: 2e6, page: '4' } }],
    ['a page', { gainBandwidthHz: { typ: 1e6, page: '5' } }],
    ['one more value', { slewRateVPerS: { typ: 1e6 } }],
    ['the part number', { partNumber: 'TSTV-2' }],
    ['the channels', { channels: 2 }],
    ['the datasheet revision', { datasheet: { revision: 'C' } }],
  ])('is true when %s changes', (_case, change) => {
    expect(valuesDiffer(original, columnsOf(body(change)))).toBe(true);
  });

  it.each([
    ['notes', { notes: 'second' }],
    ['the lifecycle', { lifecycle: 'obsolete' }],
    ['the grade', { grade: 'general-purpose' }],
    ['the order of keys', { gainBandwidthHz: { page: '4', typ: 1e6 } }],
  ])('is false when only %s changes', (_case, change) => {
    expect(valuesDiffer(original, columnsOf(body(change)))).toBe(false);
  });
});

import { describe, expect, it } from 'vitest';

import { buildDevice } from '../../../testing/builders';
import {
  deviceBody,
  deviceProblems,
  draftOf,
  duplicateOf,
  EMPTY_SHEET,
  NEW_DEVICE,
  type DeviceDraft,
} from './device-draft';

const withGbw = (sheet: Partial<typeof EMPTY_SHEET>): DeviceDraft => ({
  ...NEW_DEVICE,
  partNumber: 'QUIL-X1',
  sheets: { gainBandwidthHz: { ...EMPTY_SHEET, ...sheet } },
});

describe('deviceProblems(draft)', () => {
  it('asks a new amplifier for its part number and GBW only', () => {
    expect(Object.keys(deviceProblems(NEW_DEVICE)).sort()).toEqual(['gainBandwidthHz', 'partNumber']);
  });

  it('asks a new current-feedback amplifier for its reference circuit', () => {
    expect(Object.keys(deviceProblems({ ...NEW_DEVICE, kind: 'current-feedback' })).sort()).toEqual([
      'partNumber',
      'referenceBandwidthHz',
      'referenceFeedbackOhm',
      'referenceNoiseGain',
    ]);
  });

  it.each([{ min: 1e6 }, { typ: 1e6 }, { min: 1e6, typ: 1e6, max: 1e6 }])('takes GBW %o', (sheet) => {
    expect(deviceProblems(withGbw(sheet))).toEqual({});
  });

  it.each([
    [{ min: 2e6, typ: 1e6 }, 'gainBandwidthHz.min'],
    [{ typ: 2e6, max: 1e6 }, 'gainBandwidthHz.typ'],
    [{ min: 2e6, max: 1e6 }, 'gainBandwidthHz.min'],
  ])('refuses GBW %o at %s', (sheet, path) => {
    expect(Object.keys(deviceProblems(withGbw(sheet)))).toEqual([path]);
  });
});

describe('deviceBody(draft)', () => {
  it('leaves out what is empty, so that it stays unknown', () => {
    const body = JSON.parse(JSON.stringify(deviceBody(withGbw({ min: 75e6 })))) as unknown;
    expect(body).toEqual({
      kind: 'voltage-feedback',
      partNumber: 'QUIL-X1',
      grade: 'general-purpose',
      lifecycle: 'active',
      channels: 1,
      gainBandwidthHz: { min: 75e6 },
    });
  });

  it('keeps zero as zero', () => {
    const draft = { ...withGbw({ min: 75e6 }), numbers: { voltageNoiseCornerHz: 0 } };
    expect(deviceBody(draft)).toHaveProperty('voltageNoiseCornerHz', 0);
  });

  it('sends nothing that belongs to another kind', () => {
    const draft: DeviceDraft = { ...withGbw({ min: 75e6 }), kind: 'matched-block', numbers: { phaseMarginDeg: 60 } };
    const body = JSON.parse(JSON.stringify(deviceBody(draft))) as Record<string, unknown>;
    expect(body).not.toHaveProperty('gainBandwidthHz');
    expect(body).not.toHaveProperty('phaseMarginDeg');
  });
});

describe('draftOf(device)', () => {
  it('takes value, page and identity', () => {
    const draft = draftOf(buildDevice());
    expect(draft.sheets['gainBandwidthHz']).toEqual({ ...EMPTY_SHEET, min: 75e6, typ: 100e6, page: '4' });
    expect(draft.partNumber).toBe('MRWG-G072');
  });

  it('gives back what the device had', () => {
    const body = JSON.parse(JSON.stringify(deviceBody(draftOf(buildDevice())))) as unknown;
    expect(body).toMatchObject({ gainBandwidthHz: { min: 75e6, typ: 100e6, page: '4' }, channels: 1 });
  });
});

describe('duplicateOf(device)', () => {
  it('has a part number of its own', () => {
    expect(duplicateOf(buildDevice()).partNumber).toBe('MRWG-G072 copy');
  });
});

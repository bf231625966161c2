import { describe, expect, it } from 'vitest';

import type { Draft } from './draft';
import { draftDifferences } from './draft-difference';
import { EMPTY_SPECIFICATION } from './specification-defaults';

const one = { id: '1', name: 'Input', kind: 'rc-section', seriesOhm: 100 } as const;
const two = { id: '2', name: 'Output', kind: 'rc-section', seriesOhm: 50 } as const;
const draft = (...stages: Draft['stages']): Draft => ({ name: 'A', stages, specification: EMPTY_SPECIFICATION });

describe('draftDifferences', () => {
  it('is empty for equal drafts', () => {
    expect(draftDifferences(draft(one, two), draft(one, two))).toEqual([]);
  });

  it('names stages that only one side has, and fields that differ', () => {
    const lines = draftDifferences(draft({ ...one, seriesOhm: 120 }), draft(one, two));
    expect(lines).toEqual(['S1 Input: series resistor changed', 'S2 Output: only in the saved version']);
  });

  it('names another order and another specification', () => {
    const theirs = { ...draft(two, one), specification: { ...EMPTY_SPECIFICATION, ambientK: 300 } };
    expect(draftDifferences(draft(one, two), theirs)).toEqual([
      'The order of the stages differs',
      'Specification: ambient temperature changed',
    ]);
    expect(draftDifferences(draft(one, two), draft(two, one))).toEqual(['The order of the stages differs']);
  });
});

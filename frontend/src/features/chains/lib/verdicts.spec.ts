import { describe, expect, it } from 'vitest';

import type { Check, CheckId, Verdict } from '../../../api/types';
import { chainLaneVerdict, laneVerdict, toneOf, worstVerdict } from './verdicts';

function check(id: CheckId, verdict: Verdict): Check {
  return { id, verdict, title: '', actual: null, limit: null, sentence: '', remedies: [] };
}

describe('verdicts', () => {
  it('orders them over, unknown, tight, clear', () => {
    expect(worstVerdict(['clear', 'tight', 'unknown'])).toBe('unknown');
    expect(worstVerdict(['unknown', 'over', 'tight'])).toBe('over');
    expect(worstVerdict([])).toBeNull();
  });

  it('gives a clear figure no tone', () => {
    expect(toneOf([check('slew', 'clear')], 'slew')).toBeUndefined();
    expect(toneOf([check('slew', 'tight'), check('gbw', 'over')], 'slew')).toBe('tight');
  });

  it('colours a lane by what the frequency axis shows, not by slew or stability', () => {
    expect(laneVerdict([check('gbw', 'clear'), check('stability', 'over')], 'over')).toBe('clear');
    expect(laneVerdict([check('slew', 'over')], 'unknown')).toBe('unknown');
  });

  it('colours the lane of the chain by its worst stage where nothing is required of the chain', () => {
    const stages = [{ checks: [check('gbw', 'tight')] }];
    expect(chainLaneVerdict({ checks: [], stages })).toBe('tight');
    expect(chainLaneVerdict({ checks: [check('flatness', 'over')], stages })).toBe('over');
  });
});

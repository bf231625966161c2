import { describe, expect, it } from 'vitest';

import { allowedByFlatness, requiredGain } from './requirement-windows';

describe('requiredGain', () => {
  it('is the target with its tolerance, one limit, or nothing', () => {
    expect(requiredGain({ gainDb: { target: 60, tolerance: 1 } })).toEqual({ lowDb: 59, highDb: 61 });
    expect(requiredGain({ minimumGainDb: 40 })).toEqual({ lowDb: 40, highDb: undefined });
    expect(requiredGain({ flatnessDb: 1 })).toBeNull();
  });
});

describe('allowedByFlatness', () => {
  const band = { lowHz: 3e6, operatingHz: 5e6, highHz: 7e6 };
  const frequenciesHz = [1e6, 4e6, 6e6, 10e6];

  it('hangs from the highest gain inside the band, the edges included', () => {
    const specification = { band, requirements: { flatnessDb: 1 } };
    expect(allowedByFlatness(specification, frequenciesHz, [70, 58.7, 57.2, 80], [59, 56])).toEqual({
      lowDb: 58,
      highDb: 59,
    });
  });

  it('is nothing without the requirement or without a gain', () => {
    expect(allowedByFlatness({ band, requirements: {} }, frequenciesHz, [1, 2, 3, 4], [])).toBeNull();
    const specification = { band, requirements: { flatnessDb: 1 } };
    expect(allowedByFlatness(specification, frequenciesHz, [1, null, null, 4], [null])).toBeNull();
  });
});

import { DEFAULT_POLICY } from '../calculator/engine';
import type { ChainInput } from '../calculator/engine';
import { optionSummary } from './option-summary';

const input = (change: Partial<ChainInput['specification']> = {}): ChainInput => ({
  specification: {
    source: { kind: 'voltage', resistanceOhm: 50, levelKind: 'peak-emf' },
    load: { resistanceOhm: null },
    gainBasis: 'voltage',
    band: { lowHz: 1e6, operatingHz: 2e6, highHz: 3e6 },
    supply: { positiveV: 5, negativeV: -5 },
    requirements: { costMicros: 2_500_000 },
    ...change,
  },
  policy: DEFAULT_POLICY,
  stages: [],
  devices: [],
  currency: 'EUR',
  buildQuantity: 10,
});

describe('optionSummary(input)', () => {
  it('sets the cost limit of the specification beside the figures', () => {
    expect(optionSummary(input()).costLimit).toEqual({ amountMicros: 2_500_000, currency: 'EUR' });
    expect(optionSummary(input({ requirements: {} })).costLimit).toBeNull();
  });

  it('says why a chain cannot be calculated, and never calls it clear', () => {
    const reversed = optionSummary(input({ band: { lowHz: 3e6, operatingHz: 2e6, highHz: 1e6 } }));
    expect(reversed).toMatchObject({
      verdict: 'unknown',
      reason: expect.stringMatching(/\w/),
      worstHeadroom: { value: null, reason: reversed.reason },
      gain: { value: null, reason: reversed.reason },
      cost: { amountMicros: null, currency: 'EUR', reason: reversed.reason },
      costLimit: { amountMicros: 2_500_000 },
    });
  });
});

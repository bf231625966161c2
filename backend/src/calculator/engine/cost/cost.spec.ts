import type { Quote } from '../types';
import {
  chainInput,
  rcSection,
  voltageFeedbackDevice,
  voltageFeedbackStage,
} from '../verification/chain-builder.test-support';
import { chainCost } from './chain-cost';
import { countStagesByDevice, isLapsed, unitPrice } from './unit-price';

/** The breaks of the invented general-purpose part: 1 / 10 / 100 / 250 / 1000 pieces. */
const QUOTE: Quote = {
  currency: 'USD',
  breaks: [
    { quantity: 1, unitPriceMicros: 1_350_000 },
    { quantity: 10, unitPriceMicros: 1_120_000 },
    { quantity: 100, unitPriceMicros: 920_000 },
    { quantity: 250, unitPriceMicros: 620_000 },
    { quantity: 1000, unitPriceMicros: 550_000 },
  ],
};

const device = (quote?: Quote) => voltageFeedbackDevice('part', 75e6, quote ? { quote } : {});
const priceAt = (needed: number, quote: Quote = QUOTE) => unitPrice(device(quote), { currency: 'USD', needed });

describe('unitPrice(device, question)', () => {
  it.each([
    [1, 1_350_000],
    [9, 1_350_000],
    [10, 1_120_000],
    [249, 920_000],
    [250, 620_000],
    [999, 620_000],
    [1000, 550_000],
    [1_000_000, 550_000],
  ])('%s pieces cost %s millionths each', (needed, micros) => {
    expect(priceAt(needed).money).toEqual({ amountMicros: micros, currency: 'USD' });
  });

  it('below the first break takes its price and says so', () => {
    const quote = { currency: 'USD', breaks: [{ quantity: 500, unitPriceMicros: 400_000 }] };
    expect(priceAt(250, quote).money).toEqual({
      amountMicros: 400_000,
      currency: 'USD',
      reason: '250 needed is below the first break of 500: its price is used',
    });
  });

  it('does not depend on the order in which the breaks were typed', () => {
    expect(priceAt(250, { ...QUOTE, breaks: [...QUOTE.breaks].reverse() }).money.amountMicros).toBe(620_000);
  });

  it('another currency is no price, not zero', () => {
    expect(priceAt(250, { ...QUOTE, currency: 'EUR' }).money).toEqual({
      amountMicros: null,
      currency: 'USD',
      reason: 'no rate from EUR to USD',
    });
  });

  it('no quote is no price', () => {
    const { money } = unitPrice(device(), { currency: 'USD', needed: 250 });
    expect(money.amountMicros).toBeNull();
    expect(money.reason).toContain('no quote for PART');
  });

  it('a quote lapses on the day after its last one; without a last day or without a today it does not', () => {
    expect(isLapsed({ ...QUOTE, validUntil: '2026-03-31' }, '2026-03-31')).toBe(false);
    expect(isLapsed({ ...QUOTE, validUntil: '2026-03-31' }, '2026-04-01')).toBe(true);
    expect(isLapsed(QUOTE, '2026-04-01')).toBe(false);
    expect(isLapsed({ ...QUOTE, validUntil: '2026-03-31' }, undefined)).toBe(false);
  });
});

describe('chainCost(input)', () => {
  const stage = (id: string, part = 'part') => voltageFeedbackStage(id, part, 'non-inverting', 900, 100);

  it('counts every stage that uses a device for the break', () => {
    const stages = [stage('a'), stage('b'), stage('c'), stage('d')];
    expect(countStagesByDevice(stages).get('part')).toBe(4);
    // 250 boards × 4 = 1000 pieces: the break from 1000 on.
    const cost = chainCost(chainInput(stages, [device(QUOTE)]));
    expect(cost.total).toEqual({ amountMicros: 4 * 550_000, currency: 'USD' });
    expect(cost.stages.map((each) => each.money.amountMicros)).toEqual([550_000, 550_000, 550_000, 550_000]);
  });

  it('leaves passive sections out', () => {
    const cost = chainCost(chainInput([stage('a'), rcSection('b', { seriesOhm: 50 })], [device(QUOTE)]));
    expect(cost.total.amountMicros).toBe(620_000);
    expect(cost.stages[1].money).toMatchObject({ amountMicros: null });
  });

  it('is null when a price is missing, and tells the part that is known', () => {
    const unquoted = voltageFeedbackDevice('other', 75e6);
    const cost = chainCost(chainInput([stage('a'), stage('b', 'other')], [device(QUOTE), unquoted]));
    expect(cost.total.amountMicros).toBeNull();
    expect(cost.total.reason).toMatch(/^S2: no quote for OTHER.*\(the others sum to 0\.62 USD\)$/);
  });

  it('a chain without stages costs nothing', () => {
    expect(chainCost(chainInput([], [])).total).toEqual({ amountMicros: 0, currency: 'USD' });
  });

  it('adds millionths exactly: 24 stages of 0.000001', () => {
    const quote = { currency: 'USD', breaks: [{ quantity: 1, unitPriceMicros: 1 }] };
    const stages = Array.from({ length: 24 }, (_, index) => stage(`s${index}`));
    expect(chainCost(chainInput(stages, [device(quote)])).total.amountMicros).toBe(24);
  });
});

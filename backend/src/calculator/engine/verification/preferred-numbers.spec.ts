import { CUSTOMARY_TOLERANCE, PreferredSeries, nearestPreferred, preferredDecade } from '../preferred-values';
import { holdTo, listInput, numberInput } from './published-cases.test-support';

/** Held before rounding away: 100 = 1.00. */
const asList = (series: PreferredSeries, divisor: number): number[] =>
  preferredDecade(series).map((value) => value / divisor);

describe('preferred numbers', () => {
  holdTo('M01', (published) => {
    const decade = asList('E24', 10);
    expect(decade).toEqual(listInput(published, 'list'));
    const departures = decade.filter((value, i) => value !== Math.round(10 * 10 ** (i / 24)));
    return { count: decade.length, departures: departures.length };
  });

  holdTo('M02', (published) => {
    expect(asList('E96', 1)).toEqual(listInput(published, 'list'));
    return { count: preferredDecade('E96').length };
  });

  holdTo('M03', (published) => {
    expect(asList('E48', 1)).toEqual(listInput(published, 'list'));
    expect(preferredDecade('E48')).toEqual(preferredDecade('E96').filter((_, i) => i % 2 === 0));
    return { count: preferredDecade('E48').length };
  });

  holdTo('M04', () => {
    const percent = (series: PreferredSeries): number => CUSTOMARY_TOLERANCE[series] * 100;
    const series: PreferredSeries[] = ['E6', 'E12', 'E24', 'E48', 'E96', 'E192'];
    return Object.fromEntries(series.map((name) => [name, percent(name)]));
  });

  holdTo('M05', (published) =>
    Object.fromEntries(
      Object.keys(published.expected).map((key) => {
        const [series, target] = key.split(' ');
        return [key, nearestPreferred(Number(target), series as PreferredSeries)];
      }),
    ),
  );

  holdTo('M07', (published) => {
    const target = numberInput(published, 'targetOhm');
    const decade = preferredDecade('E24');
    const small = decade.map((value) => value * 10);
    const large = [10, 100, 1000].flatMap((factor) => decade.map((value) => value * factor));
    const errors = small.flatMap((a) => large.map((b) => Math.abs((a * b) / (a + b) / target - 1)));
    return { errorPercent: 100 * Math.min(...errors) };
  });

  it('nearest value does not depend on the decade, from 1 µ to 1 G', () => {
    for (let exponent = -6; exponent <= 9; exponent++) {
      for (const series of ['E12', 'E24', 'E96', 'E192'] as const) {
        for (const mantissa of [1, 1.04, 2.9, 5.05, 9.6, 9.99]) {
          const nearest = nearestPreferred(mantissa * 10 ** exponent, series) / 10 ** exponent;
          expect(nearest).toBeCloseTo(nearestPreferred(mantissa, series), 9);
        }
      }
    }
  });

  it('every value of every series is its own nearest', () => {
    for (const series of ['E6', 'E12', 'E24', 'E48', 'E96', 'E192'] as const) {
      for (const value of preferredDecade(series)) expect(nearestPreferred(value, series)).toBe(value);
    }
  });
});

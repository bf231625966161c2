import { describe, expect, it } from 'vitest';

import { filterParams, isNarrowed, NO_FILTERS, readFilters, writeFilters } from './device-filters';

describe('filters of the device list in the address', () => {
  it('are empty for a bare address, and leave it bare', () => {
    expect(readFilters(new URLSearchParams())).toEqual(NO_FILTERS);
    expect(writeFilters(NO_FILTERS).toString()).toBe('');
  });

  it('come back as they were written', () => {
    const filters = {
      ...NO_FILTERS,
      search: 'MRWG & co',
      kind: 'voltage-feedback' as const,
      minimumGbwHz: 231e6,
      verified: 'false' as const,
      sort: 'price' as const,
      order: 'desc' as const,
      page: 3,
    };
    expect(readFilters(new URLSearchParams(writeFilters(filters).toString()))).toEqual(filters);
  });

  it.each(['kind=tube', 'page=-4', 'page=x', 'minimumGbwHz=NaN', 'sort=random', 'order=sideways', 'verified=maybe'])(
    'pass over “%s”',
    (query) => {
      expect(readFilters(new URLSearchParams(query))).toEqual(NO_FILTERS);
    },
  );

  it('narrow the list only where order and page do not', () => {
    expect(isNarrowed({ ...NO_FILTERS, sort: 'gbw', page: 2 })).toBe(false);
    expect(isNarrowed({ ...NO_FILTERS, grade: 'rf' })).toBe(true);
  });

  it('send order and page always', () => {
    expect(filterParams(NO_FILTERS)).toEqual({ sort: 'partNumber', order: 'asc', page: 1, pageSize: 50 });
  });
});

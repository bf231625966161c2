import { describe, expect, it } from 'vitest';

import { readAddress, writeAddress } from './workspace-url';

describe('address of the workspace', () => {
  it('reads what is there and leaves out what is not known', () => {
    expect(readAddress(new URLSearchParams('option=o&case=typical&stage=s'))).toEqual({
      optionId: 'o',
      gbwCase: 'typical',
      stageId: 's',
    });
    expect(readAddress(new URLSearchParams('case=average'))).toEqual({ optionId: null, gbwCase: null, stageId: null });
  });

  it('changes one part, keeps the others and drops what is the default', () => {
    const search = writeAddress(new URLSearchParams('option=o&stage=s'), { stageId: null, gbwCase: 'minimumHot' });
    expect(search.toString()).toBe('option=o&case=minimumHot');
  });
});

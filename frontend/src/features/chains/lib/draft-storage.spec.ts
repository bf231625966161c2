// @vitest-environment jsdom
import { beforeEach, describe, expect, it } from 'vitest';

import type { Draft } from './draft';
import { discardDraft, discardOutdatedDrafts, findDraft, findOutdatedDraft, storeDraft } from './draft-storage';
import { EMPTY_SPECIFICATION } from './specification-defaults';

const place = { userId: 'u1', optionId: 'o1', optionVersion: 3, chainVersion: 1 };
const draft: Draft = { name: 'Baseline', stages: [], specification: EMPTY_SPECIFICATION };

describe('draft storage', () => {
  beforeEach(() => localStorage.clear());

  it('finds a draft of the same person, option and versions, and only that', () => {
    storeDraft(localStorage, place, draft, '2026-01-05T10:00:00Z');
    expect(findDraft(localStorage, place)?.draft).toEqual(draft);
    expect(findDraft(localStorage, { ...place, userId: 'u2' })).toBeNull();
    expect(findDraft(localStorage, { ...place, optionId: 'o2' })).toBeNull();
    expect(findDraft(localStorage, { ...place, optionVersion: 4 })).toBeNull();
  });

  it('offers the newest draft of an older version', () => {
    storeDraft(localStorage, { ...place, optionVersion: 1 }, draft, '2026-01-05T10:00:00Z');
    storeDraft(localStorage, { ...place, optionVersion: 2 }, { ...draft, name: 'later' }, '2026-01-06T10:00:00Z');
    storeDraft(localStorage, { ...place, optionId: 'o2' }, draft, '2026-01-07T10:00:00Z');
    expect(findOutdatedDraft(localStorage, place)?.draft.name).toBe('later');
    discardOutdatedDrafts(localStorage, place);
    expect(findOutdatedDraft(localStorage, place)).toBeNull();
    expect(findDraft(localStorage, { ...place, optionId: 'o2' })).not.toBeNull();
  });

  it('forgets a discarded draft', () => {
    storeDraft(localStorage, place, draft, '2026-01-05T10:00:00Z');
    discardDraft(localStorage, place);
    expect(findDraft(localStorage, place)).toBeNull();
  });

  it('takes damaged content as none', () => {
    localStorage.setItem('bandledger.draft.1.u1.o1.3-1', '{"draft":');
    expect(findDraft(localStorage, place)).toBeNull();
    localStorage.setItem('bandledger.draft.1.u1.o1.3-1', '{"draft":{"stages":5}}');
    expect(findDraft(localStorage, place)).toBeNull();
  });

  it('says so when the store is full, and does not throw', () => {
    const full = Object.assign(Object.create(localStorage) as Storage, {
      setItem() {
        throw new DOMException('full', 'QuotaExceededError');
      },
    });
    expect(storeDraft(full, place, draft, '2026-01-05T10:00:00Z')).toBe(false);
  });
});

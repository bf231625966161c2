import type { Draft } from './draft';

/** Where a draft belongs: one person, one option, the versions it was begun from. */
export interface DraftPlace {
  readonly userId: string;
  readonly optionId: string;
  readonly optionVersion: number;
  readonly chainVersion: number;
}

export interface StoredDraft {
  readonly draft: Draft;
  readonly savedAt: string;
  readonly optionVersion: number;
  readonly chainVersion: number;
}

type KeyValueStore = Pick<Storage, 'getItem' | 'setItem' | 'removeItem' | 'key' | 'length'>;

const PREFIX = 'bandledger.draft.1';

function optionPrefix(place: Pick<DraftPlace, 'userId' | 'optionId'>): string {
  return `${PREFIX}.${place.userId}.${place.optionId}.`;
}

function keyOf(place: DraftPlace): string {
  return `${optionPrefix(place)}${place.optionVersion}-${place.chainVersion}`;
}

function looksLikeDraft(value: unknown): value is StoredDraft {
  if (value === null || typeof value !== 'object') return false;
  const { draft, savedAt } = value as Partial<StoredDraft>;
  return typeof savedAt === 'string' && Array.isArray(draft?.stages) && typeof draft.specification === 'object';
}

function parse(text: string | null): StoredDraft | null {
  if (text === null) return null;
  try {
    const value: unknown = JSON.parse(text);
    return looksLikeDraft(value) ? value : null;
  } catch {
    return null;
  }
}

/** A full or forbidden store must not stop the work: false says that nothing is kept. */
export function storeDraft(store: KeyValueStore, place: DraftPlace, draft: Draft, savedAt: string): boolean {
  const { optionVersion, chainVersion } = place;
  try {
    store.setItem(keyOf(place), JSON.stringify({ draft, savedAt, optionVersion, chainVersion }));
    return true;
  } catch {
    return false;
  }
}

export function discardDraft(store: KeyValueStore, place: DraftPlace): void {
  try {
    store.removeItem(keyOf(place));
  } catch {
    // A store that cannot be written holds nothing to remove.
  }
}

/** The draft made from just these versions. */
export function findDraft(store: KeyValueStore, place: DraftPlace): StoredDraft | null {
  try {
    return parse(store.getItem(keyOf(place)));
  } catch {
    return null;
  }
}

/** The newest draft of this option that was begun from other versions: the option has moved on since. */
export function findOutdatedDraft(store: KeyValueStore, place: DraftPlace): StoredDraft | null {
  const found: StoredDraft[] = [];
  try {
    for (let index = 0; index < store.length; index++) {
      const key = store.key(index);
      if (!key?.startsWith(optionPrefix(place)) || key === keyOf(place)) continue;
      const stored = parse(store.getItem(key));
      if (stored) found.push(stored);
    }
  } catch {
    return null;
  }
  return found.toSorted((a, b) => a.savedAt.localeCompare(b.savedAt)).at(-1) ?? null;
}

export function discardOutdatedDrafts(store: KeyValueStore, place: DraftPlace): void {
  try {
    const keys = Array.from({ length: store.length }, (_, index) => store.key(index));
    for (const key of keys) {
      if (key?.startsWith(optionPrefix(place)) && key !== keyOf(place)) store.removeItem(key);
    }
  } catch {
    // See discardDraft.
  }
}

import { useSyncExternalStore } from 'react';

/** Below this the ledger is cards and the set-up panel a full-screen sheet. */
const NARROW = '(max-width: 760px)';

function subscribe(onChange: () => void): () => void {
  const media = window.matchMedia(NARROW);
  media.addEventListener('change', onChange);
  return () => media.removeEventListener('change', onChange);
}

export function useNarrow(): boolean {
  return useSyncExternalStore(subscribe, () => window.matchMedia(NARROW).matches);
}

import { useEffect } from 'react';
import { useBlocker, type Blocker, type Location } from 'react-router-dom';

/** Sections, cases and stages are views of the same draft; another page or another option is not. */
function leaves(chainId: string, optionId: string, to: Location): boolean {
  if (!to.pathname.split('/').includes(chainId)) return true;
  const option = new URLSearchParams(to.search).get('option');
  return option !== null && option !== optionId;
}

/** Stops a way out while there are unsaved changes: within the application by a question, beyond it by the browser's. */
export function useLeaveGuard(chainId: string, optionId: string, dirty: boolean): Blocker {
  useEffect(() => {
    if (!dirty) return;
    const warn = (event: BeforeUnloadEvent) => event.preventDefault();
    window.addEventListener('beforeunload', warn);
    return () => window.removeEventListener('beforeunload', warn);
  }, [dirty]);
  return useBlocker(({ nextLocation }) => dirty && leaves(chainId, optionId, nextLocation));
}

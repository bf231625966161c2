import { lazy, useEffect } from 'react';

/*
 * What is not needed to read the ledger comes after it, so that the ledger itself is there soon.
 */
const loadSetUpPanel = () => import('./set-up/set-up-panel');
const loadOptionMenu = () => import('./frame/option-menu');

export const SetUpPanel = lazy(async () => ({ default: (await loadSetUpPanel()).SetUpPanel }));
export const OptionMenu = lazy(async () => ({ default: (await loadOptionMenu()).OptionMenu }));
export const AddStage = lazy(async () => ({ default: (await import('./set-up/add-stage')).AddStage }));
export const ChainWorking = lazy(async () => ({ default: (await import('./frame/chain-working')).ChainWorking }));
export const Conflict = lazy(async () => ({ default: (await import('./frame/conflict')).Conflict }));
export const LeaveDialog = lazy(async () => ({ default: (await import('./frame/leave-dialog')).LeaveDialog }));
export const ResponseSection = lazy(async () => ({
  default: (await import('./response/response-section')).ResponseSection,
}));
export const SpecificationDrawer = lazy(async () => ({
  default: (await import('./specification/specification-drawer')).SpecificationDrawer,
}));

const WARM_UP_DELAY_MS = 600;

/** Fetches what most people open next once the ledger stands and the browser has time. */
export function useWarmUp(ready: boolean): void {
  useEffect(() => {
    if (!ready) return;
    const timer = setTimeout(() => {
      void loadSetUpPanel();
    }, WARM_UP_DELAY_MS);
    return () => clearTimeout(timer);
  }, [ready]);
}

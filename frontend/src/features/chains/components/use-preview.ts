import { useQuery } from '@tanstack/react-query';
import { useEffect, useMemo, useState } from 'react';

import { fieldMessages } from '../../../api/api-error';
import type { CalculationRequest, Chain, ChainReport } from '../../../api/types';
import type { Draft } from '../lib/draft';
import { calculationQuery } from '../queries';

const DEBOUNCE_MS = 120;

/** The value as it was once it has been left alone for a moment. */
export function useDebounced<T>(value: T, delayMs: number = DEBOUNCE_MS): T {
  const [settled, setSettled] = useState(value);
  useEffect(() => {
    const timer = setTimeout(() => setSettled(value), delayMs);
    return () => clearTimeout(timer);
  }, [value, delayMs]);
  return settled;
}

export function requestFor(chain: Chain, draft: Draft): CalculationRequest {
  const { policy, currency, buildQuantity } = chain;
  return { specification: draft.specification, policy, stages: draft.stages, currency, buildQuantity };
}

export interface Preview {
  /** The last figures that could be computed. */
  readonly report: ChainReport | null;
  /** The figures belong to an earlier draft than the one on the screen. */
  readonly outdated: boolean;
  readonly error: unknown;
  /** Messages of refused fields by their path in the request, e.g. `stages.1.gainOhm`. */
  readonly messages: Readonly<Record<string, string>>;
  /** The draft that was last asked about, for further questions about the same state. */
  readonly request: CalculationRequest;
  readonly retry: () => void;
}

/** Figures of the draft while it is being edited: debounced, cancelled when overtaken, the last good ones stay. */
export function usePreview(chain: Chain, draft: Draft): Preview {
  const settled = useDebounced(draft);
  const request = useMemo(() => requestFor(chain, settled), [chain, settled]);
  const query = useQuery(calculationQuery(request));
  const [lastGood, setLastGood] = useState<ChainReport | null>(null);
  const fresh = query.data && !query.isPlaceholderData ? query.data.report : null;
  if (fresh && fresh !== lastGood) setLastGood(fresh);
  return {
    report: fresh ?? lastGood,
    outdated: settled !== draft || query.isPlaceholderData || query.isError || query.isPending,
    error: query.error,
    messages: fieldMessages(query.error),
    request,
    retry: () => void query.refetch(),
  };
}

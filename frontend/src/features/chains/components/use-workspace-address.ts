import { useCallback, useMemo } from 'react';
import { useParams, useSearchParams } from 'react-router-dom';

import { isSection, readAddress, writeAddress, type Section, type WorkspaceAddress } from '../lib/workspace-url';

export interface WorkspaceAddressControl extends WorkspaceAddress {
  readonly section: Section;
  /**
   * Replaces the history entry: walking through rows is no journey that Back should retrace. Takes effect at once, so
   * that what is typed next goes to the stage that was chosen.
   */
  readonly change: (change: Partial<WorkspaceAddress>) => void;
  /** The same option, case and stage in another section. */
  readonly linkTo: (section: Section) => string;
}

export function useWorkspaceAddress(): WorkspaceAddressControl {
  const { '*': rest, projectId = '', chainId = '' } = useParams();
  const section = rest?.split('/')[0];
  const [search, setSearch] = useSearchParams();
  const address = useMemo(() => readAddress(search), [search]);
  const change = useCallback(
    (next: Partial<WorkspaceAddress>) =>
      setSearch((present) => writeAddress(present, next), { replace: true, flushSync: true }),
    [setSearch],
  );
  const text = search.toString();
  return {
    ...address,
    section: isSection(section) ? section : 'ledger',
    change,
    linkTo: (to) => `/projects/${projectId}/chains/${chainId}/${to}${text === '' ? '' : `?${text}`}`,
  };
}

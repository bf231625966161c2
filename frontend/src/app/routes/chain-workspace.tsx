import { useQuery } from '@tanstack/react-query';
import { useParams, useSearchParams } from 'react-router-dom';

import { isApiError } from '../../api/api-error';
import type { Chain } from '../../api/types';
import { ErrorNotice } from '../../components/error-notice';
import { Page } from '../../components/page';
import { ChainWorkspace } from '../../features/chains/components/chain-workspace';
import { readAddress } from '../../features/chains/lib/workspace-url';
import { chainQuery, optionQuery } from '../../features/chains/queries';
import { PageSkeleton } from '../layout/page-skeleton';
import { Component as NotFound } from './not-found';

export function Component() {
  const { chainId = '' } = useParams();
  const { data: chain, error, refetch } = useQuery(chainQuery(chainId));
  if (isApiError(error, 404)) return <NotFound />;
  if (chain) return <ChainPage chain={chain} />;
  if (!error) return <PageSkeleton />;
  return (
    <Page>
      <ErrorNotice error={error} title="The chain could not be loaded." onRetry={() => void refetch()} />
    </Page>
  );
}

/** The option of the address, else the first. */
function ChainPage({ chain }: { chain: Chain }) {
  const [search] = useSearchParams();
  const { optionId } = readAddress(search);
  const chosen = chain.options.find((option) => option.id === optionId) ?? chain.options[0];
  const {
    data: option,
    error,
    refetch,
  } = useQuery({ ...optionQuery(chosen?.id ?? ''), enabled: chosen !== undefined });
  if (!chosen || isApiError(error, 404)) return <NotFound />;
  if (option) return <ChainWorkspace key={option.id} chain={chain} option={option} />;
  if (!error) return <PageSkeleton />;
  return (
    <Page>
      <ErrorNotice error={error} title="The option could not be loaded." onRetry={() => void refetch()} />
    </Page>
  );
}

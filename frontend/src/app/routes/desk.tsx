import { useQuery } from '@tanstack/react-query';

import { ErrorNotice } from '../../components/error-notice';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { Section } from '../../components/section';
import { SkeletonRows } from '../../components/skeleton-rows';
import { DeskCounts } from '../../features/desk/components/desk-counts';
import { FirstSteps } from '../../features/desk/components/first-steps';
import { OverChains } from '../../features/desk/components/over-chains';
import { WaitingList } from '../../features/desk/components/waiting-list';
import { deskQuery } from '../../features/desk/queries';

export function Component() {
  const { data: desk, error, refetch } = useQuery(deskQuery());
  return (
    <Page>
      <PageHeader title="Desk" />
      <ErrorNotice error={error} title="The desk could not be loaded." onRetry={() => void refetch()} />
      {!desk && !error && <SkeletonRows />}
      {desk && (
        <>
          <DeskCounts counts={desk.counts} />
          {desk.waiting.length > 0 && (
            <Section title="Waiting for you">
              <WaitingList items={desk.waiting} />
            </Section>
          )}
          {desk.overChains.length > 0 ? (
            <Section title="Over a limit">
              <OverChains chains={desk.overChains} />
            </Section>
          ) : (
            <FirstSteps counts={desk.counts} />
          )}
        </>
      )}
    </Page>
  );
}

import { EmptyState } from '../../components/empty-state';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { useHasRole } from '../../components/session-context';
import { PeoplePage } from '../../features/administration/components/people-page';

export function Component() {
  const administrates = useHasRole('admin');
  return (
    <Page>
      {administrates ? (
        <PeoplePage />
      ) : (
        <>
          <PageHeader title="Administration" />
          <EmptyState title="Only administrators manage people">Ask one of them for an account or a role.</EmptyState>
        </>
      )}
    </Page>
  );
}

import { Link } from 'react-router-dom';

import { EmptyState } from '../../components/empty-state';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';

export function Component() {
  return (
    <Page>
      <PageHeader title="Not found" />
      <EmptyState title="There is nothing at this address" action={<Link to="/">Go to the desk</Link>}>
        It may have been deleted, or you may have no access to it.
      </EmptyState>
    </Page>
  );
}

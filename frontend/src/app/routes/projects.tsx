import { useQuery } from '@tanstack/react-query';

import { EmptyState } from '../../components/empty-state';
import { ErrorNotice } from '../../components/error-notice';
import { LinkButton } from '../../components/link-button';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { useHasRole } from '../../components/session-context';
import { SkeletonRows } from '../../components/skeleton-rows';
import { ProjectTable } from '../../features/projects/components/project-table';
import { projectsQuery } from '../../features/projects/queries';

export function Component() {
  const { data: projects, error, refetch } = useQuery(projectsQuery());
  const mayCreate = useHasRole('designer', 'lead');
  const create = (
    <LinkButton to="/projects/new" type="primary">
      New project
    </LinkButton>
  );
  return (
    <Page>
      <PageHeader title="Projects" extra={mayCreate ? create : null} />
      <ErrorNotice error={error} title="The projects could not be loaded." onRetry={() => void refetch()} />
      {!projects && !error && <SkeletonRows />}
      {projects?.length === 0 && (
        <EmptyState title="No project yet" action={mayCreate ? create : null}>
          {mayCreate
            ? 'A project holds chains, their currency and quantity, and the team’s margins.'
            : 'Projects that are open to the team, and those you are a member of, appear here.'}
        </EmptyState>
      )}
      {projects && projects.length > 0 && <ProjectTable projects={projects} />}
    </Page>
  );
}

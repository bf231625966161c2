import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';

import { isApiError } from '../../api/api-error';
import { ErrorNotice } from '../../components/error-notice';
import { NotAllowed } from '../../components/not-allowed';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { NewChainForm } from '../../features/chains/components/specification/new-chain-form';
import { projectQuery } from '../../features/projects/queries';
import { PageSkeleton } from '../layout/page-skeleton';
import { Component as NotFound } from './not-found';

export function Component() {
  const { projectId = '' } = useParams();
  const { data: project, error, refetch } = useQuery(projectQuery(projectId));
  if (isApiError(error, 404)) return <NotFound />;
  if (!project && !error) return <PageSkeleton />;
  return (
    <Page>
      <ErrorNotice error={error} title="The project could not be loaded." onRetry={() => void refetch()} />
      {project && (
        <>
          <PageHeader
            title="New chain"
            trail={[
              { label: 'Projects', to: '/projects' },
              { label: `${project.code} ${project.name}`, to: `/projects/${projectId}` },
              { label: 'New chain' },
            ]}
          />
          {project.can.createChain ? (
            <NewChainForm projectId={projectId} currency={project.currency} />
          ) : (
            <NotAllowed
              title="You may not add chains to this project"
              back={{ label: 'Back to the project', to: `/projects/${projectId}` }}
            >
              Chains are added by designers and leads.
            </NotAllowed>
          )}
        </>
      )}
    </Page>
  );
}

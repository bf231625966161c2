import { useQuery } from '@tanstack/react-query';
import { useParams } from 'react-router-dom';

import { isApiError } from '../../api/api-error';
import type { Project } from '../../api/types';
import { EmptyState } from '../../components/empty-state';
import { ErrorNotice } from '../../components/error-notice';
import { LinkButton } from '../../components/link-button';
import { Page } from '../../components/page';
import { PageHeader } from '../../components/page-header';
import { Section } from '../../components/section';
import { SkeletonRows } from '../../components/skeleton-rows';
import { ChainTable } from '../../features/projects/components/chain-table';
import { ProjectFacts } from '../../features/projects/components/project-facts';
import { projectChainsQuery, projectQuery } from '../../features/projects/queries';
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
      {project && <ProjectPage project={project} />}
    </Page>
  );
}

function ProjectPage({ project }: { project: Project }) {
  return (
    <>
      <PageHeader
        title={`${project.code} ${project.name}`}
        trail={[{ label: 'Projects', to: '/projects' }, { label: project.code }]}
        extra={
          <LinkButton to={`/projects/${project.id}/settings`}>
            {project.can.edit ? 'Edit project' : 'Margins and members'}
          </LinkButton>
        }
      >
        {project.description}
      </PageHeader>
      <Chains project={project} />
      <Section title="Project">
        <ProjectFacts project={project} />
      </Section>
    </>
  );
}

function Chains({ project }: { project: Project }) {
  const { data: chains, error, refetch } = useQuery(projectChainsQuery(project.id));
  const create = project.can.createChain ? (
    <LinkButton to={`/projects/${project.id}/chains/new`} type="primary">
      New chain
    </LinkButton>
  ) : null;
  return (
    <Section title="Chains" extra={chains && chains.length > 0 ? create : null}>
      <ErrorNotice error={error} title="The chains could not be loaded." onRetry={() => void refetch()} />
      {!chains && !error && <SkeletonRows rows={3} />}
      {chains?.length === 0 && (
        <EmptyState title="No chain yet" action={create}>
          A chain is what is budgeted: source, load, band and requirements, then the stages with their devices.
        </EmptyState>
      )}
      {chains && chains.length > 0 && <ChainTable projectId={project.id} chains={chains} />}
    </Section>
  );
}

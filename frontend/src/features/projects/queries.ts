import { queryOptions } from '@tanstack/react-query';

import { getJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { ChainRow, Project, ProjectRow } from '../../api/types';

export const projectsQuery = () =>
  queryOptions({
    queryKey: [...KEYS.projects, 'list'],
    queryFn: ({ signal }) => getJson<ProjectRow[]>('/projects', { signal }),
  });

export const projectQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...KEYS.projects, projectId],
    queryFn: ({ signal }) => getJson<Project>(`/projects/${projectId}`, { signal }),
  });

/** Under the key of chains: a saved chain or option makes it out of date. */
export const projectChainsQuery = (projectId: string) =>
  queryOptions({
    queryKey: [...KEYS.chains, 'of-project', projectId],
    queryFn: ({ signal }) => getJson<ChainRow[]>(`/projects/${projectId}/chains`, { signal }),
  });

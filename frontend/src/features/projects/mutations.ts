import { useMutation, useQueryClient } from '@tanstack/react-query';

import { deleteJson, patchJson, postJson } from '../../api/client';
import { KEYS } from '../../api/query-keys';
import type { Project } from '../../api/types';
import { projectBody, type ProjectDraft } from './lib/project-draft';
import { projectQuery } from './queries';

export function useCreateProject() {
  const client = useQueryClient();
  return useMutation({
    mutationFn: (draft: ProjectDraft) => postJson<Project>('/projects', projectBody(draft, false)),
    onSuccess: async (project) => {
      client.setQueryData(projectQuery(project.id).queryKey, project);
      await Promise.all([
        client.invalidateQueries({ queryKey: KEYS.projects }),
        client.invalidateQueries({ queryKey: KEYS.desk }),
      ]);
    },
  });
}

interface ProjectUpdate {
  readonly draft: ProjectDraft;
  readonly version: number;
  readonly withPolicy: boolean;
}

export function useUpdateProject(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: ({ draft, version, withPolicy }: ProjectUpdate) =>
      patchJson<Project>(`/projects/${projectId}`, { version, ...projectBody(draft, withPolicy) }),
    onSuccess: async (project) => {
      client.setQueryData(projectQuery(projectId).queryKey, project);
      // The policy and the build quantity stand in every chain's figures.
      await Promise.all([
        client.invalidateQueries({ queryKey: KEYS.projects }),
        client.invalidateQueries({ queryKey: KEYS.chains }),
        client.invalidateQueries({ queryKey: KEYS.options }),
        client.invalidateQueries({ queryKey: KEYS.desk }),
      ]);
    },
  });
}

export function useDeleteProject(projectId: string) {
  const client = useQueryClient();
  return useMutation({
    mutationFn: () => deleteJson(`/projects/${projectId}`),
    onSuccess: async () => {
      client.removeQueries({ queryKey: projectQuery(projectId).queryKey });
      await client.invalidateQueries({ queryKey: [...KEYS.projects, 'list'] });
      await client.invalidateQueries({ queryKey: KEYS.desk });
    },
  });
}

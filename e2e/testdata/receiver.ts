import { randomUUID } from 'node:crypto';
import type { Api, ChainRow, OptionContent, ProjectRow } from '../fixtures/api';

/** The demo's project with the receive chain whose second stage is over. */
export const DEMO_PROJECT = 'PW-5';

export interface SeededChain {
  readonly projectId: string;
  readonly chainId: string;
  readonly optionId: string;
  readonly code: string;
}

export async function demoChain(api: Api): Promise<SeededChain> {
  const project = await api.projectByCode(DEMO_PROJECT);
  const [row] = await api.chains(project.id);
  const chain = await api.chain(row?.id ?? '');
  return { projectId: project.id, chainId: chain.id, optionId: chain.options[0]?.id ?? '', code: DEMO_PROJECT };
}

/** A project of the journey's own with a copy of the demo's Baseline, to be changed at will. */
export async function seedReceiver(api: Api): Promise<SeededChain> {
  const demo = await demoChain(api);
  const [source, content] = await Promise.all([api.chain(demo.chainId), api.option(demo.optionId)]);
  const code = `T-${randomUUID().slice(0, 8)}`;
  const project = await api.send<ProjectRow>('POST', '/projects', {
    code,
    name: 'Journey',
    open: true,
    currency: 'USD',
    buildQuantity: 250,
  });
  const created = await api.send<ChainRow>('POST', `/projects/${project.id}/chains`, {
    name: 'Receive chain',
    specification: source.specification,
  });
  const [option] = created.options;
  const stages = content.stages.map((stage) => ({ ...stage, id: randomUUID() }));
  await api.send<OptionContent>('PUT', `/options/${option?.id}`, {
    version: option?.version,
    name: option?.name,
    stages,
  });
  return { projectId: project.id, chainId: created.id, optionId: option?.id ?? '', code };
}

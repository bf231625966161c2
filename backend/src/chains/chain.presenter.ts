import type { SessionUser } from '../common/session-user';
import type { ProjectFacts } from '../projects/project.presenter';
import { canDeleteOption, canEditChain } from './chain.policy';
import type { ChainDto, ChainListItemDto, ChainOptionDto } from './dto/chain.dto';
import type { OverChainDto } from './dto/desk.dto';
import type { OptionDto } from './dto/option.dto';
import type { OptionSummaryDto } from './dto/summary.dto';
import type { Chain } from './models/chain.model';
import type { Option } from './models/option.model';
import { specificationText } from './specification-text';

/** An option with its figures. */
export interface SummarizedOption {
  readonly option: Option;
  readonly summary: OptionSummaryDto;
}

function presentChainOption({ option, summary }: SummarizedOption): ChainOptionDto {
  const { id, name, position, version } = option;
  return { id, name, position, version, updatedAt: option.updatedAt.toISOString(), summary };
}

export function presentChain(
  chain: Chain,
  project: ProjectFacts,
  options: readonly SummarizedOption[],
  user: SessionUser,
): ChainDto {
  const { id, name, version, specification } = chain;
  return {
    id,
    projectId: project.id,
    projectCode: project.code,
    projectName: project.name,
    name,
    version,
    specification,
    policy: project.policy,
    currency: project.currency,
    buildQuantity: project.buildQuantity,
    updatedAt: chain.updatedAt.toISOString(),
    options: options.map(presentChainOption),
    can: { edit: canEditChain(user) },
  };
}

export function presentChainListItem(
  chain: Chain,
  options: readonly SummarizedOption[],
  user: SessionUser,
): ChainListItemDto[] {
  const [first] = options;
  if (!first) return [];
  const latest = Math.max(chain.updatedAt.getTime(), ...options.map(({ option }) => option.updatedAt.getTime()));
  return [
    {
      id: chain.id,
      name: chain.name,
      version: chain.version,
      updatedAt: new Date(latest).toISOString(),
      summary: first.summary,
      options: options.map(({ option, summary }) => ({ id: option.id, name: option.name, summary })),
      specificationText: specificationText(chain.specification),
      can: { edit: canEditChain(user) },
    },
  ];
}

export function presentOption(
  option: Option,
  stages: OptionDto['stages'],
  devices: OptionDto['devices'],
  optionCount: number,
  user: SessionUser,
): OptionDto {
  const { id, chainId, name, position, version } = option;
  return {
    id,
    chainId,
    name,
    position,
    version,
    updatedAt: option.updatedAt.toISOString(),
    stages,
    devices,
    can: { edit: canEditChain(user), delete: canDeleteOption(user, optionCount) },
  };
}

export function presentOverChain(
  project: ProjectFacts,
  chain: Chain,
  { option, summary }: SummarizedOption,
): OverChainDto {
  return {
    projectId: project.id,
    projectCode: project.code,
    chainId: chain.id,
    chainName: chain.name,
    optionId: option.id,
    optionName: option.name,
    lead: summary.lead,
    text: summary.text,
    worstHeadroom: summary.worstHeadroom,
    stage: summary.worstHeadroomStage,
  };
}

/** What goes on record about a chain and an option. */
export const auditedChain = ({ name, projectId, specification }: Chain): Record<string, unknown> => ({
  name,
  projectId,
  specification,
});

export const auditedOption = ({ name, chainId }: Option, stages: OptionDto['stages']): Record<string, unknown> => ({
  name,
  chainId,
  stages,
});

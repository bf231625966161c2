import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { validateChain } from '../calculator/engine';
import type { Specification } from '../calculator/engine';
import { ForbiddenError, InvalidError, NotFoundError, StaleVersionError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { WriteQueue } from '../database/write-queue';
import { ProjectAccessService } from '../projects/project-access.service';
import type { ProjectFacts } from '../projects/project.presenter';
import { canEditChain } from './chain.policy';
import { auditedChain, presentChain, presentChainListItem } from './chain.presenter';
import type { ChainDto, ChainListItemDto, CreateChainDto, UpdateChainDto } from './dto/chain.dto';
import { Chain } from './models/chain.model';
import { Option } from './models/option.model';
import { OptionSummariesService } from './option-summaries.service';

const FIRST_OPTION_NAME = 'Baseline';

@Injectable()
export class ChainsService {
  constructor(
    @InjectModel(Chain) private readonly chains: typeof Chain,
    @InjectModel(Option) private readonly options: typeof Option,
    private readonly summaries: OptionSummariesService,
    private readonly projects: ProjectAccessService,
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
  ) {}

  async findAll(user: SessionUser, projectId: string): Promise<ChainListItemDto[]> {
    const project = await this.projects.getVisible(user, projectId);
    const chains = await this.chains.findAll({ where: { projectId }, order: ['name', 'id'] });
    const chainsById = new Map(chains.map((chain) => [chain.id, chain]));
    const options = await this.options.findAll({
      where: { chainId: [...chainsById.keys()] },
      order: ['position', 'id'],
    });
    const summarized = await this.summaries.summarizeAll(
      options.map((option) => ({ project, chain: chainsById.get(option.chainId)!, option })),
    );
    return chains.flatMap((chain) =>
      presentChainListItem(
        chain,
        summarized.filter(({ option }) => option.chainId === chain.id),
        user,
      ),
    );
  }

  async findOne(user: SessionUser, id: string): Promise<ChainDto> {
    const { chain, project } = await this.getVisible(user, id);
    return this.present(chain, project, user);
  }

  async create(user: SessionUser, projectId: string, dto: CreateChainDto): Promise<ChainDto> {
    const project = await this.projects.getVisible(user, projectId);
    if (!canEditChain(user)) throw new ForbiddenError();
    assertSpecification(dto.specification, project);
    const chain = await this.queue.transaction(async (transaction) => {
      const { name, specification } = dto;
      const row = await this.chains.create({ projectId, name, specification }, { transaction });
      await this.options.create({ chainId: row.id, name: FIRST_OPTION_NAME, position: 0 }, { transaction });
      await this.record(user, 'chain.created', row, transaction, { after: auditedChain(row) });
      return row;
    });
    return this.present(chain, project, user);
  }

  async update(user: SessionUser, id: string, dto: UpdateChainDto): Promise<ChainDto> {
    const { project } = await this.getVisible(user, id);
    if (!canEditChain(user)) throw new ForbiddenError();
    if (dto.specification) assertSpecification(dto.specification, project);
    const chain = await this.queue.transaction(async (transaction) => {
      const row = await this.getCurrent(user, id, dto.version, transaction);
      const before = auditedChain(row);
      const { name = row.name, specification = row.specification } = dto;
      await row.update({ name, specification, version: row.version + 1 }, { transaction });
      await this.record(user, 'chain.updated', row, transaction, { before, after: auditedChain(row) });
      return row;
    });
    return this.present(chain, project, user);
  }

  async remove(user: SessionUser, id: string, version: number): Promise<void> {
    await this.getVisible(user, id);
    if (!canEditChain(user)) throw new ForbiddenError();
    await this.queue.transaction(async (transaction) => {
      const row = await this.getCurrent(user, id, version, transaction);
      await row.destroy({ transaction });
      await this.record(user, 'chain.deleted', row, transaction, { before: auditedChain(row) });
    });
  }

  /** The chain with its project, if `user` may see them. */
  async getVisible(
    user: SessionUser,
    id: string,
    transaction?: Transaction,
  ): Promise<{ chain: Chain; project: ProjectFacts }> {
    const chain = await this.chains.findByPk(id, { transaction });
    if (chain === null) throw new NotFoundError();
    return { chain, project: await this.projects.getVisible(user, chain.projectId, transaction) };
  }

  private async getCurrent(user: SessionUser, id: string, version: number, transaction: Transaction): Promise<Chain> {
    const { chain, project } = await this.getVisible(user, id, transaction);
    if (chain.version !== version) throw new StaleVersionError(await this.present(chain, project, user));
    return chain;
  }

  private async present(chain: Chain, project: ProjectFacts, user: SessionUser): Promise<ChainDto> {
    const options = await this.options.findAll({ where: { chainId: chain.id }, order: ['position', 'id'] });
    const contexts = options.map((option) => ({ project, chain, option }));
    return presentChain(chain, project, await this.summaries.summarizeAll(contexts), user);
  }

  private record(
    user: SessionUser,
    action: string,
    row: Chain,
    transaction: Transaction,
    change: { before?: unknown; after?: unknown },
  ): Promise<void> {
    return this.audit.record(transaction, { actorId: user.id, action, entity: 'chain', entityId: row.id, ...change });
  }
}

/** The calculator knows which specifications make no sense; an empty chain asks it about the specification alone. */
function assertSpecification(specification: Specification, { policy, currency, buildQuantity }: ProjectFacts): void {
  const issues = validateChain({ specification, policy, stages: [], devices: [], currency, buildQuantity });
  if (issues.length > 0) throw new InvalidError(issues);
}

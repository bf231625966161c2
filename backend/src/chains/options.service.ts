import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { validateChain } from '../calculator/engine';
import type { Stage } from '../calculator/engine';
import { ConflictError, ForbiddenError, InvalidError, NotFoundError, StaleVersionError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { WriteQueue } from '../database/write-queue';
import { DeviceLibraryService } from '../devices/device-library.service';
import { presentDevice } from '../devices/device.presenter';
import type { ProjectFacts } from '../projects/project.presenter';
import { canDeleteOption, canEditChain } from './chain.policy';
import { auditedOption, presentOption } from './chain.presenter';
import { ChainsService } from './chains.service';
import type { CreateOptionDto, OptionDto, SaveOptionDto } from './dto/option.dto';
import type { Chain } from './models/chain.model';
import { Option } from './models/option.model';
import { StageRow } from './models/stage.model';
import { deviceIdsOf, stageColumns, stageOf } from './stage-rows';

interface VisibleOption {
  readonly option: Option;
  readonly chain: Chain;
  readonly project: ProjectFacts;
}

/** An option is one aggregate: its stages are read and saved with it, under its version. */
@Injectable()
export class OptionsService {
  constructor(
    @InjectModel(Option) private readonly options: typeof Option,
    @InjectModel(StageRow) private readonly stages: typeof StageRow,
    private readonly chains: ChainsService,
    private readonly library: DeviceLibraryService,
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
  ) {}

  async findOne(user: SessionUser, id: string): Promise<OptionDto> {
    const { option } = await this.getVisible(user, id);
    return this.present(option, user);
  }

  async create(user: SessionUser, chainId: string, dto: CreateOptionDto): Promise<OptionDto> {
    await this.chains.getVisible(user, chainId);
    if (!canEditChain(user)) throw new ForbiddenError();
    const option = await this.queue.transaction(async (transaction) => {
      const stages = await this.stagesToCopy(chainId, dto.fromOptionId, transaction);
      const last = await this.options.max<number | null, Option>('position', { where: { chainId }, transaction });
      const row = await this.options.create({ chainId, name: dto.name, position: (last ?? -1) + 1 }, { transaction });
      await this.replaceStages(row.id, stages, transaction);
      await this.record(user, 'option.created', row, transaction, { after: auditedOption(row, stages) });
      return row;
    });
    return this.present(option, user);
  }

  async save(user: SessionUser, id: string, dto: SaveOptionDto): Promise<OptionDto> {
    const { chain, project } = await this.getVisible(user, id);
    if (!canEditChain(user)) throw new ForbiddenError();
    await this.assertStages(dto.stages, chain, project);
    const option = await this.queue.transaction(async (transaction) => {
      const row = await this.getCurrent(user, id, dto.version, transaction);
      const before = auditedOption(row, await this.stagesOf(id, transaction));
      await row.update({ name: dto.name, version: row.version + 1 }, { transaction });
      await this.replaceStages(id, dto.stages, transaction);
      await this.record(user, 'option.saved', row, transaction, { before, after: auditedOption(row, dto.stages) });
      return row;
    });
    return this.present(option, user);
  }

  async remove(user: SessionUser, id: string, version: number): Promise<void> {
    await this.getVisible(user, id);
    if (!canEditChain(user)) throw new ForbiddenError();
    await this.queue.transaction(async (transaction) => {
      const row = await this.getCurrent(user, id, version, transaction);
      const count = await this.options.count({ where: { chainId: row.chainId }, transaction });
      if (!canDeleteOption(user, count)) {
        throw new ConflictError('last_option', 'A chain keeps at least one option; delete the chain instead.');
      }
      const before = auditedOption(row, await this.stagesOf(id, transaction));
      await row.destroy({ transaction });
      await this.record(user, 'option.deleted', row, transaction, { before });
    });
  }

  private async getVisible(user: SessionUser, id: string, transaction?: Transaction): Promise<VisibleOption> {
    const option = await this.options.findByPk(id, { transaction });
    if (option === null) throw new NotFoundError();
    return { option, ...(await this.chains.getVisible(user, option.chainId, transaction)) };
  }

  private async getCurrent(user: SessionUser, id: string, version: number, transaction: Transaction): Promise<Option> {
    const { option } = await this.getVisible(user, id, transaction);
    if (option.version !== version) throw new StaleVersionError(await this.present(option, user, transaction));
    return option;
  }

  private async stagesOf(optionId: string, transaction?: Transaction): Promise<Stage[]> {
    const rows = await this.stages.findAll({ where: { optionId }, order: ['position'], transaction });
    return rows.map(stageOf);
  }

  private async stagesToCopy(chainId: string, fromId: string | undefined, transaction: Transaction): Promise<Stage[]> {
    if (fromId === undefined) return [];
    const from = await this.options.findOne({ where: { id: fromId, chainId }, transaction });
    if (from === null) {
      throw new InvalidError([
        { path: 'fromOptionId', code: 'option_unknown', message: 'is not an option of this chain' },
      ]);
    }
    return (await this.stagesOf(fromId, transaction)).map((stage) => ({ ...stage, id: randomUUID() }));
  }

  private async replaceStages(optionId: string, stages: readonly Stage[], transaction: Transaction): Promise<void> {
    await this.stages.destroy({ where: { optionId }, transaction });
    const rows = stages.map((stage, position) => ({ ...stageColumns(optionId, stage, position) }));
    await this.stages.bulkCreate(rows, { transaction });
  }

  /** What cannot be calculated is not stored: the calculator's own rules, with the devices as they are now. */
  private async assertStages(stages: readonly Stage[], { specification }: Chain, project: ProjectFacts): Promise<void> {
    assertDistinctIds(stages);
    const devices = await this.library.findForCalculation(deviceIdsOf(stages));
    const { policy, currency, buildQuantity } = project;
    const issues = validateChain({ specification, policy, stages, devices, currency, buildQuantity });
    // The specification is not what is being saved here.
    const own = issues.filter((issue) => issue.path.startsWith('stages'));
    if (own.length > 0) throw new InvalidError(own);
  }

  private async present(option: Option, user: SessionUser, transaction?: Transaction): Promise<OptionDto> {
    const stages = await this.stagesOf(option.id, transaction);
    const devices = await this.library.findRows(deviceIdsOf(stages), transaction);
    const count = await this.options.count({ where: { chainId: option.chainId }, transaction });
    const presented = devices.map((device) => presentDevice(device, user));
    return presentOption(option, stages, presented, count, user);
  }

  private record(
    user: SessionUser,
    action: string,
    row: Option,
    transaction: Transaction,
    change: { before?: unknown; after?: unknown },
  ): Promise<void> {
    return this.audit.record(transaction, { actorId: user.id, action, entity: 'option', entityId: row.id, ...change });
  }
}

function assertDistinctIds(stages: readonly Stage[]): void {
  const index = stages.findIndex((stage, position) => stages.findIndex(({ id }) => id === stage.id) !== position);
  if (index < 0) return;
  throw new InvalidError([{ path: `stages.${index}.id`, code: 'repeated', message: 'is the id of another stage too' }]);
}

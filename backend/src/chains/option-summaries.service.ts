import { Injectable, Logger } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Device, Stage } from '../calculator/engine';
import { DeviceLibraryService } from '../devices/device-library.service';
import type { ProjectFacts } from '../projects/project.presenter';
import type { SummarizedOption } from './chain.presenter';
import type { OptionSummaryDto } from './dto/summary.dto';
import type { Chain } from './models/chain.model';
import type { Option } from './models/option.model';
import { StageRow } from './models/stage.model';
import { notCalculated, optionSummary } from './option-summary';
import { deviceIdsOf, stageOf } from './stage-rows';

/** An option with all that its figures depend on. */
export interface OptionContext {
  readonly project: ProjectFacts;
  readonly chain: Chain;
  readonly option: Option;
}

interface CacheEntry {
  readonly key: string;
  readonly summary: OptionSummaryDto;
}

const CACHE_SIZE = 5000;

/** Figures of stored options, kept for as long as nothing that they depend on has changed. */
@Injectable()
export class OptionSummariesService {
  private readonly logger = new Logger('OptionSummaries');
  private readonly cache = new Map<string, CacheEntry>();

  constructor(
    @InjectModel(StageRow) private readonly stages: typeof StageRow,
    private readonly library: DeviceLibraryService,
  ) {}

  async summarizeAll(contexts: readonly OptionContext[]): Promise<SummarizedOption[]> {
    const stages = await this.stagesByOption(contexts.map(({ option }) => option.id));
    const stagesOf = (context: OptionContext): Stage[] => stages.get(context.option.id) ?? [];
    const revisions = await this.library.findRevisions(contexts.flatMap((context) => deviceIdsOf(stagesOf(context))));
    const keys = contexts.map((context) => keyOf(context, stagesOf(context), revisions));
    const stale = contexts.filter((context, index) => this.cache.get(context.option.id)?.key !== keys[index]);
    const devices = await this.library.findForCalculation(stale.flatMap((context) => deviceIdsOf(stagesOf(context))));
    return contexts.map((context, index) => ({
      option: context.option,
      summary: this.fromCache(context.option.id, keys[index]!, () =>
        this.summarize(context, stagesOf(context), devices),
      ),
    }));
  }

  /** A fault of the calculator on one option must not take the lists with all the others away. */
  private summarize({ project, chain, option }: OptionContext, stages: Stage[], devices: Device[]): OptionSummaryDto {
    const { policy, currency, buildQuantity } = project;
    try {
      return optionSummary({ specification: chain.specification, policy, stages, devices, currency, buildQuantity });
    } catch (error) {
      this.logger.error(`option ${option.id}: ${error instanceof Error ? error.stack : String(error)}`);
      return notCalculated('The calculator failed on this option. The error has been logged.', currency);
    }
  }

  private fromCache(optionId: string, key: string, compute: () => OptionSummaryDto): OptionSummaryDto {
    const entry = this.cache.get(optionId);
    if (entry?.key === key) return entry.summary;
    const summary = compute();
    this.cache.delete(optionId);
    this.cache.set(optionId, { key, summary });
    const oldest = this.cache.keys().next();
    if (this.cache.size > CACHE_SIZE && !oldest.done) this.cache.delete(oldest.value);
    return summary;
  }

  private async stagesByOption(optionIds: readonly string[]): Promise<Map<string, Stage[]>> {
    const rows = await this.stages.findAll({
      where: { optionId: [...optionIds] },
      order: ['optionId', 'position'],
    });
    const byOption = new Map<string, Stage[]>();
    for (const row of rows) {
      const list = byOption.get(row.optionId);
      if (list) list.push(stageOf(row));
      else byOption.set(row.optionId, [stageOf(row)]);
    }
    return byOption;
  }
}

function keyOf({ project, chain, option }: OptionContext, stages: Stage[], revisions: Map<string, string>): string {
  const devices = deviceIdsOf(stages).map((id) => `${id}:${revisions.get(id) ?? ''}`);
  return [project.id, project.version, chain.version, option.version, ...devices].join('|');
}

import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { SessionUser } from '../common/session-user';
import { DeviceLibraryService } from '../devices/device-library.service';
import { ProjectAccessService } from '../projects/project-access.service';
import { presentOverChain } from './chain.presenter';
import type { DeskDto } from './dto/desk.dto';
import { Chain } from './models/chain.model';
import { Option } from './models/option.model';
import { OptionSummariesService } from './option-summaries.service';

/** The first screen after signing in: what waits for this person, in what this person may see. */
@Injectable()
export class DeskService {
  constructor(
    @InjectModel(Chain) private readonly chains: typeof Chain,
    @InjectModel(Option) private readonly options: typeof Option,
    private readonly summaries: OptionSummariesService,
    private readonly projects: ProjectAccessService,
    private readonly library: DeviceLibraryService,
  ) {}

  async findFor(user: SessionUser): Promise<DeskDto> {
    const projects = new Map((await this.projects.findAllVisible(user)).map((project) => [project.id, project]));
    const chains = await this.chains.findAll({ where: { projectId: [...projects.keys()] }, order: ['name', 'id'] });
    const options = await this.firstOptions(chains.map((chain) => chain.id));
    const contexts = chains.flatMap((chain) => {
      const project = projects.get(chain.projectId);
      const option = options.get(chain.id);
      return project && option ? [{ project, chain, option }] : [];
    });
    const summarized = await this.summaries.summarizeAll(contexts);
    const overChains = contexts.flatMap(({ project, chain }, index) => {
      const item = summarized[index];
      return item?.summary.verdict === 'over' ? [presentOverChain(project, chain, item)] : [];
    });
    const counts = { projects: projects.size, chains: chains.length, devices: await this.library.count() };
    return { overChains: overChains.sort(worstFirst), waiting: [], counts };
  }

  /** A chain is judged by its first option, the Baseline. */
  private async firstOptions(chainIds: readonly string[]): Promise<Map<string, Option>> {
    const options = await this.options.findAll({
      where: { chainId: [...chainIds] },
      order: [
        ['position', 'DESC'],
        ['id', 'DESC'],
      ],
    });
    return new Map(options.map((option) => [option.chainId, option]));
  }
}

function worstFirst(a: DeskDto['overChains'][number], b: DeskDto['overChains'][number]): number {
  return (a.worstHeadroom.value ?? Infinity) - (b.worstHeadroom.value ?? Infinity);
}

import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { DevicesModule } from '../devices/devices.module';
import { ProjectsModule } from '../projects/projects.module';
import { ChainsController } from './chains.controller';
import { ChainsService } from './chains.service';
import { DeskController } from './desk.controller';
import { DeskService } from './desk.service';
import { DeviceUseFinderService } from './device-use-finder.service';
import { Chain } from './models/chain.model';
import { Option } from './models/option.model';
import { StageRow } from './models/stage.model';
import { OptionSummariesService } from './option-summaries.service';
import { OptionsController } from './options.controller';
import { OptionsService } from './options.service';

@Module({
  imports: [SequelizeModule.forFeature([Chain, Option, StageRow]), ProjectsModule, DevicesModule],
  controllers: [ChainsController, OptionsController, DeskController],
  providers: [ChainsService, OptionsService, OptionSummariesService, DeskService, DeviceUseFinderService],
  exports: [ChainsService, OptionsService],
})
export class ChainsModule {}

import { Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { DeviceLibraryService } from './device-library.service';
import { DeviceUsesRegistry } from './device-uses.registry';
import { DevicesController } from './devices.controller';
import { DevicesService } from './devices.service';
import { Device } from './models/device.model';

@Module({
  imports: [SequelizeModule.forFeature([Device])],
  controllers: [DevicesController],
  providers: [DevicesService, DeviceLibraryService, DeviceUsesRegistry],
  exports: [DevicesService, DeviceLibraryService, DeviceUsesRegistry],
})
export class DevicesModule {}

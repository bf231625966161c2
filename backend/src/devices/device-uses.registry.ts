import { Injectable } from '@nestjs/common';
import type { SessionUser } from '../common/session-user';
import type { DeviceUsesDto } from './dto/device-list.dto';

export type DeviceUsesFound = DeviceUsesDto;

/** A feature that refers to devices and can say where. */
export interface DeviceUseFinder {
  findUses(user: SessionUser, deviceId: string): Promise<DeviceUsesFound>;
}

/** The features above the library that use devices register here, so that the library need not know them. */
@Injectable()
export class DeviceUsesRegistry {
  private readonly finders: DeviceUseFinder[] = [];

  register(finder: DeviceUseFinder): void {
    this.finders.push(finder);
  }

  async findUses(user: SessionUser, deviceId: string): Promise<DeviceUsesDto> {
    const found = await Promise.all(this.finders.map((finder) => finder.findUses(user, deviceId)));
    return {
      where: found.flatMap((uses) => uses.where),
      hiddenCount: found.reduce((sum, uses) => sum + uses.hiddenCount, 0),
    };
  }
}

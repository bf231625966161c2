import { Injectable } from '@nestjs/common';
import type { OnModuleInit } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { SessionUser } from '../common/session-user';
import { DeviceUsesRegistry } from '../devices/device-uses.registry';
import type { DeviceUseFinder, DeviceUsesFound } from '../devices/device-uses.registry';
import { ProjectAccessService } from '../projects/project-access.service';

interface UseRow {
  readonly projectId: string;
  readonly chainId: string;
  readonly chain: string;
  readonly optionId: string;
  readonly option: string;
  readonly stage: string;
  readonly position: number;
}

const SELECT_USES = `
  SELECT c.project_id AS projectId, c.id AS chainId, c.name AS chain, o.id AS optionId, o.name AS option,
    s.name AS stage, s.position
  FROM stages s JOIN options o ON o.id = s.option_id JOIN chains c ON c.id = o.chain_id
  WHERE s.device_id = $deviceId
  ORDER BY c.name, o.position, s.position`;

/** Tells the device library in which stages a device stands. */
@Injectable()
export class DeviceUseFinderService implements DeviceUseFinder, OnModuleInit {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly projects: ProjectAccessService,
    private readonly registry: DeviceUsesRegistry,
  ) {}

  onModuleInit(): void {
    this.registry.register(this);
  }

  /** Uses in projects that `user` cannot see are only counted. */
  async findUses(user: SessionUser, deviceId: string): Promise<DeviceUsesFound> {
    const rows = await this.sequelize.query<UseRow>(SELECT_USES, { type: QueryTypes.SELECT, bind: { deviceId } });
    const visible = new Map((await this.projects.findAllVisible(user)).map((project) => [project.id, project]));
    const where = rows.flatMap(({ stage, position, ...row }) => {
      const project = visible.get(row.projectId);
      if (!project) return [];
      return [{ ...row, project: `${project.code} ${project.name}`, stage: `S${position + 1} ${stage}`.trim() }];
    });
    return { where, hiddenCount: rows.length - where.length };
  }
}

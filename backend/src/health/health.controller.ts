import { Controller, Get } from '@nestjs/common';
import { ApiOkResponse, ApiTags } from '@nestjs/swagger';
import { InjectConnection } from '@nestjs/sequelize';
import { Sequelize } from 'sequelize-typescript';
import { NoStore, Public } from '../common/decorators';
import { Runtime } from '../config/runtime';
import { HealthDto } from './health.dto';

@ApiTags('health')
@Controller('health')
export class HealthController {
  constructor(
    @InjectConnection() private readonly sequelize: Sequelize,
    private readonly runtime: Runtime,
  ) {}

  /** Whether the server can answer and its database be read; for the container's health check. */
  @Public()
  @NoStore()
  @Get()
  @ApiOkResponse({ type: HealthDto })
  async get(): Promise<HealthDto> {
    await this.sequelize.query('SELECT count(*) FROM users');
    return { status: 'ok', database: 'ok', version: this.runtime.config.version };
  }
}

import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { Setting } from './models/setting.model';

/** Facts about the whole installation, by key. */
@Injectable()
export class SettingsService {
  constructor(@InjectModel(Setting) private readonly settings: typeof Setting) {}

  async find(key: string, transaction?: Transaction): Promise<unknown> {
    const row = await this.settings.findByPk(key, { transaction });
    return row === null ? null : row.value;
  }

  async set(key: string, value: unknown, transaction: Transaction): Promise<void> {
    const row = await this.settings.findByPk(key, { transaction });
    if (row === null) await this.settings.create({ key, value }, { transaction });
    else await row.update({ value }, { transaction });
  }
}

import { Injectable } from '@nestjs/common';
import { InjectConnection } from '@nestjs/sequelize';
import { QueryTypes } from 'sequelize';
import type { Transaction } from 'sequelize';
import { Sequelize } from 'sequelize-typescript';
import type { Device as EngineDevice, DeviceKind } from '../calculator/engine';
import { FROM_DEVICES, LOWEST_PRICE, SELECT_DEVICES } from './device-row';
import type { DeviceRow } from './device-row';
import { toEngineDevice } from './device.presenter';
import type { DeviceQueryDto, DeviceSort } from './dto/device-list.dto';

const SORT_COLUMNS: Readonly<Record<DeviceSort, string>> = {
  partNumber: 'd.part_number',
  gbw: 'd.guaranteed_gbw_hz',
  price: LOWEST_PRICE,
  updated: 'd.updated_at',
};

const DEFAULT_PAGE_SIZE = 50;

interface Condition {
  readonly sql: string;
  readonly values: Readonly<Record<string, unknown>>;
}

/** Reads the device library with plain SQL: rows are wide and lists long, models would cost several times as much. */
@Injectable()
export class DeviceLibraryService {
  constructor(@InjectConnection() private readonly sequelize: Sequelize) {}

  async findPage(query: DeviceQueryDto): Promise<{ rows: DeviceRow[]; total: number }> {
    const { sql, values } = conditionOf(query);
    const pageSize = query.pageSize ?? DEFAULT_PAGE_SIZE;
    const offset = ((query.page ?? 1) - 1) * pageSize;
    const rows = await this.select<DeviceRow>(
      `${SELECT_DEVICES} ${FROM_DEVICES} WHERE ${sql} ${orderOf(query)} LIMIT $pageSize OFFSET $offset`,
      { ...values, pageSize, offset },
    );
    const [count] = await this.select<{ total: number }>(
      `SELECT COUNT(*) AS total ${FROM_DEVICES} WHERE ${sql}`,
      values,
    );
    return { rows, total: count?.total ?? 0 };
  }

  async findRow(id: string, transaction?: Transaction): Promise<DeviceRow | null> {
    const sql = `${SELECT_DEVICES} ${FROM_DEVICES} WHERE d.id = $id`;
    const [row] = await this.select<DeviceRow>(sql, { id }, transaction);
    return row ?? null;
  }

  async findRows(ids: readonly string[], transaction?: Transaction): Promise<DeviceRow[]> {
    if (ids.length === 0) return [];
    const sql = `${SELECT_DEVICES} ${FROM_DEVICES} WHERE d.id IN (SELECT value FROM json_each($ids))`;
    return this.select<DeviceRow>(sql, { ids: JSON.stringify([...new Set(ids)]) }, transaction);
  }

  /** Those of the named devices that exist, as the calculator takes them. */
  async findForCalculation(ids: readonly string[], transaction?: Transaction): Promise<EngineDevice[]> {
    return (await this.findRows(ids, transaction)).map(toEngineDevice);
  }

  async findKindForCalculation(kind: DeviceKind): Promise<EngineDevice[]> {
    const sql = `${SELECT_DEVICES} ${FROM_DEVICES} WHERE d.kind = $kind ORDER BY d.part_number, d.id`;
    return (await this.select<DeviceRow>(sql, { kind })).map(toEngineDevice);
  }

  /** One key a device that changes whenever its values or its quote do. */
  async findRevisions(ids: readonly string[]): Promise<Map<string, string>> {
    const rows = await this.select<{ id: string; revision: string }>(
      `SELECT d.id, d.version || '.' || COALESCE(q.id, '') || '.' || COALESCE(q.version, 0) AS revision
       FROM devices d LEFT JOIN quotes q ON q.device_id = d.id
       WHERE d.id IN (SELECT value FROM json_each($ids))`,
      { ids: JSON.stringify([...new Set(ids)]) },
    );
    return new Map(rows.map((row) => [row.id, row.revision]));
  }

  async count(): Promise<number> {
    const [row] = await this.select<{ total: number }>('SELECT COUNT(*) AS total FROM devices', {});
    return row?.total ?? 0;
  }

  private select<T extends object>(
    sql: string,
    bind: Readonly<Record<string, unknown>>,
    transaction?: Transaction,
  ): Promise<T[]> {
    return this.sequelize.query<T>(sql, { type: QueryTypes.SELECT, bind, raw: true, transaction });
  }
}

function orderOf({ sort = 'partNumber', order }: DeviceQueryDto): string {
  const column = SORT_COLUMNS[sort];
  const direction = order ?? (sort === 'updated' ? 'desc' : 'asc');
  return `ORDER BY ${column} IS NULL, ${column} ${direction === 'desc' ? 'DESC' : 'ASC'}, d.part_number, d.id`;
}

const escapeLike = (text: string): string => text.replace(/[\\%_]/g, (character) => `\\${character}`);

function conditionOf(query: DeviceQueryDto): Condition {
  const parts: string[] = ['1 = 1'];
  const values: Record<string, unknown> = {};
  const add = (name: string, value: unknown, sql: string): void => {
    if (value === undefined || value === '') return;
    parts.push(sql);
    values[name] = value;
  };
  const search = query.search ? `%${escapeLike(query.search)}%` : undefined;
  add('search', search, String.raw`(d.part_number LIKE $search ESCAPE '\' OR d.maker LIKE $search ESCAPE '\')`);
  add('kind', query.kind, 'd.kind = $kind');
  add('grade', query.grade, 'd.grade = $grade');
  add('lifecycle', query.lifecycle, 'd.lifecycle = $lifecycle');
  add('minimumGbwHz', query.minimumGbwHz, 'd.guaranteed_gbw_hz >= $minimumGbwHz');
  add('maximumPriceMicros', query.maximumPriceMicros, `${LOWEST_PRICE} <= $maximumPriceMicros`);
  if (query.verified !== undefined) parts.push(`d.verified_by_id IS ${query.verified ? 'NOT ' : ''}NULL`);
  return { sql: parts.join(' AND '), values };
}

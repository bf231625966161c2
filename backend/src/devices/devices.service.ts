import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { ForeignKeyConstraintError } from 'sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { Clock } from '../common/clock';
import { ConflictError, ForbiddenError, InvalidError, NotFoundError, StaleVersionError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { WriteQueue } from '../database/write-queue';
import { auditedDevice, columnsOf, valuesDiffer } from './device-columns';
import { DeviceLibraryService } from './device-library.service';
import { DeviceUsesRegistry } from './device-uses.registry';
import { canCreateDevice, canDeleteDevice, canEditDevice, canVerifyDevice } from './device.policy';
import { presentDevice } from './device.presenter';
import type { DeviceBodyDto, DeviceUpdateDto } from './dto/device-body.dto';
import type { DeviceListDto, DeviceQueryDto, DeviceUsesDto } from './dto/device-list.dto';
import type { LibraryDeviceDto } from './dto/library-device.dto';
import { Device } from './models/device.model';

@Injectable()
export class DevicesService {
  constructor(
    @InjectModel(Device) private readonly devices: typeof Device,
    private readonly library: DeviceLibraryService,
    private readonly uses: DeviceUsesRegistry,
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
    private readonly clock: Clock,
  ) {}

  async findPage(user: SessionUser, query: DeviceQueryDto): Promise<DeviceListDto> {
    const { rows, total } = await this.library.findPage(query);
    return { items: rows.map((row) => presentDevice(row, user)), total };
  }

  async findOne(user: SessionUser, id: string, transaction?: Transaction): Promise<LibraryDeviceDto> {
    const row = await this.library.findRow(id, transaction);
    if (row === null) throw new NotFoundError();
    return presentDevice(row, user);
  }

  async findUses(user: SessionUser, id: string): Promise<DeviceUsesDto> {
    await this.findOne(user, id);
    return this.uses.findUses(user, id);
  }

  async create(user: SessionUser, body: DeviceBodyDto): Promise<LibraryDeviceDto> {
    if (!canCreateDevice(user)) throw new ForbiddenError();
    const columns = columnsOf(body);
    const device = await this.queue.transaction(async (transaction) => {
      await this.assertPartIsNew(columns.partNumber, columns.maker, null, transaction);
      const row = await this.devices.create(
        { ...columns, enteredById: user.id, valuesEditedById: user.id },
        { transaction },
      );
      await this.record(user, 'device.created', row.id, transaction, { after: auditedDevice(row) });
      return row;
    });
    return this.findOne(user, device.id);
  }

  async update(user: SessionUser, id: string, body: DeviceUpdateDto): Promise<LibraryDeviceDto> {
    await this.queue.transaction(async (transaction) => {
      const row = await this.get(id, transaction);
      if (!canEditDevice(user)) throw new ForbiddenError();
      await this.assertCurrent(user, row, body.version, transaction);
      if (row.kind !== body.kind) {
        throw new InvalidError([{ path: 'kind', code: 'kind_fixed', message: 'The kind of a device cannot change.' }]);
      }
      const columns = columnsOf(body);
      await this.assertPartIsNew(columns.partNumber, columns.maker, id, transaction);
      const before = auditedDevice(row);
      const revoked = valuesDiffer(row, columns)
        ? { valuesEditedById: user.id, verifiedById: null, verifiedAt: null }
        : {};
      row.set({ ...columns, ...revoked, version: row.version + 1 });
      await row.save({ transaction });
      await this.record(user, 'device.updated', id, transaction, { before, after: auditedDevice(row) });
    });
    return this.findOne(user, id);
  }

  async remove(user: SessionUser, id: string, version: number): Promise<void> {
    try {
      await this.queue.transaction(async (transaction) => {
        const row = await this.get(id, transaction);
        if (!canDeleteDevice(user)) throw new ForbiddenError();
        await this.assertCurrent(user, row, version, transaction);
        await row.destroy({ transaction });
        await this.record(user, 'device.deleted', id, transaction, { before: auditedDevice(row) });
      });
    } catch (error) {
      if (!(error instanceof ForeignKeyConstraintError)) throw error;
      const { where, hiddenCount } = await this.uses.findUses(user, id);
      throw new ConflictError('in_use', 'The device is still used by stages.', { where, hiddenCount });
    }
  }

  async setVerified(user: SessionUser, id: string, version: number, verified: boolean): Promise<LibraryDeviceDto> {
    await this.queue.transaction(async (transaction) => {
      const row = await this.get(id, transaction);
      const allowed = verified ? canVerifyDevice(user, row) : canEditDevice(user);
      if (!canEditDevice(user)) throw new ForbiddenError();
      if (!allowed) throw new ForbiddenError('Whoever entered or last edited the values cannot verify them.');
      await this.assertCurrent(user, row, version, transaction);
      row.set({
        verifiedById: verified ? user.id : null,
        verifiedAt: verified ? this.clock.now() : null,
        version: row.version + 1,
      });
      await row.save({ transaction });
      await this.record(user, verified ? 'device.verified' : 'device.verification_removed', id, transaction, {});
    });
    return this.findOne(user, id);
  }

  private async get(id: string, transaction: Transaction): Promise<Device> {
    const row = await this.devices.findByPk(id, { transaction });
    if (row === null) throw new NotFoundError();
    return row;
  }

  private async assertCurrent(
    user: SessionUser,
    row: Device,
    version: number,
    transaction: Transaction,
  ): Promise<void> {
    if (row.version !== version) throw new StaleVersionError(await this.findOne(user, row.id, transaction));
  }

  private async assertPartIsNew(
    partNumber: string,
    maker: string,
    ownId: string | null,
    transaction: Transaction,
  ): Promise<void> {
    const other = await this.devices.findOne({ where: { partNumber, maker }, attributes: ['id'], transaction });
    if (other === null || other.id === ownId) return;
    throw new ConflictError('already_exists', 'The library has this part number of this maker already.', {
      fieldErrors: [{ path: 'partNumber', code: 'already_exists', message: 'is in the library already' }],
    });
  }

  private record(
    user: SessionUser,
    action: string,
    entityId: string,
    transaction: Transaction,
    change: { before?: unknown; after?: unknown },
  ): Promise<void> {
    return this.audit.record(transaction, { actorId: user.id, action, entity: 'device', entityId, ...change });
  }
}

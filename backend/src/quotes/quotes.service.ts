import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { ForbiddenError, NotFoundError, StaleVersionError } from '../common/errors';
import type { SessionUser } from '../common/session-user';
import { WriteQueue } from '../database/write-queue';
import { DevicesService } from '../devices/devices.service';
import type { QuotedDeviceDto, SetQuoteDto } from './dto/set-quote.dto';
import { QuoteBreak } from './models/quote-break.model';
import { Quote } from './models/quote.model';
import { canSetQuote } from './quote.policy';

/** The quote of a device: one at a time, replaced as a whole. */
@Injectable()
export class QuotesService {
  constructor(
    @InjectModel(Quote) private readonly quotes: typeof Quote,
    @InjectModel(QuoteBreak) private readonly breaks: typeof QuoteBreak,
    private readonly devices: DevicesService,
    private readonly queue: WriteQueue,
    private readonly audit: AuditService,
  ) {}

  async set(user: SessionUser, deviceId: string, { version, ...quote }: SetQuoteDto): Promise<QuotedDeviceDto> {
    await this.queue.transaction(async (transaction) => {
      const { quote: before } = await this.getCurrent(user, deviceId, version, transaction);
      await this.write(user.id, deviceId, quote, transaction);
      const action = before ? 'quote.updated' : 'quote.created';
      await this.record(user, action, deviceId, transaction, { before, after: quote });
    });
    return this.devices.findOne(user, deviceId);
  }

  async remove(user: SessionUser, deviceId: string, version?: number): Promise<void> {
    await this.queue.transaction(async (transaction) => {
      const { quote: before } = await this.getCurrent(user, deviceId, version, transaction);
      if (!before) throw new NotFoundError();
      await this.quotes.destroy({ where: { deviceId }, transaction });
      await this.record(user, 'quote.deleted', deviceId, transaction, { before });
    });
  }

  /** The device with its quote, if `user` may change it and it is still as it was read. */
  private async getCurrent(
    user: SessionUser,
    deviceId: string,
    version: number | undefined,
    transaction: Transaction,
  ): Promise<QuotedDeviceDto> {
    const device = await this.devices.findOne(user, deviceId, transaction);
    if (!canSetQuote(user)) throw new ForbiddenError();
    if (version !== undefined && version !== device.quoteVersion) throw new StaleVersionError(device);
    return device;
  }

  private record(
    user: SessionUser,
    action: string,
    entityId: string,
    transaction: Transaction,
    change: { before?: unknown; after?: unknown },
  ): Promise<void> {
    return this.audit.record(transaction, { actorId: user.id, action, entity: 'quote', entityId, ...change });
  }

  private async write(
    userId: string,
    deviceId: string,
    dto: Omit<SetQuoteDto, 'version'>,
    transaction: Transaction,
  ): Promise<void> {
    const columns = {
      currency: dto.currency,
      reference: dto.reference ?? null,
      validUntil: dto.validUntil ?? null,
      supplier: dto.supplier ?? null,
      enteredById: userId,
    };
    const [row, created] = await this.quotes.findOrCreate({
      where: { deviceId },
      defaults: { deviceId, ...columns },
      transaction,
    });
    if (!created) await row.update({ ...columns, version: row.version + 1 }, { transaction });
    await this.breaks.destroy({ where: { quoteId: row.id }, transaction });
    await this.breaks.bulkCreate(
      dto.breaks.map(({ quantity, unitPriceMicros }) => ({ quoteId: row.id, quantity, unitPriceMicros })),
      { transaction },
    );
  }
}

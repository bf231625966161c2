import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { AuditService } from '../audit/audit.service';
import { ForbiddenError, NotFoundError } from '../common/errors';
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

  async set(user: SessionUser, deviceId: string, dto: SetQuoteDto): Promise<QuotedDeviceDto> {
    const { quote: before } = await this.devices.findOne(user, deviceId);
    if (!canSetQuote(user)) throw new ForbiddenError();
    await this.queue.transaction(async (transaction) => {
      await this.write(user.id, deviceId, dto, transaction);
      const action = before ? 'quote.updated' : 'quote.created';
      await this.audit.record(transaction, {
        actorId: user.id,
        action,
        entity: 'quote',
        entityId: deviceId,
        before,
        after: dto,
      });
    });
    return this.devices.findOne(user, deviceId);
  }

  async remove(user: SessionUser, deviceId: string): Promise<void> {
    const { quote: before } = await this.devices.findOne(user, deviceId);
    if (!canSetQuote(user)) throw new ForbiddenError();
    if (!before) throw new NotFoundError();
    await this.queue.transaction(async (transaction) => {
      await this.quotes.destroy({ where: { deviceId }, transaction });
      await this.audit.record(transaction, {
        actorId: user.id,
        action: 'quote.deleted',
        entity: 'quote',
        entityId: deviceId,
        before,
      });
    });
  }

  private async write(userId: string, deviceId: string, dto: SetQuoteDto, transaction: Transaction): Promise<void> {
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

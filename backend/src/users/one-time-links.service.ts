import { createHash, randomBytes } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import { Op, type Transaction } from 'sequelize';
import { Clock } from '../common/clock';
import { Runtime } from '../config/runtime';
import type { PasswordLinkDto } from './dto/user.dto';
import { OneTimeLink } from './models/one-time-link.model';

const TOKEN_BYTES = 32;
const HOUR_MS = 3_600_000;

function hashToken(token: string): string {
  return createHash('sha256').update(token).digest('hex');
}

/** Links with which a person chooses a password: shown once, stored as a hash, good once and for a limited time. */
@Injectable()
export class OneTimeLinksService {
  constructor(
    @InjectModel(OneTimeLink) private readonly links: typeof OneTimeLink,
    private readonly clock: Clock,
    private readonly runtime: Runtime,
  ) {}

  /** A new link; earlier ones of the same person stop working. */
  async create(userId: string, createdById: string, transaction: Transaction): Promise<PasswordLinkDto> {
    await this.removeAllOf(userId, transaction);
    const token = randomBytes(TOKEN_BYTES).toString('base64url');
    const expiresAt = new Date(this.clock.now().getTime() + this.runtime.config.linkValidHours * HOUR_MS);
    await this.links.create({ userId, createdById, tokenHash: hashToken(token), expiresAt }, { transaction });
    return { path: `/welcome/${token}`, expiresAt: expiresAt.toISOString() };
  }

  /** The person a link is for, while it is good. */
  async findUserId(token: string, transaction?: Transaction): Promise<string | null> {
    const link = await this.links.findOne({
      where: { tokenHash: hashToken(token), expiresAt: { [Op.gt]: this.clock.now() } },
      transaction,
    });
    return link?.userId ?? null;
  }

  async removeAllOf(userId: string, transaction: Transaction): Promise<void> {
    await this.links.destroy({ where: { userId }, transaction });
  }
}

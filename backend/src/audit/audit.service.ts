import { Injectable } from '@nestjs/common';
import { InjectModel } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import { Clock } from '../common/clock';
import { currentRequestId } from '../common/request-context';
import { AuditEvent } from './models/audit-event.model';

export interface AuditEntry {
  /** Who did it; null for the product itself (seeding). */
  readonly actorId: string | null;
  /** Verb in the past with its subject: `device.created`, `user.deactivated`. */
  readonly action: string;
  readonly entity: string;
  readonly entityId: string;
  readonly before?: unknown;
  readonly after?: unknown;
}

const SECRET_KEY = /password|token|secret|hash/i;

/** Drops everything that could open a door from what is put on record. */
export function withoutSecrets(value: unknown): unknown {
  if (Array.isArray(value)) return value.map(withoutSecrets);
  if (value === null || typeof value !== 'object' || value instanceof Date) return value;
  const kept = Object.entries(value).filter(([key]) => !SECRET_KEY.test(key));
  return Object.fromEntries(kept.map(([key, item]) => [key, withoutSecrets(item)]));
}

/** The trail of who changed what; written in the same transaction as the change. */
@Injectable()
export class AuditService {
  constructor(
    @InjectModel(AuditEvent) private readonly events: typeof AuditEvent,
    private readonly clock: Clock,
  ) {}

  async record(transaction: Transaction, entry: AuditEntry): Promise<void> {
    await this.events.create(
      {
        at: this.clock.now(),
        actorId: entry.actorId,
        action: entry.action,
        entity: entry.entity,
        entityId: entry.entityId,
        before: entry.before === undefined ? null : withoutSecrets(entry.before),
        after: entry.after === undefined ? null : withoutSecrets(entry.after),
        requestId: currentRequestId(),
      },
      { transaction },
    );
  }
}

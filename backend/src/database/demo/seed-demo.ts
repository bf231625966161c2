import { randomUUID } from 'node:crypto';
import type { INestApplicationContext } from '@nestjs/common';
import { getModelToken } from '@nestjs/sequelize';
import type { Transaction } from 'sequelize';
import type { ModelCtor } from 'sequelize-typescript';
import { AuditService } from '../../audit/audit.service';
import { DEFAULT_POLICY } from '../../calculator/engine';
import type { Specification } from '../../calculator/engine';
import { Chain } from '../../chains/models/chain.model';
import { Option } from '../../chains/models/option.model';
import { StageRow } from '../../chains/models/stage.model';
import { stageColumns } from '../../chains/stage-rows';
import { Clock } from '../../common/clock';
import { columnsOf } from '../../devices/device-columns';
import type { DeviceBodyDto } from '../../devices/dto/device-body.dto';
import { Device } from '../../devices/models/device.model';
import { ProjectMember } from '../../projects/models/project-member.model';
import { Project } from '../../projects/models/project.model';
import { QuoteBreak } from '../../quotes/models/quote-break.model';
import { Quote } from '../../quotes/models/quote.model';
import { AccountsService } from '../../users/accounts.service';
import { WriteQueue } from '../write-queue';
import { demoDevices, priceBreaks } from './device-bodies';
import { DEVICE_REMARKS } from './device-remarks';
import { PHOTODIODE_SPECIFICATION, photodiodeOptions } from './photodiode-chain';
import { RECEIVER_SPECIFICATION, receiverOptions } from './receiver-chain';
import type { DemoOption, DeviceIdOf } from './receiver-chain';
import { ANOUK, ILSE, RAFE, TEAM, TEO } from './team';

const DAY_MS = 86_400_000;
const USUAL_QUOTE_DAYS = 120;
/** When the lifecycles were looked up, in days before seeding. */
const LOOKED_UP_DAYS = -18;

/** Puts the invented team, its device library and its projects into an empty database: all of it or nothing. */
export async function seedDemo(app: INestApplicationContext): Promise<void> {
  const seeder = new DemoSeeder(app);
  await app.get(WriteQueue, { strict: false }).transaction((transaction) => seeder.run(transaction));
}

class DemoSeeder {
  private readonly today: Date;

  constructor(private readonly app: INestApplicationContext) {
    this.today = this.app.get(Clock, { strict: false }).now();
  }

  async run(transaction: Transaction): Promise<void> {
    const accounts = this.app.get(AccountsService, { strict: false });
    for (const account of TEAM) await accounts.createDemoAccount(account, transaction);
    const idOf = await this.createDevices(transaction);
    const pw5 = await this.createProject(transaction, [ILSE.id, TEO.id, ANOUK.id, RAFE.id], {
      code: 'PW-5',
      name: 'Thickness receiver',
      description: 'Pellworth Inspection: ultrasonic thickness receiver, 500 a year in lots of 250, board 70 × 30 mm.',
      open: true,
      buildQuantity: 250,
    });
    await this.createChain(transaction, pw5, 'Receive chain', RECEIVER_SPECIFICATION, receiverOptions(idOf));
    const closed = await this.createProject(transaction, [TEO.id, RAFE.id], {
      code: 'PW-8',
      name: 'Coating gauge study',
      description: 'Not announced yet: members only.',
      open: false,
      buildQuantity: 100,
    });
    await this.createChain(
      transaction,
      closed,
      'Photodiode channel',
      PHOTODIODE_SPECIFICATION,
      photodiodeOptions(idOf),
    );
    await this.app.get(AuditService, { strict: false }).record(transaction, {
      actorId: null,
      action: 'demo.seeded',
      entity: 'project',
      entityId: pw5,
    });
  }

  private model<T extends ModelCtor>(model: T): T {
    return this.app.get<T>(getModelToken(model), { strict: false });
  }

  private plainDate(days: number): string {
    return new Date(this.today.getTime() + days * DAY_MS).toISOString().slice(0, 10);
  }

  private async createDevices(transaction: Transaction): Promise<DeviceIdOf> {
    const devices = demoDevices().map((device, index) => ({ id: randomUUID(), index, ...device }));
    await this.model(Device).bulkCreate(
      devices.map(({ id, index, part, body }) => ({ id, ...this.deviceColumns(part, body, index) })),
      { transaction },
    );
    for (const { id, part, price } of devices) {
      if (price !== undefined) await this.createQuote(transaction, id, part, price);
    }
    const ids = new Map(devices.map(({ id, part }) => [part, id]));
    return (part) => {
      const id = ids.get(part);
      if (id === undefined) throw new Error(`The demo's library has no ${part}.`);
      return id;
    };
  }

  private deviceColumns(part: string, body: Readonly<Record<string, unknown>>, index: number) {
    const remark = DEVICE_REMARKS[part] ?? {};
    const enteredById = index % 3 === 0 ? TEO.id : ILSE.id;
    const verified = remark.unverified ? null : enteredById === ILSE.id ? TEO.id : ILSE.id;
    const columns = columnsOf({
      ...body,
      lifecycle: remark.lifecycle ?? 'active',
      lifecycleDate: this.plainDate(LOOKED_UP_DAYS),
      datasheet: { revision: `Rev. ${'ABCDE'[index % 5]}` },
      ...(remark.notes ? { notes: remark.notes } : {}),
    } as unknown as DeviceBodyDto);
    return {
      ...columns,
      enteredById,
      valuesEditedById: enteredById,
      verifiedById: verified,
      verifiedAt: verified === null ? null : this.today,
    };
  }

  private async createQuote(transaction: Transaction, deviceId: string, part: string, price: number): Promise<void> {
    const { quoteDays = USUAL_QUOTE_DAYS, breaks } = DEVICE_REMARKS[part] ?? {};
    const quoteId = randomUUID();
    await this.model(Quote).create(
      {
        id: quoteId,
        deviceId,
        currency: 'USD',
        reference: `Q-${part.slice(5)}`,
        validUntil: this.plainDate(quoteDays),
        supplier: 'Harrow & Finch Components',
        enteredById: ANOUK.id,
      },
      { transaction },
    );
    await this.model(QuoteBreak).bulkCreate(
      priceBreaks(price, breaks).map((step) => ({ quoteId, ...step })),
      { transaction },
    );
  }

  private async createProject(
    transaction: Transaction,
    memberIds: readonly string[],
    fields: Readonly<Record<string, unknown>>,
  ): Promise<string> {
    const project = await this.model(Project).create(
      { ...fields, currency: 'USD', policy: DEFAULT_POLICY },
      { transaction },
    );
    const members = memberIds.map((userId) => ({ projectId: project.id, userId }));
    await this.model(ProjectMember).bulkCreate(members, { transaction });
    return project.id;
  }

  private async createChain(
    transaction: Transaction,
    projectId: string,
    name: string,
    specification: Specification,
    options: readonly DemoOption[],
  ): Promise<void> {
    const chain = await this.model(Chain).create({ projectId, name, specification }, { transaction });
    for (const [position, option] of options.entries()) {
      const row = await this.model(Option).create({ chainId: chain.id, name: option.name, position }, { transaction });
      const stages = option.stages.map((stage, index) => ({ ...stageColumns(row.id, stage, index) }));
      await this.model(StageRow).bulkCreate(stages, { transaction });
    }
  }
}

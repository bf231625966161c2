import { Global, Module } from '@nestjs/common';
import { SequelizeModule } from '@nestjs/sequelize';
import { AuditService } from './audit.service';
import { AuditEvent } from './models/audit-event.model';

/** Global: every feature that writes puts it on record. */
@Global()
@Module({
  imports: [SequelizeModule.forFeature([AuditEvent])],
  providers: [AuditService],
  exports: [AuditService],
})
export class AuditModule {}

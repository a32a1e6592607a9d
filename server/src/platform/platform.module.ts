import { Global, Module } from '@nestjs/common';
import { EventEmitterModule } from '@nestjs/event-emitter';
import { ScheduleModule } from '@nestjs/schedule';
import { AuditLog } from './audit-log/audit-log.js';
import { Clock } from './clock/clock.js';
import { CONFIGURATION, readConfiguration } from './config/configuration.js';
import { UnitOfWork } from './database/unit-of-work.js';
import { HealthController } from './http/health.controller.js';
import { Outbox } from './mail/outbox.js';
import { ObjectStore } from './storage/object-store.js';

const configuration = { provide: CONFIGURATION, useFactory: () => readConfiguration(process.env) };

/** What every domain stands on; it knows none of them. */
@Global()
@Module({
  imports: [EventEmitterModule.forRoot(), ScheduleModule.forRoot()],
  controllers: [HealthController],
  providers: [configuration, Clock, AuditLog, UnitOfWork, Outbox, ObjectStore],
  exports: [configuration, Clock, AuditLog, UnitOfWork, Outbox, ObjectStore],
})
export class PlatformModule {}

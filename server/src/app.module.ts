import { Module, type DynamicModule } from '@nestjs/common';
import { APP_FILTER, APP_GUARD } from '@nestjs/core';
import { TypeOrmModule } from '@nestjs/typeorm';
import { PeopleModule } from './people/people.module.js';
import { CasesModule } from './cases/cases.module.js';
import { ReportsModule } from './reports/reports.module.js';
import { FindingsModule } from './findings/findings.module.js';
import { DifferentialModule } from './differential/differential.module.js';
import { PlansModule } from './plans/plans.module.js';
import { SummariesModule } from './summaries/summaries.module.js';
import { OutcomesModule } from './outcomes/outcomes.module.js';
import { ExportsModule } from './exports/exports.module.js';
import { LiveModule } from './live/live.module.js';
import { AuditModule } from './audit/audit.module.js';
import { TodayModule } from './today/today.module.js';
import { entities } from './entities.js';
import { type Configuration, CONFIGURATION } from './platform/config/configuration.js';
import { databaseOptions } from './platform/database/database-options.js';
import { ErrorFilter } from './platform/errors/error.filter.js';
import { AccessGuard } from './platform/http/access.guard.js';
import { PlatformModule } from './platform/platform.module.js';

const database: DynamicModule = TypeOrmModule.forRootAsync({
  inject: [CONFIGURATION],
  useFactory: (configuration: Configuration) => databaseOptions(configuration.DATABASE_URL, entities),
});

@Module({
  imports: [
    PlatformModule,
    database,
    PeopleModule,
    CasesModule,
    ReportsModule,
    FindingsModule,
    DifferentialModule,
    PlansModule,
    SummariesModule,
    OutcomesModule,
    ExportsModule,
    LiveModule,
    AuditModule,
    TodayModule,
  ],
  providers: [
    { provide: APP_FILTER, useClass: ErrorFilter },
    { provide: APP_GUARD, useClass: AccessGuard },
  ],
})
export class AppModule {}

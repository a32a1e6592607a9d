import { Module } from '@nestjs/common';
import { CasesModule } from '../cases/cases.module.js';
import { DifferentialModule } from '../differential/differential.module.js';
import { PlansModule } from '../plans/plans.module.js';
import { ExportController } from './export.controller.js';
import { ExportReader } from './export-facts.js';
import { ExportService } from './export.service.js';

/** Takes a case out of the application, for paper and for other systems. */
@Module({
  imports: [CasesModule, DifferentialModule, PlansModule],
  controllers: [ExportController],
  providers: [ExportReader, ExportService],
})
export class ExportsModule {}

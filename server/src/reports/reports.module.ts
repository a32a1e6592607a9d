import { Module, type OnModuleInit } from '@nestjs/common';
import { CaseFacts } from '../cases/case-facts.js';
import { CasesModule } from '../cases/cases.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ReportContent } from './report-content.service.js';
import { ReportDirectory } from './report-directory.js';
import { ReportRegister } from './report-register.js';
import { ReportRemoval } from './report-removal.service.js';
import { ReportUploads } from './report-uploads.service.js';
import { ReportUses } from './report-uses.js';
import { ReportsController } from './reports.controller.js';
import { ReportsService } from './reports.service.js';

/** Uploaded files of a case. */
@Module({
  imports: [PeopleModule, CasesModule],
  controllers: [ReportsController],
  providers: [
    ReportContent,
    ReportDirectory,
    ReportRegister,
    ReportRemoval,
    ReportUploads,
    ReportUses,
    ReportsService,
  ],
  exports: [ReportDirectory, ReportUploads, ReportUses],
})
export class ReportsModule implements OnModuleInit {
  constructor(
    private readonly facts: CaseFacts,
    private readonly reports: ReportDirectory,
  ) {}

  onModuleInit(): void {
    this.facts.register('reports', (caseId) => this.reports.count(caseId));
  }
}

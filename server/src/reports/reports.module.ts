import { Module, type OnModuleInit } from '@nestjs/common';
import { CaseFacts } from '../cases/case-facts.js';
import { CasesModule } from '../cases/cases.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ReportDirectory } from './report-directory.js';

@Module({
  imports: [PeopleModule, CasesModule],
  providers: [ReportDirectory],
  exports: [ReportDirectory],
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

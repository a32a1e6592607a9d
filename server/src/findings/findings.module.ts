import { Module, type OnModuleInit } from '@nestjs/common';
import { CaseFacts } from '../cases/case-facts.js';
import { CasesModule } from '../cases/cases.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ReportsModule } from '../reports/reports.module.js';
import { CandidateChanges } from './candidate-changes.service.js';
import { CandidatesService } from './candidates.service.js';
import { FindingsService } from './findings.service.js';
import { SettingsService } from './settings.service.js';

@Module({
  imports: [PeopleModule, CasesModule, ReportsModule],
  providers: [CandidatesService, CandidateChanges, FindingsService, SettingsService],
  exports: [CandidatesService, FindingsService, SettingsService],
})
export class FindingsModule implements OnModuleInit {
  constructor(
    private readonly facts: CaseFacts,
    private readonly candidates: CandidatesService,
    private readonly findings: FindingsService,
  ) {}

  onModuleInit(): void {
    this.facts.register('candidates', (caseId) => this.candidates.count(caseId));
    this.facts.register('findings', (caseId) => this.findings.count(caseId));
  }
}

import { Module, type OnModuleInit } from '@nestjs/common';
import { CaseFacts } from '../cases/case-facts.js';
import { CasesModule } from '../cases/cases.module.js';
import { PeopleModule } from '../people/people.module.js';
import { ReportUses } from '../reports/report-uses.js';
import { ReportsModule } from '../reports/reports.module.js';
import { CandidateChanges } from './candidate-changes.service.js';
import { CandidatesController } from './candidates.controller.js';
import { CandidatesService } from './candidates.service.js';
import { ChangeSettingsService } from './change-settings.service.js';
import { FindingChanges } from './finding-changes.service.js';
import { FindingsController } from './findings.controller.js';
import { FindingsService } from './findings.service.js';
import { reportIsInFindings } from './report-in-findings.js';
import { SettingsController } from './settings.controller.js';
import { SettingsService } from './settings.service.js';
import { SettingsWriter } from './settings-writer.js';

/** The rows and columns of the ledger: findings, candidates, and how they are to be read. */
@Module({
  imports: [PeopleModule, CasesModule, ReportsModule],
  controllers: [CandidatesController, FindingsController, SettingsController],
  providers: [
    CandidatesService,
    CandidateChanges,
    FindingsService,
    FindingChanges,
    SettingsService,
    ChangeSettingsService,
    SettingsWriter,
  ],
  exports: [
    CandidatesService,
    CandidateChanges,
    FindingsService,
    FindingChanges,
    SettingsService,
    ChangeSettingsService,
  ],
})
export class FindingsModule implements OnModuleInit {
  constructor(
    private readonly facts: CaseFacts,
    private readonly uses: ReportUses,
    private readonly candidates: CandidatesService,
    private readonly findings: FindingsService,
  ) {}

  onModuleInit(): void {
    this.facts.register('candidates', (caseId) => this.candidates.count(caseId));
    this.facts.register('findings', (caseId) => this.findings.count(caseId));
    this.facts.register('pending', (caseId) => this.findings.countPending(caseId));
    this.uses.register(reportIsInFindings);
  }
}

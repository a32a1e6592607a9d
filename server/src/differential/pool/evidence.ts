import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { CandidatesService } from '../../findings/candidates.service.js';
import { FindingsService } from '../../findings/findings.service.js';
import { SettingsService } from '../../findings/settings.service.js';
import type { CasePool } from './case-pool.js';

/** Columns, rows and settings of a case. */
@Injectable()
export class Evidence {
  constructor(
    private readonly candidates: CandidatesService,
    private readonly findings: FindingsService,
    private readonly settings: SettingsService,
  ) {}

  async read(
    caseId: string,
    em: EntityManager,
  ): Promise<Pick<CasePool, 'candidates' | 'findings' | 'settings'>> {
    return {
      candidates: await this.candidates.inForce(caseId, em),
      findings: await this.findings.all(caseId, em),
      settings: await this.settings.read(caseId, em),
    };
  }
}

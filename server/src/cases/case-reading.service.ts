import { Injectable } from '@nestjs/common';
import type { Case } from '@weighhouse/shared/contracts/cases';
import type { Actor } from '../platform/http/actor.js';
import { CaseAccess } from './case-access.js';
import { CaseViews } from './case-views.js';

/** One case, for somebody on it. */
@Injectable()
export class CaseReadingService {
  constructor(
    private readonly access: CaseAccess,
    private readonly views: CaseViews,
  ) {}

  async read(actor: Actor, caseId: string): Promise<Case> {
    const opened = await this.access.open(actor, caseId, 'case.read');
    return this.views.view(actor, opened);
  }
}

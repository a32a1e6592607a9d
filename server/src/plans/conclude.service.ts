import { Injectable } from '@nestjs/common';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { CaseAccess } from '../cases/case-access.js';
import { PasswordsService } from '../people/passwords.service.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import type { Actor } from '../platform/http/actor.js';
import { ConcludeCase } from './conclude-case.js';
import { PlanPages } from './plan-pages.service.js';

/** The chair signs the plan and with it closes the case. */
@Injectable()
export class ConcludeService {
  constructor(
    private readonly access: CaseAccess,
    private readonly passwords: PasswordsService,
    private readonly work: UnitOfWork,
    private readonly conclusion: ConcludeCase,
    private readonly pages: PlanPages,
  ) {}

  /**
   * @throws Refusal wrong-password; not-ready with everything that is missing; round-open while a round is sealed
   */
  async conclude(actor: Actor, caseId: string, password: string): Promise<PlanView> {
    await this.access.open(actor, caseId, 'plan.conclude');
    // Before the transaction: checking a password takes long on purpose, and would hold the case's row.
    await this.passwords.confirm(actor, password);
    await this.work.run((work) => this.conclusion.run(actor, caseId, work));
    return this.pages.read(actor, caseId);
  }
}

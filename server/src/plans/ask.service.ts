import { Injectable } from '@nestjs/common';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { notReady } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { Asking } from './asking.js';
import { missingInPlan } from './missing-to-conclude.js';
import { PlanPages } from './plan-pages.service.js';
import { PlanReader } from './plan-reader.js';

/** The chair asks the contributors for agreement or dissent. */
@Injectable()
export class AskService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly plans: PlanReader,
    private readonly asking: Asking,
    private readonly changes: CaseChanges,
    private readonly pages: PlanPages,
  ) {}

  /** @throws Refusal not-ready with what the plan's text still needs: nobody can agree with half of one */
  async ask(actor: Actor, caseId: string): Promise<PlanView> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'plan.ask', work.em);
      const draft = await this.plans.draft(caseId, work.em);
      const missing = missingInPlan(draft);
      if (!draft || missing.length > 0) throw notReady(missing);
      const asked = await this.asking.ask(work.em, file, draft);
      const people = asked === 1 ? 'one contributor' : `${String(asked)} contributors`;
      await this.changes.commit(work, file, 'plan', {
        actorId: actor.id,
        action: 'plan.asked',
        sentence: `asked ${people} for agreement or dissent`,
      });
    });
    return this.pages.read(actor, caseId);
  }
}

import { Injectable } from '@nestjs/common';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { PlanPages } from './plan-pages.service.js';
import { PlanReader } from './plan-reader.js';
import { PlanStance } from './plan-stance.entity.js';

/** Contributors agree with the draft or put their dissent on the record. */
@Injectable()
export class StancesService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly plans: PlanReader,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
    private readonly pages: PlanPages,
  ) {}

  /**
   * May be changed until the plan is signed; what was said before is kept.
   * @param dissent the words that stand in the plan; null to agree
   * @throws Refusal wrong-state where no plan is drafted
   */
  async give(actor: Actor, caseId: string, dissent: string | null): Promise<PlanView> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'plan.stance', work.em);
      const plan = await this.plans.draftRow(caseId, work.em);
      if (!plan) throw noDraft();
      await work.em.insert(PlanStance, {
        planId: plan.id,
        personId: actor.id,
        stance: dissent === null ? 'agree' : 'dissent',
        words: dissent,
        at: this.clock.now(),
      });
      await this.changes.commit(work, file, 'plan', {
        actorId: actor.id,
        action: dissent === null ? 'plan.agreed' : 'plan.dissented',
        sentence: dissent === null ? 'agreed with the plan' : 'put dissent against the plan on the record',
      });
    });
    return this.pages.read(actor, caseId);
  }
}

export const noDraft = (): Refusal =>
  new Refusal('wrong-state', 'There is no plan to speak of yet. The chair writes it first.');

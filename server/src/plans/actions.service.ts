import { Injectable } from '@nestjs/common';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { type EntityManager, IsNull } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { CaseDirectory } from '../cases/case-directory.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { notFound, Refusal, wrongPart } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { PlanActionRow } from './plan-action.entity.js';
import { PlanPages } from './plan-pages.service.js';
import { PlanRow } from './plan.entity.js';

const nothingToSee: PlanView = { draft: null, signed: [], missing: [], abilities: [] };

/** Owners report what they did. */
@Injectable()
export class ActionsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly cases: CaseDirectory,
    private readonly work: UnitOfWork,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
    private readonly pages: PlanPages,
  ) {}

  /**
   * Marks an action as done, once. Owners keep their actions, also when they leave the team or the case is withdrawn.
   * @returns the case's plans, to owners who may read them
   * @throws Refusal not-found, forbidden to others on the case, wrong-state when it is a draft's or done already
   */
  async done(actor: Actor, actionId: string, words: string): Promise<PlanView> {
    const caseId = await this.work.run(async (work) => {
      const { action, plan } = await this.own(actor, actionId, work.em);
      const file = await this.cases.lock(plan.caseId, work.em);
      if (!file) throw notFound();
      if (plan.signedAt === null)
        throw new Refusal('wrong-state', 'The plan is a draft; its actions begin with its signature.');
      const written = await work.em.update(
        PlanActionRow,
        { id: action.id, doneAt: IsNull() },
        { doneAt: this.clock.now(), doneById: actor.id, doneWords: words },
      );
      if (written.affected !== 1) throw new Refusal('wrong-state', 'This action is done already.');
      await this.changes.commit(work, file, 'plan', {
        actorId: actor.id,
        action: 'action.done',
        sentence: `reported an action of plan ${String(plan.number)} done`,
      });
      return plan.caseId;
    });
    return this.pages.read(actor, caseId).catch((error: unknown) => {
      if (error instanceof Refusal) return nothingToSee;
      throw error;
    });
  }

  private async own(
    actor: Actor,
    actionId: string,
    em: EntityManager,
  ): Promise<{ action: PlanActionRow; plan: PlanRow }> {
    const action = await em.findOneBy(PlanActionRow, { id: actionId });
    const plan = action && (await em.findOneBy(PlanRow, { id: action.planId }));
    if (!plan) throw notFound();
    if (action.ownerId === actor.id) return { action, plan };
    await this.access.open(actor, plan.caseId, 'plan.read', em);
    throw wrongPart();
  }
}

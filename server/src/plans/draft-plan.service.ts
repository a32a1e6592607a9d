import { Injectable } from '@nestjs/common';
import type { PlanInput, PlanView } from '@weighhouse/shared/contracts/plans';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { stale } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { DraftWriter } from './draft-writer.js';
import { PlanPages } from './plan-pages.service.js';
import { PlanReader } from './plan-reader.js';

/** The chair writes what the panel shall agree on. */
@Injectable()
export class DraftPlanService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly plans: PlanReader,
    private readonly writer: DraftWriter,
    private readonly changes: CaseChanges,
    private readonly pages: PlanPages,
  ) {}

  /**
   * Saves the whole draft; what contributors said of an older text stays and is marked.
   * @throws Refusal stale with the draft as it stands; invalid with every reference that leads nowhere
   */
  async save(actor: Actor, caseId: string, input: PlanInput): Promise<PlanView> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'plan.write', work.em);
      const draft = await this.plans.draft(caseId, work.em);
      if ((draft?.version ?? 0) !== input.version) throw stale(draft);
      await this.writer.check(work.em, caseId, draft, input);
      if (draft) await this.writer.change(work.em, draft, actor.id, input);
      else {
        const number = (await this.plans.signedCount(caseId, work.em)) + 1;
        await this.writer.begin(work.em, caseId, number, actor.id, input);
      }
      // A draft is saved as it is typed: only its beginning is worth a line.
      const line = { actorId: actor.id, action: 'plan.begun', sentence: 'began the plan' };
      await this.changes.commit(work, file, 'plan', draft ? [] : [line]);
    });
    return this.pages.read(actor, caseId);
  }
}

import { Injectable } from '@nestjs/common';
import type { PlanView } from '@weighhouse/shared/contracts/plans';
import { CaseAccess } from '../cases/case-access.js';
import type { Actor } from '../platform/http/actor.js';
import { Conclusion } from './conclusion.js';
import { PlanReader } from './plan-reader.js';

const inWork: readonly string[] = ['accepted', 'judging'];

/** The plans of a case as its team sees them. */
@Injectable()
export class PlanPages {
  constructor(
    private readonly access: CaseAccess,
    private readonly plans: PlanReader,
    private readonly conclusion: Conclusion,
  ) {}

  async read(actor: Actor, caseId: string): Promise<PlanView> {
    const { file, abilities } = await this.access.open(actor, caseId, 'plan.read');
    const draft = inWork.includes(file.state) ? await this.plans.draft(caseId) : null;
    return {
      draft,
      signed: await this.plans.signed(caseId),
      missing: inWork.includes(file.state) ? await this.conclusion.missing(caseId, draft) : [],
      abilities: abilities.filter(
        (action) =>
          action.startsWith('plan.') && (draft !== null || !['plan.ask', 'plan.stance'].includes(action)),
      ),
    };
  }
}

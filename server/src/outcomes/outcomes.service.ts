import { Injectable } from '@nestjs/common';
import type { Outcome, OutcomeInput } from '@weighhouse/shared/contracts/outcomes';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { invalid } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { OutcomeRegister } from './outcome-register.js';

/** What the illness turned out to be. */
@Injectable()
export class OutcomesService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly outcomes: OutcomeRegister,
    private readonly changes: CaseChanges,
  ) {}

  /** @returns null while it is not known */
  async read(actor: Actor, caseId: string): Promise<Outcome | null> {
    await this.access.open(actor, caseId, 'outcome.read');
    return this.outcomes.last(caseId);
  }

  /** Records it once, for good; a reopened case gets another one when it is closed again. */
  async record(actor: Actor, caseId: string, input: OutcomeInput): Promise<Outcome | null> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'outcome.record', work.em);
      const faults = await this.outcomes.faults(work.em, caseId, input);
      if (faults.length > 0) throw invalid(faults);
      await this.outcomes.add(work.em, caseId, actor.id, input);
      const line = { actorId: actor.id, action: 'case.outcomeKnown', sentence: 'recorded the outcome' };
      await this.changes.commit(work, file, 'outcome', line, { state: 'outcomeKnown' });
    });
    return this.outcomes.last(caseId);
  }
}

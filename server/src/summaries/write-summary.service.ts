import { Injectable } from '@nestjs/common';
import type { Summary, SummaryInput } from '@weighhouse/shared/contracts/summaries';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { invalid, Refusal, stale } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { SummaryLetters } from './summary-letters.js';
import { SummaryPages } from './summary-pages.service.js';
import { SummaryReader } from './summary-reader.js';
import { SummaryWriter } from './summary-writer.js';

/** The liaison puts the plan into the patient's words. */
@Injectable()
export class WriteSummaryService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly summaries: SummaryReader,
    private readonly writer: SummaryWriter,
    private readonly changes: CaseChanges,
    private readonly letters: SummaryLetters,
    private readonly pages: SummaryPages,
  ) {}

  /**
   * Saves the text, and hands it to the chair when it is ready.
   * @throws Refusal stale with the summary as it stands; wrong-state once it has been told
   */
  async save(actor: Actor, caseId: string, input: SummaryInput): Promise<Summary> {
    const saved = await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'summary.write', work.em);
      const { plan, row } = await this.summaries.current(caseId, work.em);
      if (!plan) throw nothingSigned();
      if (row?.state === 'told')
        throw new Refusal('wrong-state', 'The patient has been told from this text; it stays as it is.');
      if (input.ready === true && input.body === '')
        throw invalid([{ path: 'body', message: 'must not be empty' }]);
      const where = { caseId, planNumber: plan.number };
      if (!(await this.writer.save(work.em, where, row, input))) return false;
      const handedIn = {
        actorId: actor.id,
        action: 'summary.ready',
        sentence: 'handed the summary to the chair',
      };
      const withdrawn = {
        actorId: actor.id,
        action: 'summary.rewritten',
        sentence: 'changed the approved summary, which waits for approval again',
      };
      if (input.ready === true) await this.letters.askToApprove(work.em, file);
      const lines = [
        ...(row?.state === 'approved' ? [withdrawn] : []),
        ...(input.ready === true ? [handedIn] : []),
      ];
      await this.changes.commit(work, file, 'summary', lines);
      return true;
    });
    const now = await this.pages.read(actor, caseId);
    if (!saved) throw stale(now);
    return now;
  }
}

export const nothingSigned = (): Refusal =>
  new Refusal('wrong-state', 'No plan is signed yet, so there is nothing to tell.');

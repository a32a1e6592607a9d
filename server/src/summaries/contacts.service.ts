import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { ContactInput, Summary } from '@weighhouse/shared/contracts/summaries';
import type { EntityManager } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { invalid, Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { ContactRow } from './contact.entity.js';
import { SummaryPages } from './summary-pages.service.js';
import { SummaryReader } from './summary-reader.js';
import { SummaryWriter } from './summary-writer.js';

/** Clocks of browsers may be a little fast. */
const allowedAheadMs = 5 * 60_000;

/** The liaison tells the patient, and keeps the log of contacts. */
@Injectable()
export class ContactsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly summaries: SummaryReader,
    private readonly writer: SummaryWriter,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
    private readonly pages: SummaryPages,
  ) {}

  /** Logs an attempt or a contact in which the summary was not told. */
  async log(actor: Actor, caseId: string, input: ContactInput): Promise<Summary> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'summary.tell', work.em);
      await this.add(work.em, actor, caseId, input, null);
      const sentence = input.reached
        ? 'logged a contact with the patient'
        : 'logged an attempt to reach the patient';
      await this.changes.commit(work, file, 'summary', {
        actorId: actor.id,
        action: 'contact.logged',
        sentence,
      });
    });
    return this.pages.read(actor, caseId);
  }

  /**
   * The contact in which the approved summary was told.
   * @throws Refusal wrong-state before the chair has approved; invalid when the patient was not reached
   */
  async tell(actor: Actor, caseId: string, input: ContactInput): Promise<Summary> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'summary.tell', work.em);
      const { plan, row } = await this.summaries.current(caseId, work.em);
      if (!plan || !row || (row.state !== 'approved' && row.state !== 'told'))
        throw new Refusal('wrong-state', 'The chair has not approved the summary yet.');
      if (!input.reached)
        throw invalid([{ path: 'reached', message: 'must be true: log an attempt without telling instead' }]);
      await this.add(work.em, actor, caseId, input, plan.number);
      await this.writer.markTold(work.em, row, new Date(input.at));
      const line = { actorId: actor.id, action: 'summary.told', sentence: 'told the patient the summary' };
      await this.changes.commit(work, file, 'summary', line);
    });
    return this.pages.read(actor, caseId);
  }

  private async add(
    em: EntityManager,
    actor: Actor,
    caseId: string,
    input: ContactInput,
    toldPlanNumber: number | null,
  ): Promise<void> {
    const now = this.clock.now();
    const at = new Date(input.at);
    if (at.getTime() > now.getTime() + allowedAheadMs)
      throw invalid([{ path: 'at', message: 'must not be in the future' }]);
    await em.insert(ContactRow, {
      id: randomUUID(),
      caseId,
      at,
      how: input.how,
      reached: input.reached,
      understood: input.understood ?? null,
      questions: input.questions ?? '',
      notes: input.notes ?? '',
      toldPlanNumber,
      byId: actor.id,
      recordedAt: now,
    });
  }
}

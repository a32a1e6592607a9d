import { Injectable } from '@nestjs/common';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import { DataSource, type EntityManager, In } from 'typeorm';
import { CandidatesService } from '../findings/candidates.service.js';
import { PlanReader } from '../plans/plan-reader.js';
import { ContactRow } from './contact.entity.js';
import { draftSummary } from './summary-text.js';
import { SummaryRow } from './summary.entity.js';

/** The summary that counts now: the one of the plan signed last. */
export interface CurrentSummary {
  plan: Plan | null;
  /** Null before the liaison has saved anything. */
  row: SummaryRow | null;
  /** What is saved, or else the text made from the plan. */
  body: string;
}

/** Reads summaries and contacts, without a check of who asks. */
@Injectable()
export class SummaryReader {
  constructor(
    private readonly source: DataSource,
    private readonly plans: PlanReader,
    private readonly candidates: CandidatesService,
  ) {}

  async current(caseId: string, em: EntityManager = this.source.manager): Promise<CurrentSummary> {
    const plan = await this.plans.lastSigned(caseId, em);
    if (!plan) return { plan: null, row: null, body: '' };
    const row = await em.findOneBy(SummaryRow, { caseId, planNumber: plan.number });
    return {
      plan,
      row,
      body: row?.body ?? draftSummary(plan, await this.shareOf(caseId, plan, em), dayInWords),
    };
  }

  /** The contact log of a case, first to last. */
  async contacts(caseId: string, em: EntityManager = this.source.manager): Promise<ContactRow[]> {
    return em.find(ContactRow, { where: { caseId }, order: { at: 'ASC', recordedAt: 'ASC' } });
  }

  /** Summaries and the number of contacts of several cases, for lists. */
  async ofCases(caseIds: readonly string[]): Promise<{ rows: SummaryRow[]; contacts: Map<string, number> }> {
    if (caseIds.length === 0) return { rows: [], contacts: new Map() };
    const { manager } = this.source;
    const rows = await manager.findBy(SummaryRow, { caseId: In([...caseIds]) });
    const contacts = await manager.find(ContactRow, {
      where: { caseId: In([...caseIds]) },
      select: { id: true, caseId: true },
    });
    const counts = new Map<string, number>();
    for (const { caseId } of contacts) counts.set(caseId, (counts.get(caseId) ?? 0) + 1);
    return { rows, contacts: counts };
  }

  /** Where the panel stood on the working diagnosis when the plan was signed, where it is one of the candidates. */
  private async shareOf(caseId: string, plan: Plan, em: EntityManager): Promise<number | null> {
    if (plan.candidateId === null) return null;
    const candidate = (await this.candidates.all(caseId, em)).find(({ id }) => id === plan.candidateId);
    return plan.standing?.find(({ name }) => name === candidate?.name)?.share ?? null;
  }
}

const longDay = new Intl.DateTimeFormat('en-GB', { dateStyle: 'long', timeZone: 'UTC' });

/** @param day YYYY-MM-DD, a calendar day without a time zone */
const dayInWords = (day: string): string => longDay.format(new Date(`${day}T00:00:00Z`));

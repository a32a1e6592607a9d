import { Injectable } from '@nestjs/common';
import type { CaseState } from '@weighhouse/shared/contracts/cases';
import type { TellList } from '@weighhouse/shared/contracts/summaries';
import { CaseDirectory } from '../cases/case-directory.js';
import type { Actor } from '../platform/http/actor.js';
import { PlanReader } from '../plans/plan-reader.js';
import { SummaryReader } from './summary-reader.js';

const underWay: readonly CaseState[] = ['accepted', 'judging', 'concluded', 'outcomeKnown'];

/** What a liaison has to tell: numbers, and how far each is. */
@Injectable()
export class TellListService {
  constructor(
    private readonly cases: CaseDirectory,
    private readonly plans: PlanReader,
    private readonly summaries: SummaryReader,
  ) {}

  /** The cases of which the person is the liaison, the one that has waited longest first. */
  async list(actor: Pick<Actor, 'id'>): Promise<TellList> {
    const own = (await this.cases.ofPerson(actor.id)).filter(
      ({ file, parts }) => parts.includes('liaison') && underWay.includes(file.state),
    );
    const ids = own.map(({ file }) => file.id);
    const lastPlans = await this.plans.lastSignedOf(ids);
    const { rows, contacts } = await this.summaries.ofCases(ids);
    const items = own.map(({ file }) => {
      const plan = lastPlans.get(file.id);
      const row = rows.find(({ caseId, planNumber }) => caseId === file.id && planNumber === plan?.number);
      return {
        caseId: file.id,
        number: file.number,
        state: plan ? (row?.state ?? ('draft' as const)) : ('none' as const),
        hasPlan: plan !== undefined,
        since: (row?.approvedAt ?? plan?.signedAt ?? file.acceptedAt ?? file.createdAt).toISOString(),
        attempts: contacts.get(file.id) ?? 0,
      };
    });
    return { items: items.sort((one, other) => one.since.localeCompare(other.since)) };
  }
}

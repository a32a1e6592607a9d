import { Injectable } from '@nestjs/common';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import { CaseAccess } from '../cases/case-access.js';
import { PeopleDirectory } from '../people/people-directory.js';
import type { Actor } from '../platform/http/actor.js';
import { SummaryReader } from './summary-reader.js';
import { summaryView } from './summary-view.js';

/** The summary as the team sees it. For a liaison it is the only page of the case. */
@Injectable()
export class SummaryPages {
  constructor(
    private readonly access: CaseAccess,
    private readonly summaries: SummaryReader,
    private readonly people: PeopleDirectory,
  ) {}

  async read(actor: Actor, caseId: string): Promise<Summary> {
    const opened = await this.access.open(actor, caseId, 'summary.read');
    const current = await this.summaries.current(caseId);
    // Contributors need to know what is told, not how the patient was reached.
    const seesContacts = opened.parts.some((part) => part !== 'contributor');
    const contacts = seesContacts ? await this.summaries.contacts(caseId) : [];
    const approver = current.row?.approvedById ?? null;
    const people = await this.people.byIds([
      ...contacts.map((contact) => contact.byId),
      ...(approver === null ? [] : [approver]),
    ]);
    return summaryView({
      opened,
      actorId: actor.id,
      ...current,
      contacts,
      nameOf: (id) => people.get(id)?.name ?? '',
    });
  }
}

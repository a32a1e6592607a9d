import { Injectable } from '@nestjs/common';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { EndRoundsService } from '../differential/rounds/end-rounds.service.js';
import type { Work } from '../platform/database/unit-of-work.js';
import { notReady } from '../platform/errors/refusal.js';
import { CaseChangedEvent } from '../platform/events/case-events.js';
import type { Actor } from '../platform/http/actor.js';
import { Conclusion } from './conclusion.js';
import { PlanReader } from './plan-reader.js';
import { Signing } from './signing.js';

/** The conclusion itself, in one transaction. */
@Injectable()
export class ConcludeCase {
  constructor(
    private readonly access: CaseAccess,
    private readonly plans: PlanReader,
    private readonly conclusion: Conclusion,
    private readonly signing: Signing,
    private readonly rounds: EndRoundsService,
    private readonly changes: CaseChanges,
  ) {}

  async run(actor: Actor, caseId: string, work: Work): Promise<void> {
    const { file } = await this.access.open(actor, caseId, 'plan.conclude', work.em);
    const draft = await this.plans.draft(caseId, work.em);
    const missing = await this.conclusion.missing(caseId, draft, work.em);
    if (!draft || missing.length > 0) throw notReady(missing);
    const concludedAt = await this.signing.sign(work.em, caseId, draft, actor.id);
    const roundColumns = await this.rounds.closeForConclusion(work, caseId);
    const sentence = `signed plan ${String(draft.number)} and closed the case with it`;
    await this.changes.commit(
      work,
      file,
      'plan',
      { actorId: actor.id, action: 'case.concluded', sentence },
      { state: 'concluded', concludedAt, ...roundColumns },
    );
    // One change that is also one of the case and of its round.
    work.afterCommit(new CaseChangedEvent(file.id, file.revision, 'case'));
    work.afterCommit(new CaseChangedEvent(file.id, file.revision, 'round'));
    await this.signing.tell(work.em, file, draft);
  }
}

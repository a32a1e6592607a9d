import { Injectable } from '@nestjs/common';
import type { Case } from '@weighhouse/shared/contracts/cases';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { notReady } from '../platform/errors/refusal.js';
import { AccessChangedEvent } from '../platform/events/case-events.js';
import type { Actor } from '../platform/http/actor.js';
import { CaseAccess } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import type { CaseFile } from './case-file.entity.js';
import { CaseViews } from './case-views.js';
import { wordsColumns } from './case-words.js';
import { missingParts } from './missing-parts.js';
import { TeamReader } from './team-reader.js';

/** What the referrer does with the whole case. */
@Injectable()
export class ReferrerMoves {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly views: CaseViews,
    private readonly team: TeamReader,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /** @throws Refusal 409 `not-ready` that names every part that is missing */
  async submit(actor: Actor, caseId: string, words: string | undefined): Promise<Case> {
    const opened = await this.work.run(async (work) => {
      const found = await this.access.open(actor, caseId, 'case.submit', work.em);
      const missing = missingParts(found.file);
      if (missing.length > 0) throw notReady(missing);
      const now = this.clock.now();
      await this.changes.commit(
        work,
        found.file,
        'case',
        { actorId: actor.id, action: 'case.submitted', sentence: 'submitted the case' },
        { state: 'submitted', submittedAt: now, ...wordsColumns('submitted', words, actor.id, now) },
      );
      return found;
    });
    return this.views.view(actor, opened);
  }

  /**
   * Freezes the case at once: from here on it is open to the referrer alone. An open round ends with it; what was
   * sealed is shown to nobody any more.
   */
  async withdraw(actor: Actor, caseId: string, words: string): Promise<Case> {
    const opened = await this.work.run(async (work) => {
      const found = await this.access.open(actor, caseId, 'case.withdraw', work.em);
      await this.changes.commit(
        work,
        found.file,
        'case',
        { actorId: actor.id, action: 'case.withdrawn', sentence: withdrawnWords(found.file) },
        { state: 'withdrawn', ...wordsColumns('withdrawn', words, actor.id, this.clock.now()) },
      );
      const team = await this.team.current(caseId, work.em);
      const shutOut = new Set(team.map((entry) => entry.personId).filter((id) => id !== actor.id));
      for (const personId of shutOut) work.afterCommit(new AccessChangedEvent(personId, null, caseId));
      return found;
    });
    return this.views.view(actor, opened);
  }
}

/** Said before the round is closed with the case. */
function withdrawnWords({ roundOpen, roundKind, roundNumber }: CaseFile): string {
  if (!roundOpen) return 'withdrew the case';
  const ended = `withdrew the case, which closed round ${String(roundNumber)}`;
  return roundKind === 'sealed' ? `${ended}; its numbers stay sealed for good` : ended;
}

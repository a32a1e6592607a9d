import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Round, RoundKind } from '@weighhouse/shared/contracts/rounds';
import { CaseAccess } from '../../cases/case-access.js';
import { CaseChanges } from '../../cases/case-changes.js';
import { Clock } from '../../platform/clock/clock.js';
import { UnitOfWork } from '../../platform/database/unit-of-work.js';
import { invalid } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { RoundBeginning } from './round-beginning.js';
import { RoundViews } from './round-views.js';
import { RoundRow } from './round.entity.js';

/** Opens rounds. */
@Injectable()
export class OpenRoundsService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
    private readonly beginning: RoundBeginning,
    private readonly views: RoundViews,
  ) {}

  /**
   * Opens the next round, and tells those who judge in it. Where the panel stood before is kept, for the ledger's mark.
   * @throws Refusal 409 `not-ready` naming everything that is missing, 409 `round-open` while a round is open
   */
  async open(
    actor: Actor,
    caseId: string,
    input: { kind: RoundKind; deadline?: string | null | undefined },
  ): Promise<Round> {
    return this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'round.open', work.em);
      const now = this.clock.now();
      const deadline = input.deadline ? new Date(input.deadline) : null;
      if (deadline !== null && deadline <= now)
        throw invalid([{ path: 'deadline', message: 'must be later than now' }]);
      const pool = await this.beginning.prepared(work.em, caseId, input.kind);
      const round = work.em.create(RoundRow, {
        id: randomUUID(),
        caseId,
        number: (pool.rounds.at(-1)?.number ?? 0) + 1,
        kind: input.kind,
        state: 'open',
        candidateSet: file.candidateSet,
        openedAt: now,
        openedById: actor.id,
        deadline,
        unsealedAt: null,
        unsealReason: null,
        closedAt: null,
      });
      await this.beginning.begin(work.em, file, round, pool);
      await work.em.insert(RoundRow, round);
      const sentence = `opened round ${String(round.number)}, ${round.kind}`;
      await this.changes.commit(
        work,
        file,
        'round',
        { actorId: actor.id, action: 'round.opened', sentence },
        {
          state: 'judging',
          roundNumber: round.number,
          roundKind: round.kind,
          roundOpen: true,
          roundHandedIn: 0,
        },
      );
      return this.views.one(round, work.em);
    });
  }
}

import { Injectable, type OnModuleInit } from '@nestjs/common';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import type { EntityManager } from 'typeorm';
import { CaseAccess, type OpenedCase } from '../../cases/case-access.js';
import { CaseChanges, type Consequence } from '../../cases/case-changes.js';
import { TeamReader } from '../../cases/team-reader.js';
import { Clock } from '../../platform/clock/clock.js';
import { UnitOfWork, type Work } from '../../platform/database/unit-of-work.js';
import { notFound, notReady, Refusal } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { missingToUnseal } from './readiness.js';
import { RoundAbsence } from './round-absence.entity.js';
import { RoundReader } from './round-reader.js';
import { RoundViews } from './round-views.js';
import { RoundRow } from './round.entity.js';

/** Unseals and closes rounds. Either ends the round: afterwards none is open. */
@Injectable()
export class EndRoundsService implements OnModuleInit {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly changes: CaseChanges,
    private readonly clock: Clock,
    private readonly rounds: RoundReader,
    private readonly team: TeamReader,
    private readonly views: RoundViews,
  ) {}

  onModuleInit(): void {
    this.changes.follow(this.withdrawn);
  }

  /**
   * Shows everybody on the case the numbers of those who handed in.
   * @param reason needed where the quorum is not in
   * @throws Refusal 409 `not-ready` naming what is missing, 409 `round-not-open` when it has been unsealed already
   */
  async unseal(actor: Actor, roundId: string, reason: string | undefined): Promise<Round> {
    return this.work.run(async (work) => {
      const { opened, round } = await this.find(actor, roundId, 'round.unseal', work);
      if (round.kind === 'live')
        throw new Refusal('wrong-state', 'A live round has nothing to unseal: everybody sees its numbers.');
      const absent = await this.absentFrom(round, work.em);
      const missing = missingToUnseal({
        handedIn: absent.handedIn,
        quorum: opened.file.quorum,
        deadline: round.deadline,
        now: this.clock.now(),
        reason,
      });
      if (missing.length > 0) throw notReady(missing);
      const change = {
        state: 'unsealed' as const,
        unsealedAt: this.clock.now(),
        unsealReason: reason ? reason : null,
      };
      await this.end(work.em, round, absent.personIds, change);
      return this.tell(work, actor, opened.file, round, {
        action: 'round.unsealed',
        sentence: `unsealed round ${String(round.number)}${notInWords(absent.personIds.length)}`,
      });
    });
  }

  /** Closes the open round. A sealed one that is closed stays sealed: its numbers are shown to nobody. */
  async close(actor: Actor, roundId: string): Promise<Round> {
    return this.work.run(async (work) => {
      const { opened, round } = await this.find(actor, roundId, 'round.close', work);
      const { personIds } = await this.absentFrom(round, work.em);
      await this.end(work.em, round, personIds, { state: 'closed', closedAt: this.clock.now() });
      return this.tell(work, actor, opened.file, round, {
        action: 'round.closed',
        sentence: `closed round ${String(round.number)}`,
      });
    });
  }

  /**
   * Closes the live round that is open when a plan is signed; does nothing where none is.
   * @returns the columns to write with the change of the case
   */
  async closeForConclusion(work: Work, caseId: string): Promise<{ roundOpen?: false }> {
    return this.closeOpen(work.em, caseId);
  }

  /** A case that is withdrawn has no open round. A sealed one is closed as it is: its numbers are shown to nobody. */
  private readonly withdrawn: Consequence = async (em, file) =>
    file.state === 'withdrawn' && file.roundOpen ? this.closeOpen(em, file.id) : {};

  private async closeOpen(em: EntityManager, caseId: string): Promise<{ roundOpen?: false }> {
    const round = await this.rounds.openOf(caseId, em);
    if (!round) return {};
    const { personIds } = await this.absentFrom(round, em);
    await this.end(em, round, personIds, { state: 'closed', closedAt: this.clock.now() });
    return { roundOpen: false };
  }

  private async find(
    actor: Actor,
    roundId: string,
    action: 'round.unseal' | 'round.close',
    work: Work,
  ): Promise<{ opened: OpenedCase; round: RoundRow }> {
    const known = await this.rounds.byId(roundId, work.em);
    if (!known) throw notFound();
    const opened = await this.access.open(actor, known.caseId, action, work.em);
    // Read again: the row may have changed until the case was locked.
    const round = await this.rounds.byId(roundId, work.em);
    if (round?.state !== 'open') throw new Refusal('round-not-open', 'This round is over.');
    return { opened, round };
  }

  private async absentFrom(
    round: RoundRow,
    em: EntityManager,
  ): Promise<{ handedIn: number; personIds: string[] }> {
    const contributors = await this.team.contributors(round.caseId, em);
    const handed = new Set((await this.rounds.handIns([round], em)).map((handIn) => handIn.personId));
    const personIds = contributors.map((entry) => entry.personId).filter((id) => !handed.has(id));
    return { handedIn: contributors.length - personIds.length, personIds };
  }

  private async end(
    em: EntityManager,
    round: RoundRow,
    absent: readonly string[],
    change: Partial<RoundRow>,
  ): Promise<void> {
    const { affected } = await em.update(RoundRow, { id: round.id, state: 'open' }, change);
    if (affected !== 1) throw new Refusal('round-not-open', 'This round is over.');
    Object.assign(round, change);
    if (absent.length > 0)
      await em.insert(
        RoundAbsence,
        absent.map((personId) => ({ roundId: round.id, personId })),
      );
  }

  private async tell(
    work: Work,
    actor: Actor,
    file: OpenedCase['file'],
    round: RoundRow,
    line: { action: string; sentence: string },
  ): Promise<Round> {
    await this.changes.commit(work, file, 'round', { actorId: actor.id, ...line }, { roundOpen: false });
    return this.views.one(round, work.em);
  }
}

function notInWords(count: number): string {
  if (count === 0) return '; everybody was in';
  return count === 1 ? '; one contributor was not in' : `; ${String(count)} contributors were not in`;
}

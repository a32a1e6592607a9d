import { Injectable } from '@nestjs/common';
import type { Accept, Case } from '@weighhouse/shared/contracts/cases';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork, type Work } from '../platform/database/unit-of-work.js';
import { invalid, notReady } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { CaseAccess, type OpenedCase } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import type { CaseFile } from './case-file.entity.js';
import { CaseLetters } from './case-letters.js';
import { CaseViews } from './case-views.js';
import { wordsColumns } from './case-words.js';
import { missingInTeam } from './team-plan.js';
import { TeamSeats } from './team-seats.js';

/** A chair takes a submitted case on, with the team that judges it. */
@Injectable()
export class AcceptService {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly seats: TeamSeats,
    private readonly letters: CaseLetters,
    private readonly views: CaseViews,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /**
   * The accepting chair becomes the chair of the case.
   * @throws Refusal 400 with every fault of the team, 409 `not-ready` with everything that is missing,
   *   404 when another chair was faster: the case is then on that chair’s desk alone
   */
  async accept(actor: Actor, caseId: string, input: Accept): Promise<Case> {
    const opened = await this.work.run(async (work) => {
      const found = await this.access.open(actor, caseId, 'case.accept', work.em);
      await this.take(work, actor, found, input);
      return found;
    });
    return this.views.view(actor, opened);
  }

  private async take(work: Work, actor: Actor, { file }: OpenedCase, input: Accept): Promise<void> {
    const plan = await this.seats.plan(work.em, file, input.team, {
      acceptingChairId: actor.id,
      prefix: 'team',
    });
    const missing = missingToAccept(missingInTeam(plan.seats, 'team'), input);
    if (plan.faults.length > 0) throw invalid([...plan.faults, ...missing]);
    if (missing.length > 0) throw notReady(missing);
    const { lines } = await this.seats.write(work, file.id, actor.id, plan);
    const accepted = { actorId: actor.id, action: 'case.accepted', sentence: 'accepted the case' };
    await this.changes.commit(work, file, 'case', [accepted, ...lines], this.columns(actor, input));
    const contributors = plan.seats.filter((seat) => seat.part === 'contributor');
    await this.letters.askToJudge(
      work.em,
      file,
      contributors.map((seat) => seat.personId),
    );
    await this.letters.tellReferrer(work.em, file, 'accepted');
  }

  private columns(actor: Actor, input: Accept): Partial<CaseFile> {
    const now = this.clock.now();
    return {
      state: 'accepted',
      acceptedAt: now,
      conferenceAt: input.conferenceAt == null ? null : new Date(input.conferenceAt),
      ...(input.quorum === undefined ? {} : { quorum: input.quorum }),
      ...wordsColumns('accepted', input.words, actor.id, now),
    };
  }
}

function missingToAccept(missingInTeam: FieldFault[], input: Accept): FieldFault[] {
  const undecided = {
    path: 'conferenceAt',
    message: 'must be the date of the conference, or null for not yet',
  };
  return input.conferenceAt === undefined ? [...missingInTeam, undecided] : missingInTeam;
}

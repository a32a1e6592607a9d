import { Injectable } from '@nestjs/common';
import type { TeamMember, TeamMemberInput } from '@weighhouse/shared/contracts/cases';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { invalid, notReady, Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { CaseAccess } from './case-access.js';
import { CaseChanges } from './case-changes.js';
import { CaseLetters } from './case-letters.js';
import { CaseViews } from './case-views.js';
import { changedWeights, missingInTeam } from './team-plan.js';
import { type PlannedTeam, TeamSeats } from './team-seats.js';

/** The chair says who sits on a case, in which part, and how much each contributor counts. */
@Injectable()
export class TeamService {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly seats: TeamSeats,
    private readonly letters: CaseLetters,
    private readonly views: CaseViews,
    private readonly work: UnitOfWork,
  ) {}

  /**
   * Sets the whole team: those left out are taken off it. The referrer stays, and the chair unless another is named.
   * @throws Refusal 400 with every fault, 409 `not-ready` where an accepted case would lack somebody,
   *   409 `weights-frozen` while a sealed round is open
   */
  async set(
    actor: Actor,
    caseId: string,
    input: readonly TeamMemberInput[],
  ): Promise<{ items: TeamMember[] }> {
    await this.work.run(async (work) => {
      const { file, subject } = await this.access.open(actor, caseId, 'team.set', work.em);
      const plan = await this.seats.plan(work.em, file, input, { prefix: '' });
      if (plan.faults.length > 0) throw invalid(plan.faults);
      const accepted = file.state !== 'submitted';
      const missing = accepted ? missingInTeam(plan.seats, 'team') : [];
      if (missing.length > 0) throw notReady(missing);
      if (subject.openRound === 'sealed') refuseWeights(plan);
      const { lines, joined } = await this.seats.write(work, caseId, actor.id, plan);
      if (lines.length === 0) return;
      await this.changes.commit(work, file, 'team', lines);
      const asked = joined.filter((seat) => seat.part === 'contributor').map((seat) => seat.personId);
      if (['accepted', 'judging'].includes(file.state)) await this.letters.askToJudge(work.em, file, asked);
    });
    return { items: await this.views.teamOf(caseId) };
  }
}

function refuseWeights(plan: PlannedTeam): void {
  const changed = changedWeights(plan.seats, plan.known);
  if (changed.length === 0) return;
  const names = changed.map((seat) => plan.nameOf(seat.personId)).join(', ');
  throw new Refusal(
    'weights-frozen',
    `A sealed round is open: weights stay as they are until it is unsealed (${names}).`,
  );
}

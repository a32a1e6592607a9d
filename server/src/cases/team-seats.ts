import { Injectable } from '@nestjs/common';
import type { TeamMemberInput } from '@weighhouse/shared/contracts/cases';
import type { EntityManager } from 'typeorm';
import { PeopleDirectory } from '../people/people-directory.js';
import type { Work } from '../platform/database/unit-of-work.js';
import type { CaseFile } from './case-file.entity.js';
import { planTeam, type TeamAnswer } from './team-plan.js';
import { type TeamEntry, TeamReader } from './team-reader.js';
import { TeamWriter, type WrittenTeam } from './team-writer.js';

export interface PlannedTeam extends TeamAnswer {
  /** Every seat the case ever had. */
  known: TeamEntry[];
  nameOf: (personId: string) => string;
}

/** Checks a team that is asked for against everything known, and writes it. */
@Injectable()
export class TeamSeats {
  constructor(
    private readonly team: TeamReader,
    private readonly people: PeopleDirectory,
    private readonly writer: TeamWriter,
  ) {}

  /**
   * @param input left out: the team as it stands
   * @param acceptingChairId the chair who is accepting the case now
   * @param prefix the path of the team within the input
   */
  async plan(
    em: EntityManager,
    file: Pick<CaseFile, 'id' | 'referrerId'>,
    input: readonly TeamMemberInput[] | undefined,
    options: { acceptingChairId?: string; prefix: string },
  ): Promise<PlannedTeam> {
    const known = await this.team.everybody(file.id, em);
    const now = known.filter((seat) => seat.leftAt === null);
    const asked = input ?? now.filter((seat) => seat.part !== 'chair').map(asInput);
    const chairNow = now.find((seat) => seat.part === 'chair')?.personId ?? null;
    const chairId = options.acceptingChairId ?? chairNow;
    const people = await this.people.byIds(
      [
        ...asked.map((item) => item.personId),
        ...known.map((seat) => seat.personId),
        file.referrerId,
        ...(chairId === null ? [] : [chairId]),
      ],
      em,
    );
    const answer = planTeam({
      input: asked,
      known,
      people,
      referrerId: file.referrerId,
      chairId,
      ...options,
    });
    return { ...answer, known, nameOf: (id) => people.get(id)?.name ?? '' };
  }

  /** @returns the lines for the trail, and who joined */
  async write(work: Work, caseId: string, actorId: string, plan: PlannedTeam): Promise<WrittenTeam> {
    return this.writer.write(work, caseId, actorId, plan.seats, plan.nameOf);
  }
}

function asInput(seat: TeamEntry): TeamMemberInput {
  return {
    personId: seat.personId,
    part: seat.part,
    ...(seat.weight === null ? {} : { weight: seat.weight }),
    ...(seat.reason === null ? {} : { reason: seat.reason }),
  };
}

import { Injectable } from '@nestjs/common';
import type { Round } from '@weighhouse/shared/contracts/rounds';
import { DataSource, type EntityManager } from 'typeorm';
import { TeamReader } from '../../cases/team-reader.js';
import { PeopleDirectory, personRef } from '../../people/people-directory.js';
import { RoundReader } from './round-reader.js';
import type { RoundRow } from './round.entity.js';

/** Rounds as everybody on the case sees them: who is in, with which digest, and who is not; never a number. */
@Injectable()
export class RoundViews {
  constructor(
    private readonly source: DataSource,
    private readonly rounds: RoundReader,
    private readonly team: TeamReader,
    private readonly people: PeopleDirectory,
  ) {}

  async of(
    caseId: string,
    rounds: readonly RoundRow[],
    em: EntityManager = this.source.manager,
  ): Promise<Round[]> {
    const handIns = await this.rounds.handIns(rounds, em);
    const absences = await this.rounds.absences(rounds, em);
    const contributors = await this.team.contributors(caseId, em);
    const people = await this.people.byIds(
      [...contributors, ...handIns, ...absences].map((entry) => entry.personId),
      em,
    );
    return rounds.map((round) => {
      const inThis = handIns.filter((handIn) => handIn.roundId === round.id);
      const handed = new Set(inThis.map((handIn) => handIn.personId));
      const missing =
        round.state === 'open' ? contributors : absences.filter((absence) => absence.roundId === round.id);
      const members = [
        ...inThis.map(({ personId, handedInAt, digest }) => ({ personId, handedInAt, digest })),
        ...missing
          .filter(({ personId }) => !handed.has(personId))
          .map(({ personId }) => ({ personId, handedInAt: null, digest: null })),
      ];
      return {
        ...datesOf(round),
        members: members.flatMap(({ personId, handedInAt, digest }) => {
          const person = people.get(personId);
          return person ? [{ person: personRef(person), handedInAt: iso(handedInAt), digest }] : [];
        }),
      };
    });
  }

  async one(round: RoundRow, em?: EntityManager): Promise<Round> {
    const [view] = await this.of(round.caseId, [round], em);
    if (!view) throw new TypeError('a round has one view');
    return view;
  }
}

function datesOf(round: RoundRow): Omit<Round, 'members'> {
  const { id, number, kind, state, candidateSet, unsealReason } = round;
  return {
    id,
    number,
    kind,
    state,
    candidateSet,
    unsealReason,
    openedAt: round.openedAt.toISOString(),
    deadline: iso(round.deadline),
    unsealedAt: iso(round.unsealedAt),
    closedAt: iso(round.closedAt),
  };
}

const iso = (moment: Date | null): string | null => moment?.toISOString() ?? null;

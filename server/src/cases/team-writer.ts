import { Injectable } from '@nestjs/common';
import type { AuditInput } from '../platform/audit-log/audit-log.js';
import { Clock } from '../platform/clock/clock.js';
import type { Work } from '../platform/database/unit-of-work.js';
import { AccessChangedEvent } from '../platform/events/case-events.js';
import { TeamMember } from './team-member.entity.js';
import { sameSeat, type Seat } from './team-plan.js';

/** What changed on a team: the lines for the trail, and who joined. */
export interface WrittenTeam {
  lines: Omit<AuditInput, 'caseId'>[];
  joined: Seat[];
}

/** Brings the rows of a team to what they shall be. */
@Injectable()
export class TeamWriter {
  constructor(private readonly clock: Clock) {}

  /**
   * @param nameOf names for the trail
   */
  async write(
    work: Work,
    caseId: string,
    actorId: string,
    seats: readonly Seat[],
    nameOf: (personId: string) => string,
  ): Promise<WrittenTeam> {
    const rows = await work.em.findBy(TeamMember, { caseId });
    const lines: Omit<AuditInput, 'caseId'>[] = [];
    const say = (action: string, sentence: string): number => lines.push({ actorId, action, sentence });
    const joined: Seat[] = [];
    for (const seat of seats) {
      const row = rows.find((known) => sameSeat(known, seat));
      const asPart = `${nameOf(seat.personId)} as ${seat.part}`;
      if (row?.leftAt === null) {
        if (row.weight === seat.weight && row.reason === seat.reason) continue;
        await work.em.update(TeamMember, { id: row.id }, { weight: seat.weight, reason: seat.reason });
        if (row.weight !== seat.weight) say('team.weighed', `changed the weight of ${nameOf(seat.personId)}`);
        continue;
      }
      joined.push(seat);
      say('team.joined', `took ${asPart} onto the team`);
      const now = { weight: seat.weight, reason: seat.reason, addedAt: this.clock.now(), leftAt: null };
      if (row) await work.em.update(TeamMember, { id: row.id }, now);
      else await work.em.insert(TeamMember, { caseId, personId: seat.personId, part: seat.part, ...now });
    }
    for (const row of rows) {
      if (row.leftAt !== null || seats.some((seat) => sameSeat(seat, row))) continue;
      await work.em.update(TeamMember, { id: row.id }, { leftAt: this.clock.now() });
      say('team.left', `took ${nameOf(row.personId)} off the team as ${row.part}`);
      work.afterCommit(new AccessChangedEvent(row.personId, null, caseId));
    }
    return { lines, joined };
  }
}

import { Injectable } from '@nestjs/common';
import type { Part } from '@weighhouse/shared/contracts/cases';
import { DataSource, type EntityManager, In, IsNull } from 'typeorm';
import { grouped } from '../platform/database/grouped.js';
import { TeamMember } from './team-member.entity.js';

/** One person's part on one case, as other domains see it. */
export interface TeamEntry {
  caseId: string;
  personId: string;
  part: Part;
  /** Contributors alone: 0 to 3. */
  weight: number | null;
  reason: string | null;
  /** Taken off the team then; null for somebody who is on it. */
  leftAt: Date | null;
}

/** Who is on a case's team, in the order in which they were added. */
@Injectable()
export class TeamReader {
  constructor(private readonly source: DataSource) {}

  /** Those on the team now. */
  async current(caseId: string, em: EntityManager = this.source.manager): Promise<TeamEntry[]> {
    return em.find(TeamMember, { where: { caseId, leftAt: IsNull() }, order: { id: 'ASC' } });
  }

  /** Those on the team of several cases now, in one query. */
  async currentOf(
    caseIds: readonly string[],
    em: EntityManager = this.source.manager,
  ): Promise<Map<string, TeamEntry[]>> {
    const rows =
      caseIds.length === 0
        ? []
        : await em.find(TeamMember, {
            where: { caseId: In([...caseIds]), leftAt: IsNull() },
            order: { id: 'ASC' },
          });
    return grouped(rows, (row) => row.caseId);
  }

  /** The contributors now, whose judgements are pooled, with their weights. */
  async contributors(caseId: string, em?: EntityManager): Promise<(TeamEntry & { weight: number })[]> {
    const team = await this.current(caseId, em);
    return team
      .filter((entry) => entry.part === 'contributor')
      .map((entry) => ({ ...entry, weight: entry.weight ?? 1 }));
  }

  /** Everybody who was ever on the team, those taken off it included. */
  async everybody(caseId: string, em: EntityManager = this.source.manager): Promise<TeamEntry[]> {
    return em.find(TeamMember, { where: { caseId }, order: { id: 'ASC' } });
  }
}

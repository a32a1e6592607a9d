import { Injectable } from '@nestjs/common';
import type { AgendaItem } from '@weighhouse/shared/contracts/differential';
import type { EntityManager } from 'typeorm';
import { PeopleDirectory } from '../../people/people-directory.js';
import { type CasePool, countingFindings } from '../pool/case-pool.js';
import { AgendaItemRow } from './agenda-item.entity.js';

/** What is to be discussed first, without a check of who asks. */
@Injectable()
export class AgendaReader {
  constructor(private readonly people: PeopleDirectory) {}

  /** The items of a case in the order in which they were added; findings entered in error are not discussed. */
  async of(pool: Pick<CasePool, 'caseId' | 'findings'>, em: EntityManager): Promise<AgendaItem[]> {
    const counting = new Set(countingFindings(pool).map((finding) => finding.id));
    const rows = await em.find(AgendaItemRow, {
      where: { caseId: pool.caseId },
      order: { addedAt: 'ASC', findingId: 'ASC' },
    });
    return this.views(
      rows.filter((row) => counting.has(row.findingId)),
      em,
    );
  }

  /** Null where the finding is not on the agenda. */
  async one(findingId: string, em: EntityManager): Promise<AgendaItem | null> {
    const [view] = await this.views(await em.findBy(AgendaItemRow, { findingId }), em);
    return view ?? null;
  }

  private async views(rows: readonly AgendaItemRow[], em: EntityManager): Promise<AgendaItem[]> {
    if (rows.length === 0) return [];
    const people = await this.people.byIds(
      rows.map((row) => row.addedById),
      em,
    );
    return rows.map(({ findingId, note, version, addedById, addedAt }) => ({
      findingId,
      note,
      version,
      addedBy: people.get(addedById)?.name ?? '',
      addedAt: addedAt.toISOString(),
    }));
  }
}

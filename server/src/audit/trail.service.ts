import { Injectable } from '@nestjs/common';
import type { TrailEntry } from '@weighhouse/shared/contracts/trail';
import { DataSource } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { RoundReader } from '../differential/rounds/round-reader.js';
import { viewOf } from '../differential/view/view-of.js';
import { PeopleDirectory } from '../people/people-directory.js';
import type { Actor } from '../platform/http/actor.js';
import { trailLines } from './trail-lines.js';

/** Who did what and when on a case, the latest first. */
@Injectable()
export class TrailService {
  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly rounds: RoundReader,
    private readonly people: PeopleDirectory,
  ) {}

  /**
   * The referrer and the chair see the whole case, everybody else their own acts. What was done in a round that is
   * still sealed is seen by whoever did it alone; it is not counted for the others either. The referrer, who sees
   * numbers without names, is not told who saved.
   */
  async read(
    actor: Actor,
    caseId: string,
    { page, size }: { page: number; size: number },
  ): Promise<{ items: TrailEntry[]; total: number }> {
    const { parts } = await this.access.open(actor, caseId, 'trail.read');
    // One snapshot for both questions: a round that is sealed in between must not show its first lines.
    const [rows, total] = await this.source.transaction('REPEATABLE READ', async (em) =>
      trailLines(em, {
        caseId,
        actorId: actor.id,
        ownOnly: !parts.includes('referrer') && !parts.includes('chair'),
        unnamed: viewOf(parts) === 'anonymous',
        sealedRoundIds: await this.rounds.stillSealed(caseId, em),
      })
        .limit(size)
        .offset((page - 1) * size)
        .getManyAndCount(),
    );
    const people = await this.people.byIds(
      rows.flatMap((row) => (row.actorId === null ? [] : [row.actorId])),
    );
    const items = rows.map((row, index) => ({
      // Counted within what this person may see: the table's own numbers would tell of lines in between.
      id: total - (page - 1) * size - index,
      at: row.at.toISOString(),
      who: row.actorId === null ? null : (people.get(row.actorId)?.name ?? ''),
      action: row.action,
      sentence: row.sentence,
    }));
    return { items, total };
  }
}

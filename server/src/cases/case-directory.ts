import { Injectable } from '@nestjs/common';
import type { Part } from '@weighhouse/shared/contracts/cases';
import { DataSource, type EntityManager, In, IsNull } from 'typeorm';
import { CaseFile } from './case-file.entity.js';
import { TeamMember } from './team-member.entity.js';

/**
 * Cases for the other domains, without a check of who asks: what comes from here may be answered only after
 * CaseAccess has let the actor in, or where the actor's own part was asked for.
 */
@Injectable()
export class CaseDirectory {
  constructor(private readonly source: DataSource) {}

  async byId(caseId: string, em: EntityManager = this.source.manager): Promise<CaseFile | null> {
    return em.findOneBy(CaseFile, { id: caseId });
  }

  /** As byId, and locks the row until the end of the transaction: for changes whose right does not come from a part. */
  async lock(caseId: string, em: EntityManager): Promise<CaseFile | null> {
    return em.findOne(CaseFile, { where: { id: caseId }, lock: { mode: 'pessimistic_write' } });
  }

  /** @param ids may repeat; unknown ones are left out of the answer */
  async byIds(
    ids: readonly string[],
    em: EntityManager = this.source.manager,
  ): Promise<Map<string, CaseFile>> {
    const wanted = [...new Set(ids)];
    if (wanted.length === 0) return new Map();
    const files = await em.findBy(CaseFile, { id: In(wanted) });
    return new Map(files.map((file) => [file.id, file]));
  }

  /** The cases on whose team a person is, with the parts held there; drafts and withdrawn ones included. */
  async ofPerson(
    personId: string,
    em: EntityManager = this.source.manager,
  ): Promise<{ file: CaseFile; parts: Part[] }[]> {
    const rows = await em.findBy(TeamMember, { personId, leftAt: IsNull() });
    const files = await this.byIds(
      rows.map((row) => row.caseId),
      em,
    );
    return [...files.values()].map((file) => ({
      file,
      parts: rows.filter((row) => row.caseId === file.id).map((row) => row.part),
    }));
  }

  /** The submitted cases that wait for a chair, oldest first. */
  async waitingForChair(em: EntityManager = this.source.manager): Promise<CaseFile[]> {
    return em.find(CaseFile, { where: { state: 'submitted' }, order: { submittedAt: 'ASC' } });
  }
}

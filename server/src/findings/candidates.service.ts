import { Injectable } from '@nestjs/common';
import type { Candidate, CandidateSet } from '@weighhouse/shared/contracts/findings';
import { DataSource, type EntityManager } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { PeopleDirectory } from '../people/people-directory.js';
import type { Actor } from '../platform/http/actor.js';
import { CandidateRow } from './candidate.entity.js';

/** A candidate with the sets it belongs to: from `addedInSet` on, until before `retiredInSet`. */
export interface CandidateEntry extends Candidate {
  addedInSet: number;
  retiredInSet: number | null;
}

/** Reads candidates in the order of the columns. None of these is never among them: it is always the last column. */
@Injectable()
export class CandidatesService {
  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly people: PeopleDirectory,
  ) {}

  /** The candidate set in force, for somebody on the case. */
  async list(actor: Actor, caseId: string): Promise<CandidateSet> {
    const { file } = await this.access.open(actor, caseId, 'candidate.read');
    return { candidateSet: file.candidateSet, items: await this.inForce(caseId) };
  }

  /** The candidates of the set in force. */
  async inForce(caseId: string, em?: EntityManager): Promise<CandidateEntry[]> {
    return (await this.all(caseId, em)).filter((entry) => entry.retiredInSet === null);
  }

  /** The candidates as they were in an earlier set, in that set's order of columns. */
  async inSet(caseId: string, candidateSet: number, em?: EntityManager): Promise<CandidateEntry[]> {
    return (await this.all(caseId, em)).filter((entry) => isInSet(entry, candidateSet));
  }

  /** Every candidate the case ever had, the retired ones in their places. */
  async all(caseId: string, em: EntityManager = this.source.manager): Promise<CandidateEntry[]> {
    const rows = await em.find(CandidateRow, { where: { caseId }, order: { position: 'ASC' } });
    return this.entries(rows, em);
  }

  async count(caseId: string): Promise<number> {
    return (await this.inForce(caseId)).length;
  }

  private async entries(rows: CandidateRow[], em: EntityManager): Promise<CandidateEntry[]> {
    const people = await this.people.byIds(
      rows.map((row) => row.addedById),
      em,
    );
    return rows.map((row) => ({
      id: row.id,
      name: row.name,
      detail: row.detail,
      mustNotMiss: row.mustNotMiss,
      addedBy: people.get(row.addedById)?.name ?? '',
      retired: row.retiredInSet !== null,
      retiredWords: row.retiredWords,
      addedInSet: row.addedInSet,
      retiredInSet: row.retiredInSet,
    }));
  }
}

export const isInSet = (
  entry: Pick<CandidateEntry, 'addedInSet' | 'retiredInSet'>,
  candidateSet: number,
): boolean =>
  entry.addedInSet <= candidateSet && (entry.retiredInSet === null || entry.retiredInSet > candidateSet);

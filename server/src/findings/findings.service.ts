import { Injectable } from '@nestjs/common';
import type { Finding } from '@weighhouse/shared/contracts/findings';
import { DataSource, type EntityManager, In } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { PeopleDirectory } from '../people/people-directory.js';
import { grouped } from '../platform/database/grouped.js';
import type { Actor } from '../platform/http/actor.js';
import { ReportDirectory } from '../reports/report-directory.js';
import { FindingLevel } from './finding-level.entity.js';
import { FindingRow } from './finding.entity.js';
import { findingView } from './finding-view.js';

/** A finding with the case it belongs to. */
export interface FindingEntry extends Finding {
  caseId: string;
}

/** Reads findings in panel order, the order in which they were added; those entered in error in their places. */
@Injectable()
export class FindingsService {
  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly people: PeopleDirectory,
    private readonly reports: ReportDirectory,
  ) {}

  /** Every finding, for somebody on the case. */
  async list(actor: Actor, caseId: string): Promise<{ items: FindingEntry[] }> {
    await this.access.open(actor, caseId, 'finding.read');
    return { items: await this.all(caseId) };
  }

  /** Every finding of the case; `enteredInError` is set on those that count nowhere. */
  async all(caseId: string, em: EntityManager = this.source.manager): Promise<FindingEntry[]> {
    const rows = await em.find(FindingRow, { where: { caseId }, order: { position: 'ASC' } });
    return this.entries(rows, em);
  }

  /** Those that count, in panel order. */
  async counting(caseId: string, em?: EntityManager): Promise<FindingEntry[]> {
    return (await this.all(caseId, em)).filter((entry) => entry.enteredInError === null);
  }

  async byId(findingId: string, em: EntityManager = this.source.manager): Promise<FindingEntry | null> {
    const rows = await em.findBy(FindingRow, { id: findingId });
    return (await this.entries(rows, em))[0] ?? null;
  }

  async count(caseId: string): Promise<number> {
    return (await this.counting(caseId)).length;
  }

  /** How many of them are not known yet. */
  async countPending(caseId: string): Promise<number> {
    return (await this.counting(caseId)).filter((finding) => finding.observed === null).length;
  }

  private async entries(rows: FindingRow[], em: EntityManager): Promise<FindingEntry[]> {
    if (rows.length === 0) return [];
    const levels = await em.find(FindingLevel, {
      where: { findingId: In(rows.map((row) => row.id)) },
      order: { position: 'ASC' },
    });
    const labels = grouped(levels, (level) => level.findingId);
    const people = await this.people.byIds(
      rows.flatMap((row) => [row.addedById, ...(row.errorById === null ? [] : [row.errorById])]),
      em,
    );
    const files = await this.reports.names(
      rows.flatMap((row) => (row.sourceReportId === null ? [] : [row.sourceReportId])),
      em,
    );
    const nameOf = (id: string): string => people.get(id)?.name ?? '';
    return rows.map((row) => ({
      ...findingView(row, labels.get(row.id) ?? [], nameOf, files),
      caseId: row.caseId,
    }));
  }
}

import { Injectable } from '@nestjs/common';
import type { Report } from '@weighhouse/shared/contracts/reports';
import { DataSource, IsNull } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { PeopleDirectory } from '../people/people-directory.js';
import type { Actor } from '../platform/http/actor.js';
import { ReportRow } from './report.entity.js';
import { reportView } from './report-view.js';

/** A case's reports, for somebody on it. */
@Injectable()
export class ReportsService {
  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly people: PeopleDirectory,
  ) {}

  /** In the order in which they came. */
  async list(actor: Actor, caseId: string): Promise<{ items: Report[] }> {
    const { abilities } = await this.access.open(actor, caseId, 'report.read');
    const rows = await this.source.manager.find(ReportRow, {
      where: { caseId, removedAt: IsNull() },
      order: { uploadedAt: 'ASC', id: 'ASC' },
    });
    const people = await this.people.byIds(rows.map((row) => row.uploadedById));
    const items = rows.map((row) => reportView(row, people.get(row.uploadedById)?.name ?? '', abilities));
    return { items };
  }
}

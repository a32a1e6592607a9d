import { Injectable } from '@nestjs/common';
import { DataSource, type EntityManager, In, IsNull } from 'typeorm';
import { ReportRow } from './report.entity.js';

/** Reports for the other domains. */
@Injectable()
export class ReportDirectory {
  constructor(private readonly source: DataSource) {}

  /** File names by id; those of removed reports too, because findings may have named them. */
  async names(ids: readonly string[], em: EntityManager = this.source.manager): Promise<Map<string, string>> {
    const wanted = [...new Set(ids)];
    if (wanted.length === 0) return new Map();
    const rows = await em.findBy(ReportRow, { id: In(wanted) });
    return new Map(rows.map((row) => [row.id, row.fileName]));
  }

  /** Whether a report is there and of this case. */
  async isOf(caseId: string, reportId: string, em: EntityManager = this.source.manager): Promise<boolean> {
    return em.existsBy(ReportRow, { id: reportId, caseId, removedAt: IsNull() });
  }

  /** How many reports a case has. */
  async count(caseId: string): Promise<number> {
    return this.source.manager.countBy(ReportRow, { caseId, removedAt: IsNull() });
  }
}

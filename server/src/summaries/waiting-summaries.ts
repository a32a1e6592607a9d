import { Injectable } from '@nestjs/common';
import { DataSource, In } from 'typeorm';
import { SummaryRow } from './summary.entity.js';

/** Summaries that wait for a chair. */
@Injectable()
export class WaitingSummaries {
  constructor(private readonly source: DataSource) {}

  /** @param caseIds the cases that the person chairs */
  async toApprove(caseIds: readonly string[]): Promise<{ caseId: string; since: Date }[]> {
    if (caseIds.length === 0) return [];
    const rows = await this.source.manager.findBy(SummaryRow, { caseId: In([...caseIds]), state: 'waiting' });
    return rows.map(({ caseId, changedAt }) => ({ caseId, since: changedAt }));
  }
}

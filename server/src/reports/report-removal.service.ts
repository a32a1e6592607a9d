import { Injectable, Logger } from '@nestjs/common';
import { DataSource, IsNull } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { notFound, Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { ObjectStore } from '../platform/storage/object-store.js';
import { ReportRow } from './report.entity.js';
import { ReportUses } from './report-uses.js';

/** Removes a report from a draft. */
@Injectable()
export class ReportRemoval {
  private readonly logger = new Logger(ReportRemoval.name);

  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly uses: ReportUses,
    private readonly store: ObjectStore,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /**
   * The content is deleted; the row and its line in the trail stay.
   * @throws Refusal 409 `wrong-state` once the case is submitted, or where a finding was taken from the report
   */
  async remove(actor: Actor, reportId: string): Promise<void> {
    const row = await this.source.manager.findOneBy(ReportRow, { id: reportId, removedAt: IsNull() });
    if (!row) throw notFound();
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, row.caseId, 'report.remove', work.em);
      if (await this.uses.isUsed(reportId, work.em)) {
        throw new Refusal('wrong-state', 'A finding was taken from this report. Change its source first.');
      }
      const where = { id: reportId, removedAt: IsNull() };
      const { affected } = await work.em.update(ReportRow, where, { removedAt: this.clock.now() });
      if (affected !== 1) throw notFound();
      const line = { actorId: actor.id, action: 'report.removed', sentence: 'removed a report' };
      await this.changes.commit(work, file, 'reports', line);
    });
    await this.store.remove(row.storageKey).catch((error: unknown) => {
      this.logger.warn(`content ${row.storageKey} stayed behind: ${String(error)}`);
    });
  }
}

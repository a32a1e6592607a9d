import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Report } from '@weighhouse/shared/contracts/reports';
import { IsNull } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { Clock } from '../platform/clock/clock.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { Refusal } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { ReportRow } from './report.entity.js';
import { reportView } from './report-view.js';

const most = 200;
type Stored = Pick<ReportRow, 'fileName' | 'mediaType' | 'sizeBytes' | 'sha256' | 'storageKey'>;

/** Enters stored files into a case. */
@Injectable()
export class ReportRegister {
  constructor(
    private readonly access: CaseAccess,
    private readonly changes: CaseChanges,
    private readonly work: UnitOfWork,
    private readonly clock: Clock,
  ) {}

  /**
   * @param wanted asked last: whoever sent the file may have cancelled meanwhile
   * @throws Refusal what a case that has changed during the upload refuses
   */
  async enter(actor: Actor, caseId: string, stored: Stored, wanted: () => boolean): Promise<Report> {
    return this.work.run(async (work) => {
      const { file, abilities } = await this.access.open(actor, caseId, 'report.add', work.em);
      const number = await work.em.countBy(ReportRow, { caseId, removedAt: IsNull() });
      if (number >= most) {
        throw new Refusal('wrong-state', `The case holds ${String(most)} reports, the most it can.`);
      }
      const row: ReportRow = {
        id: randomUUID(),
        caseId,
        fileName: stored.fileName,
        mediaType: stored.mediaType,
        sizeBytes: stored.sizeBytes,
        sha256: stored.sha256,
        storageKey: stored.storageKey,
        uploadedById: actor.id,
        uploadedAt: this.clock.now(),
        removedAt: null,
      };
      await work.em.insert(ReportRow, work.em.create(ReportRow, row));
      const line = { actorId: actor.id, action: 'report.added', sentence: 'added a report' };
      await this.changes.commit(work, file, 'reports', line);
      if (!wanted()) throw new Refusal('malformed', 'The upload was cancelled.');
      return reportView(row, actor.name, abilities);
    });
  }
}

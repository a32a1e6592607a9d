import { Injectable } from '@nestjs/common';
import type { ChangedWhat } from '@weighhouse/shared/contracts/live';
import { Clock } from '../platform/clock/clock.js';
import { type AuditInput, AuditLog } from '../platform/audit-log/audit-log.js';
import type { Work } from '../platform/database/unit-of-work.js';
import { CaseChangedEvent } from '../platform/events/case-events.js';
import { CaseFile } from './case-file.entity.js';

/** Ends every change of a case: columns, next revision, trail and what browsers hear after commit. */
@Injectable()
export class CaseChanges {
  constructor(
    private readonly clock: Clock,
    private readonly audit: AuditLog,
  ) {}

  /**
   * Writes the change and raises the revision.
   * @param file the row as opened (and locked) in this transaction; its fields are set to what was written
   * @param trail one or more lines for the trail
   */
  async commit(
    work: Work,
    file: CaseFile,
    what: ChangedWhat,
    trail: Omit<AuditInput, 'caseId'> | Omit<AuditInput, 'caseId'>[],
    columns: Partial<CaseFile> = {},
  ): Promise<void> {
    const revision = file.revision + 1;
    const change = { ...columns, revision, updatedAt: this.clock.now() };
    await work.em.update(CaseFile, { id: file.id }, change);
    Object.assign(file, change);
    for (const line of Array.isArray(trail) ? trail : [trail]) {
      await this.audit.record(work.em, { ...line, caseId: file.id });
    }
    work.afterCommit(new CaseChangedEvent(file.id, revision, what));
  }
}

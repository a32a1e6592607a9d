import { Injectable } from '@nestjs/common';
import type { ChangedWhat } from '@weighhouse/shared/contracts/live';
import type { EntityManager } from 'typeorm';
import { Clock } from '../platform/clock/clock.js';
import { type AuditInput, AuditLog } from '../platform/audit-log/audit-log.js';
import type { Work } from '../platform/database/unit-of-work.js';
import { CaseChangedEvent } from '../platform/events/case-events.js';
import { CaseFile } from './case-file.entity.js';

/** Columns that follow from a change, worked out in its transaction by a module that this one need not know. */
export type Consequence = (
  em: EntityManager,
  file: Readonly<CaseFile>,
  what: ChangedWhat,
) => Promise<Partial<CaseFile>>;

/** Ends every change of a case: columns, next revision, trail and what browsers hear after commit. */
@Injectable()
export class CaseChanges {
  private readonly consequences: Consequence[] = [];

  constructor(
    private readonly clock: Clock,
    private readonly audit: AuditLog,
  ) {}

  /** Registers what follows from changes; it runs after the change itself is written, inside its transaction. */
  follow(consequence: Consequence): void {
    this.consequences.push(consequence);
  }

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
    for (const consequence of this.consequences) {
      const following = await consequence(work.em, file, what);
      if (Object.keys(following).length > 0) await work.em.update(CaseFile, { id: file.id }, following);
      Object.assign(file, following);
    }
    for (const line of Array.isArray(trail) ? trail : [trail]) {
      await this.audit.record(work.em, { ...line, caseId: file.id });
    }
    work.afterCommit(new CaseChangedEvent(file.id, revision, what));
  }
}

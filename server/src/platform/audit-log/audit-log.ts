import { Injectable } from '@nestjs/common';
import type { EntityManager } from 'typeorm';
import { Clock } from '../clock/clock.js';
import { AuditEntry } from './audit-entry.entity.js';

export interface AuditInput {
  caseId?: string | null;
  actorId: string | null;
  /** A stable word, like case.submitted. */
  action: string;
  /** What was done, as the rest of a sentence that begins with a name: "submitted the case". */
  sentence: string;
  sealedRoundId?: string | null;
}

/** Writes the trail, inside the transaction of the act itself: no act without its line. */
@Injectable()
export class AuditLog {
  constructor(private readonly clock: Clock) {}

  async record(em: EntityManager, input: AuditInput): Promise<void> {
    await em.insert(AuditEntry, {
      at: this.clock.now(),
      caseId: input.caseId ?? null,
      actorId: input.actorId,
      action: input.action,
      sentence: input.sentence,
      sealedRoundId: input.sealedRoundId ?? null,
    });
  }
}

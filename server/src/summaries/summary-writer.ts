import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { SummaryInput } from '@weighhouse/shared/contracts/summaries';
import type { EntityManager } from 'typeorm';
import { Clock } from '../platform/clock/clock.js';
import { SummaryRow } from './summary.entity.js';

/** Writes the rows of summaries. */
@Injectable()
export class SummaryWriter {
  constructor(private readonly clock: Clock) {}

  /** Saves the text; whatever was approved of an older one is approved no more. @returns false when it is stale */
  async save(
    em: EntityManager,
    where: { caseId: string; planNumber: number },
    row: SummaryRow | null,
    input: SummaryInput,
  ): Promise<boolean> {
    const staysWaiting = row?.state === 'waiting' && input.ready !== false;
    const waiting = input.ready === true || staysWaiting;
    const text = {
      version: input.version + 1,
      body: input.body,
      state: waiting ? ('waiting' as const) : ('draft' as const),
      returnedWords: input.ready === true ? null : (row?.returnedWords ?? null),
      changedAt: this.clock.now(),
      approvedById: null,
      approvedAt: null,
    };
    if (!row) {
      if (input.version !== 0) return false;
      await em.insert(SummaryRow, { id: randomUUID(), ...where, ...text, toldAt: null });
      return true;
    }
    return (await em.update(SummaryRow, { id: row.id, version: input.version }, text)).affected === 1;
  }

  /** @returns false when the text is no longer the one that the chair read */
  async approve(em: EntityManager, row: SummaryRow, version: number, personId: string): Promise<boolean> {
    const change = {
      state: 'approved' as const,
      approvedById: personId,
      approvedAt: this.clock.now(),
      returnedWords: null,
      version: version + 1,
    };
    return (await em.update(SummaryRow, { id: row.id, version }, change)).affected === 1;
  }

  async giveBack(em: EntityManager, row: SummaryRow, words: string): Promise<void> {
    await em.update(
      SummaryRow,
      { id: row.id },
      { state: 'draft', returnedWords: words, version: row.version + 1 },
    );
  }

  async markTold(em: EntityManager, row: SummaryRow, at: Date): Promise<void> {
    await em.update(SummaryRow, { id: row.id }, { state: 'told', toldAt: row.toldAt ?? at });
  }
}

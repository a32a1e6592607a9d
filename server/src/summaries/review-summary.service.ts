import { Injectable } from '@nestjs/common';
import type { Summary } from '@weighhouse/shared/contracts/summaries';
import type { EntityManager } from 'typeorm';
import { CaseAccess } from '../cases/case-access.js';
import { CaseChanges } from '../cases/case-changes.js';
import { UnitOfWork } from '../platform/database/unit-of-work.js';
import { Refusal, stale } from '../platform/errors/refusal.js';
import type { Actor } from '../platform/http/actor.js';
import { SummaryLetters } from './summary-letters.js';
import { SummaryPages } from './summary-pages.service.js';
import { SummaryReader } from './summary-reader.js';
import { SummaryWriter } from './summary-writer.js';
import type { SummaryRow } from './summary.entity.js';

/** The chair approves the text that the patient is told from, or asks for changes. */
@Injectable()
export class ReviewSummaryService {
  constructor(
    private readonly access: CaseAccess,
    private readonly work: UnitOfWork,
    private readonly summaries: SummaryReader,
    private readonly writer: SummaryWriter,
    private readonly changes: CaseChanges,
    private readonly letters: SummaryLetters,
    private readonly pages: SummaryPages,
  ) {}

  /** @param version the text that the chair read @throws Refusal stale with the one that is there now */
  async approve(actor: Actor, caseId: string, version: number): Promise<Summary> {
    const approved = await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'summary.approve', work.em);
      const row = await this.reviewable(caseId, work.em);
      if (!(await this.writer.approve(work.em, row, version, actor.id))) return false;
      await this.letters.tellLiaison(work.em, file, 'approved');
      const line = { actorId: actor.id, action: 'summary.approved', sentence: 'approved the summary' };
      await this.changes.commit(work, file, 'summary', line);
      return true;
    });
    const now = await this.pages.read(actor, caseId);
    if (!approved) throw stale(now);
    return now;
  }

  async giveBack(actor: Actor, caseId: string, words: string): Promise<Summary> {
    await this.work.run(async (work) => {
      const { file } = await this.access.open(actor, caseId, 'summary.approve', work.em);
      await this.writer.giveBack(work.em, await this.reviewable(caseId, work.em), words);
      await this.letters.tellLiaison(work.em, file, 'returned');
      const sentence = 'returned the summary to the liaison with words';
      await this.changes.commit(work, file, 'summary', {
        actorId: actor.id,
        action: 'summary.returned',
        sentence,
      });
    });
    return this.pages.read(actor, caseId);
  }

  private async reviewable(caseId: string, em: EntityManager): Promise<SummaryRow> {
    const { row } = await this.summaries.current(caseId, em);
    if (row?.state === 'draft' || row?.state === 'waiting') return row;
    throw new Refusal(
      'wrong-state',
      row ? 'The summary is approved already.' : 'The liaison has not written the summary yet.',
    );
  }
}

import { Injectable } from '@nestjs/common';
import type { JudgementDraft, JudgementDraftInput } from '@weighhouse/shared/contracts/judgements';
import { DataSource, type EntityManager } from 'typeorm';
import { CaseAccess } from '../../cases/case-access.js';
import { FindingsService } from '../../findings/findings.service.js';
import { Clock } from '../../platform/clock/clock.js';
import { invalid, notFound } from '../../platform/errors/refusal.js';
import type { Actor } from '../../platform/http/actor.js';
import { JudgementDraftRow } from './judgement-draft.entity.js';
import { priorTarget } from './saved-version.js';

/** What a contributor is typing. Kept as typed, shown to nobody else, in the trail of nobody. */
@Injectable()
export class DraftsService {
  constructor(
    private readonly source: DataSource,
    private readonly access: CaseAccess,
    private readonly findings: FindingsService,
    private readonly clock: Clock,
  ) {}

  /** Keeps a draft in place of the one before it. */
  async keep(
    actor: Actor,
    caseId: string,
    target: string,
    input: JudgementDraftInput,
  ): Promise<JudgementDraft> {
    await this.access.open(actor, caseId, 'judgement.draft');
    if (input.target !== target)
      throw invalid([{ path: 'target', message: 'must be the target that the address names' }]);
    await this.refuseUnknown(caseId, target);
    const { typed, ...rest } = input;
    const savedAt = this.clock.now();
    const row = { ...rest, caseId, personId: actor.id, typed: JSON.stringify(typed), savedAt };
    await this.source.manager.upsert(JudgementDraftRow, row, ['caseId', 'personId', 'target']);
    return { ...input, savedAt: savedAt.toISOString() };
  }

  /** Throws a draft away; there may be none. */
  async drop(actor: Actor, caseId: string, target: string): Promise<void> {
    await this.access.open(actor, caseId, 'judgement.draft');
    await this.source.manager.delete(JudgementDraftRow, { caseId, personId: actor.id, target });
  }

  /** One's own drafts, oldest first. The caller has let the person in. */
  async own(
    caseId: string,
    personId: string,
    em: EntityManager = this.source.manager,
  ): Promise<JudgementDraft[]> {
    const rows = await em.find(JudgementDraftRow, {
      where: { caseId, personId },
      order: { savedAt: 'ASC', target: 'ASC' },
    });
    return rows.map(({ target, candidateSet, exposure, typed, reason, savedAt }) => ({
      target,
      candidateSet,
      exposure,
      typed: JSON.parse(typed) as string[][],
      reason,
      savedAt: savedAt.toISOString(),
    }));
  }

  private async refuseUnknown(caseId: string, target: string): Promise<void> {
    if (target === priorTarget) return;
    const finding = await this.findings.byId(target);
    if (finding?.caseId !== caseId) throw notFound();
  }
}

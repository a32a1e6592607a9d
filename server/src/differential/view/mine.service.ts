import { Injectable } from '@nestjs/common';
import type { Mine } from '@weighhouse/shared/contracts/differential';
import type { EntityManager } from 'typeorm';
import { DraftsService } from '../judgements/drafts.service.js';
import { JudgementStore } from '../judgements/judgement-store.js';
import { judgementView } from '../judgements/judgement-views.js';
import { Assessments } from '../pool/assessments.js';
import { type CasePool, openRound, ownPanel } from '../pool/case-pool.js';

/** A contributor's own part of the differential: saved, typed, handed in. */
@Injectable()
export class MineService {
  constructor(
    private readonly store: JudgementStore,
    private readonly drafts: DraftsService,
    private readonly assessments: Assessments,
  ) {}

  /** For the person's own eyes alone; the caller knows that they are a contributor. */
  async of(pool: CasePool, personId: string, em: EntityManager): Promise<Mine> {
    const judgements = await this.store.latestOf(pool.caseId, personId, em);
    const round = openRound(pool) ?? pool.rounds.at(-1);
    const handIn = pool.handIns.find((one) => one.roundId === round?.id && one.personId === personId);
    return {
      key: personId,
      version: Math.max(0, ...[...judgements.values()].map((saved) => saved.version)),
      ...judgementView(pool, judgements),
      drafts: await this.drafts.own(pool.caseId, personId, em),
      handedInAt: handIn?.handedInAt.toISOString() ?? null,
      digest: handIn?.digest ?? null,
      standing: this.assessments.standingAlone(ownPanel(pool, judgements)),
    };
  }
}

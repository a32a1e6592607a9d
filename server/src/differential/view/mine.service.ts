import { Injectable } from '@nestjs/common';
import type { Mine, PanelView } from '@weighhouse/shared/contracts/differential';
import type { EntityManager } from 'typeorm';
import { DraftsService } from '../judgements/drafts.service.js';
import { JudgementStore } from '../judgements/judgement-store.js';
import { judgementView } from '../judgements/judgement-views.js';
import { type CasePool, openRound, ownPanel } from '../pool/case-pool.js';

/** A contributor's own part as it was read: where they stand alone has still to be computed. */
export interface MineRead {
  mine: Omit<Mine, 'standing'>;
  /** Their numbers alone, for their eyes. */
  panel: PanelView;
}

/** A contributor's own part of the differential: saved, typed, handed in. */
@Injectable()
export class MineService {
  constructor(
    private readonly store: JudgementStore,
    private readonly drafts: DraftsService,
  ) {}

  /** For the person's own eyes alone; the caller knows that they are a contributor. */
  async of(pool: CasePool, personId: string, em: EntityManager): Promise<MineRead> {
    const judgements = await this.store.latestOf(pool.caseId, personId, em);
    const round = openRound(pool) ?? pool.rounds.at(-1);
    const handIn = pool.handIns.find((one) => one.roundId === round?.id && one.personId === personId);
    const mine = {
      key: personId,
      version: Math.max(0, ...[...judgements.values()].map((saved) => saved.version)),
      ...judgementView(pool, judgements),
      drafts: await this.drafts.own(pool.caseId, personId, em),
      handedInAt: handIn?.handedInAt.toISOString() ?? null,
      digest: handIn?.digest ?? null,
    };
    return { mine, panel: ownPanel(pool, judgements) };
  }
}

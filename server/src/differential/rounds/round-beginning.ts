import { Injectable } from '@nestjs/common';
import type { RoundKind } from '@weighhouse/shared/contracts/rounds';
import type { EntityManager } from 'typeorm';
import { CaseLetters } from '../../cases/case-letters.js';
import { notReady } from '../../platform/errors/refusal.js';
import { type CasePool, countingFindings } from '../pool/case-pool.js';
import { PoolReader } from '../pool/pool-reader.js';
import { StandingService } from '../pool/standing.service.js';
import { missingToOpen } from './readiness.js';
import type { RoundRow } from './round.entity.js';

/** What belongs to the beginning of a round: whether it can begin, what is kept of before, and who is told. */
@Injectable()
export class RoundBeginning {
  constructor(
    private readonly pools: PoolReader,
    private readonly standings: StandingService,
    private readonly letters: CaseLetters,
  ) {}

  /** The case as it goes into the round. @throws Refusal 409 `not-ready` naming everything that is missing */
  async prepared(em: EntityManager, caseId: string, kind: RoundKind): Promise<CasePool> {
    const pool = await this.pools.read(caseId, em);
    const missing = missingToOpen(kind, {
      candidates: pool.candidates.length,
      findings: countingFindings(pool).length,
      unsealedRounds: pool.rounds.filter((round) => round.unsealedAt !== null).length,
    });
    if (missing.length > 0) throw notReady(missing);
    return pool;
  }

  /** Keeps where the panel stood, for the ledger's mark, and writes to everybody who judges but who opened it. */
  async begin(
    em: EntityManager,
    file: { id: string; number: string },
    round: RoundRow,
    pool: CasePool,
  ): Promise<void> {
    await this.standings.snapshot(em, file.id, round.id);
    const judging = pool.contributors.map((one) => one.personId).filter((id) => id !== round.openedById);
    await this.letters.roundOpened(em, file, round, judging);
  }
}

import { Injectable } from '@nestjs/common';
import type { CaseAction } from '@weighhouse/shared/access/actions';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { EntityManager } from 'typeorm';
import { CaseAccess, type OpenedCase } from '../../cases/case-access.js';
import type { Actor } from '../../platform/http/actor.js';
import { AgendaReader } from '../agenda/agenda-reader.js';
import { Assessments } from '../pool/assessments.js';
import { type CasePool, openRound } from '../pool/case-pool.js';
import { PoolReader } from '../pool/pool-reader.js';
import { Snapshots } from '../pool/snapshots.js';
import { StandingService } from '../pool/standing.service.js';
import { LedgerParts } from './ledger-parts.service.js';
import { viewOf } from './view-of.js';

/** The ledger of one case for one person. */
@Injectable()
export class DifferentialService {
  constructor(
    private readonly access: CaseAccess,
    private readonly snapshots: Snapshots,
    private readonly pools: PoolReader,
    private readonly assessments: Assessments,
    private readonly standings: StandingService,
    private readonly ledgers: LedgerParts,
    private readonly agenda: AgendaReader,
  ) {}

  /**
   * While a sealed round is open the pool, everybody's numbers and the mark of the round before are those of the last
   * round that is shown, and `shownRound` says which; in the first sealed round there are none but one's own.
   */
  async read(actor: Actor, caseId: string): Promise<Differential> {
    const opened = await this.access.open(actor, caseId, 'differential.read');
    const { pool, own, ...read } = await this.snapshots.run((em) => this.readAt(actor, opened, em));
    // Computed when nothing is held in the database any more: a heavy panel takes its time.
    const assessment = await this.assessments.of(pool, viewOf(opened.parts));
    const standing = own && (await this.assessments.standing(own.panel));
    const mine = own && { ...own.mine, standing: standing?.standing ?? null };
    return { ...read, mine, assessment };
  }

  /** Everything that is read of the ledger, at one moment. */
  private async readAt(actor: Actor, opened: OpenedCase, em: EntityManager) {
    const pool = await this.pools.read(opened.file.id, em);
    const round = openRound(pool) ?? pool.rounds.at(-1) ?? null;
    return {
      pool,
      caseId: pool.caseId,
      revision: pool.revision,
      candidateSet: pool.candidateSet,
      candidates: [...pool.candidates],
      findings: [...pool.findings],
      settings: pool.settings,
      sealed: round?.state === 'open' && round.kind === 'sealed',
      before: round ? await this.standings.before(pool, round.id, em) : null,
      agenda: await this.agenda.of(pool, em),
      abilities: abilitiesNow(opened.abilities, pool, actor.id),
      ...(await this.ledgers.read(pool, actor, opened, em)),
    };
  }
}

/** Whoever has handed in hands in no second time, and judges on only in a live round. */
function abilitiesNow(abilities: readonly CaseAction[], pool: CasePool, personId: string): CaseAction[] {
  const round = openRound(pool);
  const isIn = pool.handIns.some((handIn) => handIn.roundId === round?.id && handIn.personId === personId);
  if (!round || !isIn) return [...abilities];
  return abilities.filter(
    (action) => action !== 'judgement.handIn' && !(action === 'judgement.give' && round.kind === 'sealed'),
  );
}

import { Injectable } from '@nestjs/common';
import type { CaseAction } from '@weighhouse/shared/access/actions';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import { CaseAccess } from '../../cases/case-access.js';
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
    const view = viewOf(opened.parts);
    return this.snapshots.run(async (em) => {
      const pool = await this.pools.read(caseId, em);
      const round = openRound(pool) ?? pool.rounds.at(-1) ?? null;
      const parts = await this.ledgers.read(pool, actor, opened, em);
      return {
        caseId,
        revision: pool.revision,
        candidateSet: pool.candidateSet,
        candidates: [...pool.candidates],
        findings: [...pool.findings],
        settings: pool.settings,
        sealed: round?.state === 'open' && round.kind === 'sealed',
        assessment: this.assessments.of(pool, view),
        before: round ? await this.standings.before(pool, round.id, em) : null,
        agenda: await this.agenda.of(pool, em),
        abilities: abilitiesNow(opened.abilities, pool, actor.id),
        ...parts,
      };
    });
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

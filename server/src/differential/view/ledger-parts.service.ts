import { Injectable } from '@nestjs/common';
import type { Differential } from '@weighhouse/shared/contracts/differential';
import type { EntityManager } from 'typeorm';
import type { OpenedCase } from '../../cases/case-access.js';
import { PeopleDirectory } from '../../people/people-directory.js';
import type { Actor } from '../../platform/http/actor.js';
import { type CasePool, notIn, openRound, shownRound } from '../pool/case-pool.js';
import { RoundViews } from '../rounds/round-views.js';
import { type MineRead, MineService } from './mine.service.js';
import { othersOf } from './others.js';
import { viewOf } from './view-of.js';

/** The parts of the ledger that name people. */
@Injectable()
export class LedgerParts {
  constructor(
    private readonly people: PeopleDirectory,
    private readonly rounds: RoundViews,
    private readonly mine: MineService,
  ) {}

  async read(
    pool: CasePool,
    actor: Actor,
    opened: OpenedCase,
    em: EntityManager,
  ): Promise<Pick<Differential, 'round' | 'shownRound' | 'others'> & { own: MineRead | null }> {
    const round = openRound(pool) ?? pool.rounds.at(-1) ?? null;
    const shown = shownRound(pool);
    const people = await this.people.byIds(
      pool.contributors.map((one) => one.personId),
      em,
    );
    const names = notIn(pool).map((id) => people.get(id)?.name ?? '');
    return {
      round: round ? await this.rounds.one(round, em) : null,
      shownRound: shown ? { number: shown.number, live: shown.kind === 'live', notIn: names.sort() } : null,
      own: opened.parts.includes('contributor') ? await this.mine.of(pool, actor.id, em) : null,
      others: shown ? othersOf(pool, viewOf(opened.parts), people, actor.id) : null,
    };
  }
}

import { Injectable } from '@nestjs/common';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import type { EntityManager } from 'typeorm';
import { TeamReader } from '../cases/team-reader.js';
import { Clock } from '../platform/clock/clock.js';
import { PlanAsking } from './plan-asking.entity.js';
import { PlanLetters } from './plan-letters.js';
import { PlanRow } from './plan.entity.js';

/** Asks contributors about a draft. */
@Injectable()
export class Asking {
  constructor(
    private readonly team: TeamReader,
    private readonly letters: PlanLetters,
    private readonly clock: Clock,
  ) {}

  /**
   * Asks those who have not said anything of the text as it stands, by letter.
   * @returns how many were asked
   */
  async ask(em: EntityManager, file: { id: string; number: string }, plan: Plan): Promise<number> {
    const settled = plan.stances.filter(
      ({ stance, changedSince }) => stance !== null && changedSince !== true,
    );
    const answered = new Set(settled.map(({ person }) => person.id));
    const contributors = await this.team.contributors(file.id, em);
    const asked = contributors.map(({ personId }) => personId).filter((id) => !answered.has(id));
    const now = this.clock.now();
    if (asked.length > 0) {
      await em.upsert(
        PlanAsking,
        asked.map((personId) => ({ planId: plan.id, personId, askedAt: now })),
        ['planId', 'personId'],
      );
    }
    await em.update(PlanRow, { id: plan.id }, { askedAt: now });
    await this.letters.send(em, asked, {
      says: `You are asked whether you agree with the plan of case ${file.number}`,
      page: `/cases/${file.id}/plan`,
    });
    return asked.length;
  }
}

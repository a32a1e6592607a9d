import { Injectable } from '@nestjs/common';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import { type EntityManager, IsNull } from 'typeorm';
import { TeamReader } from '../cases/team-reader.js';
import { StandingService } from '../differential/pool/standing.service.js';
import { Clock } from '../platform/clock/clock.js';
import { stale } from '../platform/errors/refusal.js';
import { PlanLetters } from './plan-letters.js';
import { PlanRow } from './plan.entity.js';

/** Makes a draft the signed plan, and tells those who have something to do now. */
@Injectable()
export class Signing {
  constructor(
    private readonly standings: StandingService,
    private readonly team: TeamReader,
    private readonly letters: PlanLetters,
    private readonly clock: Clock,
  ) {}

  /** Keeps where the panel stands, signs, and closes the row for good. @returns the moment of signing */
  async sign(em: EntityManager, caseId: string, plan: Plan, personId: string): Promise<Date> {
    const standing = await this.standings.snapshot(em, caseId);
    const signedAt = this.clock.now();
    const written = await em.update(
      PlanRow,
      { id: plan.id, version: plan.version, signedAt: IsNull() },
      { signedAt, signedById: personId, snapshotId: standing?.id ?? null },
    );
    if (written.affected !== 1) throw stale(plan);
    return signedAt;
  }

  async tell(
    em: EntityManager,
    file: { id: string; number: string; referrerId: string },
    plan: Plan,
  ): Promise<void> {
    const team = await this.team.current(file.id, em);
    const liaisons = team.filter(({ part }) => part === 'liaison').map(({ personId }) => personId);
    const owners = new Set(plan.actions.flatMap(({ owner }) => owner?.id ?? []));
    const page = `/cases/${file.id}/plan`;
    await this.letters.send(em, liaisons, {
      says: `Case ${file.number} is closed with a plan that is to be told`,
      page: `/tell/${file.id}`,
    });
    await this.letters.send(
      em,
      [...owners].filter((id) => !liaisons.includes(id)),
      { says: `The plan of case ${file.number} asks something of you`, page },
    );
    if (owners.has(file.referrerId)) return;
    await this.letters.send(em, [file.referrerId], {
      says: `Case ${file.number} is closed with a plan`,
      page,
    });
  }
}

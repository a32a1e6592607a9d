import { Injectable } from '@nestjs/common';
import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import { DataSource, type EntityManager } from 'typeorm';
import { TeamReader } from '../cases/team-reader.js';
import { RoundReader } from '../differential/rounds/round-reader.js';
import { PeopleDirectory } from '../people/people-directory.js';
import { missingToConclude } from './missing-to-conclude.js';
import { PlanAsking } from './plan-asking.entity.js';
import { PlanStance } from './plan-stance.entity.js';

/** How far a case is from its conclusion. */
@Injectable()
export class Conclusion {
  constructor(
    private readonly source: DataSource,
    private readonly team: TeamReader,
    private readonly rounds: RoundReader,
    private readonly people: PeopleDirectory,
  ) {}

  /** What is still missing; empty when the chair can sign. */
  async missing(
    caseId: string,
    plan: Plan | null,
    em: EntityManager = this.source.manager,
  ): Promise<FieldFault[]> {
    const rounds = await this.rounds.ofCase(caseId, em);
    const notAsked = await this.notAsked(caseId, plan?.id ?? null, em);
    const people = await this.people.byIds(notAsked, em);
    return missingToConclude(plan, {
      openRound: rounds.find((round) => round.state === 'open')?.kind ?? null,
      unsealed: rounds.some((round) => round.kind === 'sealed' && round.unsealedAt !== null),
      notAsked: notAsked.map((id) => people.get(id)?.name ?? ''),
    });
  }

  /** The contributors now who were neither asked about the draft nor said anything of it. */
  private async notAsked(caseId: string, planId: string | null, em: EntityManager): Promise<string[]> {
    const contributors = (await this.team.contributors(caseId, em)).map((entry) => entry.personId);
    if (planId === null) return contributors;
    const asked = await em.findBy(PlanAsking, { planId });
    const said = await em.findBy(PlanStance, { planId });
    const known = new Set([...asked, ...said].map((row) => row.personId));
    return contributors.filter((id) => !known.has(id));
  }
}

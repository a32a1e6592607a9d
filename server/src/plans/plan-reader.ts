import { Injectable } from '@nestjs/common';
import type { PersonRef } from '@weighhouse/shared/contracts/common';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import { DataSource, type EntityManager, In, IsNull, Not } from 'typeorm';
import { TeamReader } from '../cases/team-reader.js';
import { StandingService } from '../differential/pool/standing.service.js';
import { PeopleDirectory, personRef } from '../people/people-directory.js';
import { grouped } from '../platform/database/grouped.js';
import { PlanActionRow } from './plan-action.entity.js';
import { PlanAsking } from './plan-asking.entity.js';
import { PlanStance } from './plan-stance.entity.js';
import { PlanRow } from './plan.entity.js';
import { type PlanParts, planView } from './plan-view.js';

/** Reads plans, without a check of who asks. */
@Injectable()
export class PlanReader {
  constructor(
    private readonly source: DataSource,
    private readonly people: PeopleDirectory,
    private readonly team: TeamReader,
    private readonly standings: StandingService,
  ) {}

  /** The draft that will be the next plan; null where nobody began one. */
  async draft(caseId: string, em: EntityManager = this.source.manager): Promise<Plan | null> {
    const row = await this.draftRow(caseId, em);
    const [plan] = row ? await this.plans([row], em) : [];
    return plan ?? null;
  }

  /** The signed plans of a case, the first one first. */
  async signed(caseId: string, em: EntityManager = this.source.manager): Promise<Plan[]> {
    const rows = await em.find(PlanRow, {
      where: { caseId, signedAt: Not(IsNull()) },
      order: { number: 'ASC' },
    });
    return this.plans(rows, em);
  }

  /** The plan that counts now: the last one signed. */
  async lastSigned(caseId: string, em?: EntityManager): Promise<Plan | null> {
    return (await this.signed(caseId, em)).at(-1) ?? null;
  }

  /** Number and moment of the plan signed last, of several cases; those without one are left out. */
  async lastSignedOf(caseIds: readonly string[]): Promise<Map<string, { number: number; signedAt: Date }>> {
    if (caseIds.length === 0) return new Map();
    const rows = await this.source.manager.find(PlanRow, {
      where: { caseId: In([...caseIds]), signedAt: Not(IsNull()) },
      order: { number: 'ASC' },
    });
    return new Map(
      rows.map(({ caseId, number, signedAt }) => [caseId, { number, signedAt: signedAt ?? new Date(0) }]),
    );
  }

  /** How many plans of a case are signed. */
  async signedCount(caseId: string, em: EntityManager): Promise<number> {
    return em.countBy(PlanRow, { caseId, signedAt: Not(IsNull()) });
  }

  async draftRow(caseId: string, em: EntityManager): Promise<PlanRow | null> {
    return em.findOneBy(PlanRow, { caseId, signedAt: IsNull() });
  }

  private async plans(rows: PlanRow[], em: EntityManager): Promise<Plan[]> {
    if (rows.length === 0) return [];
    const planId = In(rows.map((row) => row.id));
    const actions = grouped(
      await em.find(PlanActionRow, { where: { planId }, order: { position: 'ASC' } }),
      (row) => row.planId,
    );
    const askings = grouped(await em.findBy(PlanAsking, { planId }), (row) => row.planId);
    const stances = grouped(
      await em.find(PlanStance, { where: { planId }, order: { id: 'ASC' } }),
      (row) => row.planId,
    );
    const views: Plan[] = [];
    for (const row of rows) {
      const parts: Omit<PlanParts, 'ref'> = {
        row,
        actions: actions.get(row.id) ?? [],
        askings: askings.get(row.id) ?? [],
        stances: stances.get(row.id) ?? [],
        contributors: row.signedAt === null ? await this.contributors(row.caseId, em) : [],
        standing: row.snapshotId === null ? null : await this.standings.kept(row.snapshotId, em),
      };
      views.push(planView({ ...parts, ref: await this.names(parts, em) }));
    }
    return views;
  }

  private async contributors(caseId: string, em: EntityManager): Promise<string[]> {
    return (await this.team.contributors(caseId, em)).map((entry) => entry.personId);
  }

  private async names(
    { row, actions, askings, stances, contributors }: Omit<PlanParts, 'ref'>,
    em: EntityManager,
  ): Promise<(id: string) => PersonRef> {
    const owners = actions.flatMap(({ ownerId }) => (ownerId === null ? [] : [ownerId]));
    const ids = [...askings, ...stances].map(({ personId }) => personId);
    const signer = row.signedById === null ? [] : [row.signedById];
    const people = await this.people.byIds([...owners, ...ids, ...contributors, ...signer], em);
    return (id) => {
      const entry = people.get(id);
      return entry ? personRef(entry) : { id, name: '', specialty: '', centre: '' };
    };
  }
}

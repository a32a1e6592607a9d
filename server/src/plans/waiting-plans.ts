import { Injectable } from '@nestjs/common';
import { DataSource, In, IsNull, Not } from 'typeorm';
import { grouped } from '../platform/database/grouped.js';
import { PlanActionRow } from './plan-action.entity.js';
import { PlanAsking } from './plan-asking.entity.js';
import { PlanStance } from './plan-stance.entity.js';
import { PlanRow } from './plan.entity.js';

/** An action of a signed plan that is not done. */
export interface OpenAction {
  id: string;
  caseId: string;
  what: string;
  /** A calendar day. */
  due: string | null;
  since: Date;
}

/** A draft about which a person is asked. */
export interface OpenQuestion {
  caseId: string;
  since: Date;
}

/** What plans ask of a person. */
@Injectable()
export class WaitingPlans {
  constructor(private readonly source: DataSource) {}

  /** The actions that a person owns and has not done. */
  async actionsOf(personId: string): Promise<OpenAction[]> {
    const { manager } = this.source;
    const actions = await manager.findBy(PlanActionRow, { ownerId: personId, doneAt: IsNull() });
    const signed = await manager.findBy(PlanRow, {
      id: In(actions.map(({ planId }) => planId)),
      signedAt: Not(IsNull()),
    });
    return signed.flatMap(({ id: planId, caseId, signedAt }) =>
      actions
        .filter((action) => action.planId === planId && signedAt !== null)
        .map(({ id, what, due }) => ({ id, caseId, what, due, since: signedAt ?? new Date(0) })),
    );
  }

  /** The drafts about which a person was asked and has not answered since. */
  async questionsTo(personId: string): Promise<OpenQuestion[]> {
    const { manager } = this.source;
    const askings = await manager.findBy(PlanAsking, { personId });
    const planId = In(askings.map((asking) => asking.planId));
    const drafts = await manager.findBy(PlanRow, { id: planId, signedAt: IsNull() });
    const said = grouped(await manager.findBy(PlanStance, { personId, planId }), (row) => row.planId);
    return drafts.flatMap(({ id, caseId }) => {
      const since = askings.find((asking) => asking.planId === id)?.askedAt ?? new Date(0);
      const answered = said.get(id)?.some((stance) => stance.at.getTime() >= since.getTime()) ?? false;
      return answered ? [] : [{ caseId, since }];
    });
  }
}

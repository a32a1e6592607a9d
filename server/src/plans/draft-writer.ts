import { randomUUID } from 'node:crypto';
import { Injectable } from '@nestjs/common';
import type { Plan, PlanInput } from '@weighhouse/shared/contracts/plans';
import { type EntityManager, In } from 'typeorm';
import { TeamReader } from '../cases/team-reader.js';
import { CandidatesService } from '../findings/candidates.service.js';
import { Clock } from '../platform/clock/clock.js';
import { invalid, stale } from '../platform/errors/refusal.js';
import { draftFaults } from './draft-faults.js';
import { PlanActionRow } from './plan-action.entity.js';
import { PlanRow } from './plan.entity.js';
import { sameText } from './same-text.js';

/** Writes the rows of a draft. */
@Injectable()
export class DraftWriter {
  constructor(
    private readonly clock: Clock,
    private readonly team: TeamReader,
    private readonly candidates: CandidatesService,
  ) {}

  /** @throws Refusal invalid with every reference that leads nowhere */
  async check(em: EntityManager, caseId: string, draft: Plan | null, input: PlanInput): Promise<void> {
    const faults = draftFaults(input, {
      candidateIds: new Set((await this.candidates.all(caseId, em)).map(({ id }) => id)),
      teamIds: new Set((await this.team.current(caseId, em)).map(({ personId }) => personId)),
      actionIds: new Set(draft?.actions.map(({ id }) => id)),
    });
    if (faults.length > 0) throw invalid(faults);
  }

  /** Begins the draft of the plan with this number. */
  async begin(
    em: EntityManager,
    caseId: string,
    number: number,
    personId: string,
    input: PlanInput,
  ): Promise<void> {
    const id = randomUUID();
    await em.insert(PlanRow, {
      id,
      caseId,
      number,
      version: 1,
      ...textOf(input),
      changedAt: this.clock.now(),
      changedById: personId,
    });
    await this.writeActions(em, id, [], input);
  }

  /** @throws Refusal stale when the draft is no longer what the writer saw */
  async change(em: EntityManager, draft: Plan, personId: string, input: PlanInput): Promise<void> {
    const mark = sameText(draft, input) ? {} : { changedAt: this.clock.now(), changedById: personId };
    const written = await em.update(
      PlanRow,
      { id: draft.id, version: input.version },
      { ...textOf(input), ...mark, version: input.version + 1 },
    );
    if (written.affected !== 1) throw stale(draft);
    await this.writeActions(
      em,
      draft.id,
      draft.actions.map(({ id }) => id),
      input,
    );
  }

  private async writeActions(
    em: EntityManager,
    planId: string,
    before: readonly string[],
    input: PlanInput,
  ): Promise<void> {
    const kept = new Set(input.actions.flatMap(({ id }) => id ?? []));
    const gone = before.filter((id) => !kept.has(id));
    if (gone.length > 0) await em.delete(PlanActionRow, { planId, id: In(gone) });
    for (const [position, { id, ...action }] of input.actions.entries()) {
      if (id === undefined) await em.insert(PlanActionRow, { id: randomUUID(), planId, position, ...action });
      else await em.update(PlanActionRow, { planId, id }, { position, ...action });
    }
  }
}

const textOf = ({ workingDiagnosis, candidateId, certainty, remainingDoubt, safetyNet }: PlanInput) => ({
  workingDiagnosis,
  candidateId: candidateId ?? null,
  certainty,
  remainingDoubt,
  safetyNet,
});

import type { PersonRef } from '@weighhouse/shared/contracts/common';
import type { Plan } from '@weighhouse/shared/contracts/plans';
import type { PlanActionRow } from './plan-action.entity.js';
import type { PlanAsking } from './plan-asking.entity.js';
import type { PlanStance } from './plan-stance.entity.js';
import type { PlanRow } from './plan.entity.js';

/** Everything that a plan is put together from. */
export interface PlanParts {
  row: PlanRow;
  actions: readonly PlanActionRow[];
  askings: readonly Pick<PlanAsking, 'personId'>[];
  /** First to last. */
  stances: readonly Pick<PlanStance, 'personId' | 'stance' | 'words' | 'at'>[];
  /** Of a draft: who contributes now. A signed plan keeps those who were asked or spoke. */
  contributors: readonly string[];
  standing: { rows: { name: string; share: number }[]; method: string } | null;
  ref: (personId: string) => PersonRef;
}

/** A plan as its readers see it. */
export function planView(parts: PlanParts): Plan {
  const { row, ref, standing } = parts;
  return {
    id: row.id,
    number: row.number,
    version: row.version,
    workingDiagnosis: row.workingDiagnosis,
    candidateId: row.candidateId,
    certainty: row.certainty,
    remainingDoubt: row.remainingDoubt,
    safetyNet: row.safetyNet,
    actions: parts.actions.map((action) => ({
      id: action.id,
      what: action.what,
      owner: action.ownerId === null ? null : ref(action.ownerId),
      due: action.due,
      concernsPatient: action.concernsPatient,
      doneAt: action.doneAt?.toISOString() ?? null,
      doneWords: action.doneWords,
    })),
    askedAt: row.askedAt?.toISOString() ?? null,
    stances: stancesOf(parts),
    signedAt: row.signedAt?.toISOString() ?? null,
    signedBy: row.signedById === null ? null : ref(row.signedById),
    standing: standing?.rows.map(({ name, share }) => ({ name, share })) ?? null,
    method: standing?.method ?? null,
  };
}

/** One line for each contributor, with the last thing that they said. */
function stancesOf({ row, askings, stances, contributors, ref }: PlanParts): Plan['stances'] {
  const last = new Map(stances.map((stance) => [stance.personId, stance]));
  const asked = askings.map(({ personId }) => personId);
  const people = contributors.length > 0 ? [...contributors, ...last.keys()] : [...asked, ...last.keys()];
  return [...new Set(people)].map((personId) => {
    const said = last.get(personId);
    return {
      person: ref(personId),
      stance: said?.stance ?? null,
      words: said?.words ?? null,
      at: said?.at.toISOString() ?? null,
      ...(said ? { changedSince: said.at.getTime() < row.changedAt.getTime() } : {}),
    };
  });
}

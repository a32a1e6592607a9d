import {
  certaintySchema,
  type Certainty,
  type Plan,
  type PlanInput,
} from '@weighhouse/shared/contracts/plans';
import { z } from 'zod';

/** An action while it is being written. `key` holds it in its place on the screen before the server gives an id. */
const actionDraftSchema = z.object({
  key: z.string(),
  id: z.string().optional(),
  what: z.string(),
  ownerId: z.string().nullable(),
  due: z.string().nullable(),
  concernsPatient: z.boolean(),
});
export type ActionDraft = z.infer<typeof actionDraftSchema>;

const planDraftSchema = z.object({
  workingDiagnosis: z.string(),
  candidateId: z.string().nullable(),
  certainty: certaintySchema.nullable(),
  remainingDoubt: z.string(),
  safetyNet: z.string(),
  actions: z.array(actionDraftSchema),
});
export type PlanDraft = z.infer<typeof planDraftSchema>;
export const keptPlanSchema = z.object({ version: z.number(), value: planDraftSchema });

export function draftOf(plan: Plan | null): PlanDraft {
  return {
    workingDiagnosis: plan?.workingDiagnosis ?? '',
    candidateId: plan?.candidateId ?? null,
    certainty: plan?.certainty ?? null,
    remainingDoubt: plan?.remainingDoubt ?? '',
    safetyNet: plan?.safetyNet ?? '',
    actions: (plan?.actions ?? []).map(({ id, what, owner, due, concernsPatient }) => ({
      key: id,
      id,
      what,
      ownerId: owner?.id ?? null,
      due,
      concernsPatient,
    })),
  };
}

export const emptyAction = (key: string): ActionDraft => ({
  key,
  what: '',
  ownerId: null,
  due: null,
  concernsPatient: false,
});

/** An action is sent once it says what is to be done. */
export const isSent = (action: ActionDraft) => action.what.trim() !== '';

/** Its place among the actions that the server has, as faults and missing parts count it; null for one not sent. */
export function sentPlace(actions: readonly ActionDraft[], key: string): number | null {
  const place = actions.filter(isSent).findIndex((action) => action.key === key);
  return place < 0 ? null : place;
}

/** Nothing of it would be lost if this browser forgot it. */
export function isWhole({ actions }: PlanDraft): boolean {
  return actions.every(
    (one) => isSent(one) || (one.ownerId === null && one.due === null && !one.concernsPatient),
  );
}

export function inputOf(draft: PlanDraft, version: number): PlanInput {
  return {
    version,
    workingDiagnosis: draft.workingDiagnosis.trim(),
    candidateId: draft.candidateId,
    certainty: draft.certainty,
    remainingDoubt: draft.remainingDoubt.trim(),
    safetyNet: draft.safetyNet.trim(),
    actions: draft.actions.filter(isSent).map(({ id, what, ownerId, due, concernsPatient }) => ({
      ...(id === undefined ? {} : { id }),
      what: what.trim(),
      ownerId,
      due,
      concernsPatient,
    })),
  };
}

/** The same text; identifiers that the server gave meanwhile do not count. */
export function sameDraft(one: PlanDraft, other: PlanDraft): boolean {
  return JSON.stringify(withoutIds(one)) === JSON.stringify(withoutIds(other));
}

function withoutIds(draft: PlanDraft): PlanInput {
  const input = inputOf(draft, 0);
  return { ...input, actions: input.actions.map(({ id: _id, ...action }) => action) };
}

/** Gives new actions the ids that the server gave them, by their place in what was sent. */
export function adoptIds(local: PlanDraft, sent: PlanDraft, saved: PlanDraft): PlanDraft {
  const rows = sent.actions.filter(isSent);
  if (rows.length !== saved.actions.length) return local;
  const ids = new Map(rows.map((row, place) => [row.key, saved.actions[place]?.id]));
  return {
    ...local,
    // A row that was emptied is gone on the server: its old id must not be sent again.
    actions: local.actions.map(({ id: _id, ...row }) => withId(row, ids.get(row.key))),
  };
}

/** One's own text upon somebody else's: actions that they removed are new again. */
export function rebaseDraft(mine: PlanDraft, theirs: PlanDraft): PlanDraft {
  const known = new Set(theirs.actions.map((action) => action.id));
  return {
    ...mine,
    actions: mine.actions.map(({ id, ...row }) => withId(row, known.has(id) ? id : undefined)),
  };
}

const withId = (row: Omit<ActionDraft, 'id'>, id: string | undefined): ActionDraft =>
  id === undefined ? row : { ...row, id };

/** Moves an action by one place; at the end of the list nothing moves. */
export function moved(actions: readonly ActionDraft[], place: number, by: -1 | 1): ActionDraft[] {
  const next = [...actions];
  const [one, other] = [next[place], next[place + by]];
  if (one && other) {
    next[place] = other;
    next[place + by] = one;
  }
  return next;
}

export type { Certainty };

import type { Plan, PlanInput } from '@weighhouse/shared/contracts/plans';

/** Whether a save says what the draft says already, so that what was said of it is still said of the same text. */
export function sameText(draft: Plan, input: PlanInput): boolean {
  const before = draft.actions.map((action) => [
    action.what,
    action.owner?.id ?? null,
    action.due,
    action.concernsPatient,
  ]);
  const after = input.actions.map((action) => [
    action.what,
    action.ownerId,
    action.due,
    action.concernsPatient,
  ]);
  return (
    draft.workingDiagnosis === input.workingDiagnosis &&
    draft.candidateId === (input.candidateId ?? null) &&
    draft.certainty === input.certainty &&
    draft.remainingDoubt === input.remainingDoubt &&
    draft.safetyNet === input.safetyNet &&
    JSON.stringify(before) === JSON.stringify(after)
  );
}

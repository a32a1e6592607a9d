import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { PlanInput } from '@weighhouse/shared/contracts/plans';

/** What a draft may refer to. */
export interface DraftReferences {
  /** The case's candidates, the retired ones included. */
  candidateIds: ReadonlySet<string>;
  /** Everybody on the team. */
  teamIds: ReadonlySet<string>;
  /** The draft's actions so far. */
  actionIds: ReadonlySet<string>;
}

/** Every reference of a draft that leads nowhere, with its path. */
export function draftFaults(input: PlanInput, known: DraftReferences): FieldFault[] {
  const faults: FieldFault[] = [];
  if (input.candidateId != null && !known.candidateIds.has(input.candidateId))
    faults.push({ path: 'candidateId', message: 'must be a candidate of this case' });
  const seen = new Set<string>();
  input.actions.forEach((action, index) => {
    const path = `actions[${String(index)}]`;
    if (action.id !== undefined && (!known.actionIds.has(action.id) || seen.has(action.id)))
      faults.push({ path: `${path}.id`, message: 'must be an action of this plan, named once' });
    if (action.id !== undefined) seen.add(action.id);
    if (action.ownerId !== null && !known.teamIds.has(action.ownerId))
      faults.push({ path: `${path}.ownerId`, message: 'must be somebody on the team' });
  });
  return faults;
}

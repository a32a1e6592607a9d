import type { FieldFault } from '@weighhouse/shared/contracts/errors';
import type { Plan } from '@weighhouse/shared/contracts/plans';

/** What concluding looks at besides the plan. */
export interface ConclusionFacts {
  /** The kind of the open round, or null. */
  openRound: 'sealed' | 'live' | null;
  /** A sealed round was unsealed. */
  unsealed: boolean;
  /** Names of the contributors who were neither asked nor said anything. */
  notAsked: readonly string[];
}

/** What the plan's text still needs, in words, with the paths of its fields. */
export function missingInPlan(plan: Plan | null): FieldFault[] {
  if (!plan) return [{ path: 'plan', message: 'must be written first' }];
  const missing: FieldFault[] = [];
  const say = (path: string, message: string): number => missing.push({ path, message });
  if (plan.workingDiagnosis === '')
    say('workingDiagnosis', 'must name the working diagnosis, or say that there is none');
  if (plan.certainty === null) say('certainty', 'must say how certain it is');
  if (plan.remainingDoubt === '') say('remainingDoubt', 'must say what doubt remains');
  if (plan.actions.length === 0) say('actions', 'must name at least one action');
  plan.actions.forEach((action, index) => {
    const path = `actions[${String(index)}]`;
    if (action.owner === null) say(`${path}.ownerId`, 'must say who does it');
    if (action.due === null) say(`${path}.due`, 'must say by when');
  });
  if (plan.safetyNet === '') say('safetyNet', 'must say what to watch for and what to do then');
  return missing;
}

/** Everything that stands between the plan and its signature. */
export function missingToConclude(plan: Plan | null, facts: ConclusionFacts): FieldFault[] {
  const missing = missingInPlan(plan);
  const say = (path: string, message: string): number => missing.push({ path, message });
  for (const name of facts.notAsked) say('stances', `${name} must be asked for agreement or dissent`);
  if (facts.openRound === 'sealed') say('round', 'a sealed round is open: unseal or close it first');
  if (!facts.unsealed) say('round', 'a sealed round must have been unsealed');
  return missing;
}

import type { FieldFault } from '@weighhouse/shared/contracts/errors';

/** Names of the plan's fields, by path. */
export const planLabels: Readonly<Record<string, string>> = {
  workingDiagnosis: 'Working diagnosis',
  candidateId: 'Candidate',
  certainty: 'How certain it is',
  remainingDoubt: 'Remaining doubt',
  actions: 'Actions',
  safetyNet: 'Safety-net advice',
};

/** A part of the plan that is missing or wrong, with the name of its field in front where it has one. */
export function missingWords({ path, message }: FieldFault): string {
  const action = /^actions\[(\d+)\]/.exec(path);
  if (action) return `Action ${String(Number(action[1]) + 1)} ${message}`;
  if (path === 'plan') return `The plan ${message}`;
  const label = planLabels[path];
  if (label !== undefined) return `${label}: ${message}`;
  return message.charAt(0).toUpperCase() + message.slice(1);
}

/** It is missing in the plan's own text, so that nobody can be asked about it yet. */
export const isOfText = ({ path }: FieldFault) => path !== 'stances' && path !== 'round';

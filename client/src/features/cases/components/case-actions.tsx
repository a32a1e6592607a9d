import type { Case } from '@weighhouse/shared/contracts/cases';

/** What this person may do with the case as a whole. */
export function CaseActions({ of }: { of: Case }) {
  return of.abilities.length === 0 ? null : null;
}

import type { ChangedWhat } from '@weighhouse/shared/contracts/live';

/**
 * Which of a case's queries a change makes old, by the third part of their key. The case itself carries the revision,
 * its counts and the abilities, so it is always among them.
 */
const stale: Record<ChangedWhat, readonly string[]> = {
  case: ['case', 'team', 'settings', 'summary', 'identity', 'trail'],
  team: ['case', 'team', 'differential', 'panel', 'plan', 'rounds', 'trail'],
  settings: ['case', 'settings', 'differential', 'panel', 'trail'],
  reports: ['case', 'reports', 'trail'],
  candidates: ['case', 'candidates', 'differential', 'panel', 'trail'],
  findings: ['case', 'findings', 'differential', 'panel', 'trail'],
  agenda: ['case', 'differential', 'trail'],
  round: ['case', 'rounds', 'seals', 'differential', 'panel', 'plan', 'trail'],
  judgements: ['case', 'differential', 'panel'],
  plan: ['case', 'plan', 'summary', 'trail'],
  summary: ['case', 'summary', 'trail'],
  outcome: ['case', 'outcome', 'trail'],
};

export function staleParts(what: ChangedWhat): readonly string[] {
  return stale[what];
}

/** Whether events were missed between the last revision seen and this one. */
export function isGap(last: number | undefined, revision: number): boolean {
  return last !== undefined && revision > last + 1;
}

/** Judgements move a single number on a list; everything else can change what waits for a person. */
export function touchesLists(what: ChangedWhat): boolean {
  return what !== 'findings' && what !== 'agenda' && what !== 'reports';
}

import { can, type CaseSubject } from '@weighhouse/shared/access/can';
import type { ChangedWhat } from '@weighhouse/shared/contracts/live';
import type { Role } from '@weighhouse/shared/contracts/people';

/** How much of a case's news somebody gets: everything of the panel's, only what the patient is told, or nothing. */
export type Hearing = 'panel' | 'patient' | null;

const toldToPatient: readonly ChangedWhat[] = ['case', 'plan', 'summary'];

/** What a person may hear of a case as they stand to it now. A liaison hears nothing of how the panel judges. */
export function hearingOf(actor: { roles: readonly Role[] }, subject: CaseSubject): Hearing {
  if (can(actor, 'case.read', subject) === 'yes') return 'panel';
  const liaison = subject.parts.includes('liaison') && can(actor, 'identity.read', subject) === 'yes';
  return liaison ? 'patient' : null;
}

/**
 * Whether a change is told to somebody. While a sealed round is open nothing is told of judgements, not even of those
 * saved just before it.
 */
export function hears(hearing: Hearing, what: ChangedWhat, sealed: boolean): boolean {
  if (hearing === null || (sealed && what === 'judgements')) return false;
  return hearing === 'panel' || toldToPatient.includes(what);
}

/** Whether the new standing is told to somebody. */
export function hearsStanding(
  actor: { roles: readonly Role[] },
  subject: CaseSubject,
  hearing: Hearing,
): boolean {
  return hearing === 'panel' && subject.openRound !== 'sealed' && can(actor, 'panel.read', subject) === 'yes';
}

/** The changes that can move the standing. */
const movers: readonly ChangedWhat[] = ['judgements', 'round', 'team', 'settings', 'candidates', 'findings'];
export const movesStanding = (what: ChangedWhat): boolean => movers.includes(what);

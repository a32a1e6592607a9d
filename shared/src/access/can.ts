import type { CaseState, Part } from '../contracts/cases.js';
import type { Role } from '../contracts/people.js';
import { type CaseAction, caseActions, type Rule, rules } from './actions.js';

/** Who asks. */
export interface Actor {
  roles: readonly Role[];
}

/** What is asked about: the case as this actor stands to it. */
export interface CaseSubject {
  state: CaseState;
  /** The actor's parts on this case's team; empty for somebody who is not on it. */
  parts: readonly Part[];
  /** The kind of the open round, or null. */
  openRound: 'sealed' | 'live' | null;
}

/**
 * The answer of a policy. A stranger is told nothing (404), the wrong part is refused (403), the right person at the
 * wrong time gets a reason (409).
 */
export type Verdict = 'yes' | 'stranger' | 'wrongPart' | 'wrongState' | 'roundOpen' | 'roundNotOpen';

const partNeedsRole: Record<Part, Role> = {
  referrer: 'referrer',
  contributor: 'specialist',
  chair: 'chair',
  liaison: 'liaison',
};

/** A part can be given only to a person who holds this role; a chair may also contribute. */
export function mayTakePart(roles: readonly Role[], part: Part): boolean {
  return roles.includes(partNeedsRole[part]) || (part === 'contributor' && roles.includes('chair'));
}

/**
 * Decides whether an actor may do an action on a case. Pure, the same on the server, which refuses, and on the
 * client, which only hides what would be refused.
 */
export function can(actor: Actor, action: CaseAction, subject: CaseSubject): Verdict {
  const rule: Rule = rules[action];
  const chairAtLarge = subject.state === 'submitted' && actor.roles.includes('chair');
  const byPart = subject.parts.some((part) => rule.parts.includes(part));
  const byRole = rule.anyChairWhileSubmitted === true && chairAtLarge;
  if (!byPart && !byRole) return subject.parts.length > 0 || chairAtLarge ? 'wrongPart' : 'stranger';
  if (subject.state === 'withdrawn' && !subject.parts.includes('referrer')) return 'wrongPart';
  if (subject.state === 'draft' && !subject.parts.includes('referrer')) return 'stranger';
  if (rule.states && !rule.states.includes(subject.state)) return 'wrongState';
  if (rule.notWhile === 'anyRound' && subject.openRound !== null) return 'roundOpen';
  if (rule.notWhile === 'sealedRound' && subject.openRound === 'sealed') return 'roundOpen';
  if (rule.needsRound === true && subject.openRound === null) return 'roundNotOpen';
  return 'yes';
}

/** The actions that an actor may do on a case now, for `abilities` in an answer. */
export function abilitiesOf(actor: Actor, subject: CaseSubject): CaseAction[] {
  return caseActions.filter((action) => can(actor, action, subject) === 'yes');
}

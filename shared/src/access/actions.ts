import type { CaseState, Part } from '../contracts/cases.js';

/** Who may do an action on a case and when. */
export interface Rule {
  /** The parts of the team that may. */
  parts: readonly Part[];
  /** Every chair may while the case is submitted and nobody has accepted it. */
  anyChairWhileSubmitted?: true;
  /** The states of the case in which it can be done; left out: any. */
  states?: readonly CaseState[];
  /** An open round of this kind stands in the way. */
  notWhile?: 'sealedRound' | 'anyRound';
  /** A round must be open. */
  needsRound?: true;
}

const team: readonly Part[] = ['referrer', 'contributor', 'chair'];
const working: readonly CaseState[] = ['accepted', 'judging'];

/**
 * Every action on a case. The words are the ones of @Access on the server and of `abilities` in the answers.
 * Withdrawn cases stay open to the referrer alone: see can.ts.
 */
export const rules = {
  'case.read': { parts: team, anyChairWhileSubmitted: true },
  'case.edit': { parts: ['referrer'], states: ['draft', 'returned'] },
  'case.submit': { parts: ['referrer'], states: ['draft', 'returned'] },
  'case.withdraw': {
    parts: ['referrer'],
    states: ['draft', 'submitted', 'returned', 'accepted', 'judging', 'concluded'],
  },
  'case.return': { parts: ['chair'], anyChairWhileSubmitted: true, states: ['submitted'] },
  'case.decline': {
    parts: ['chair'],
    anyChairWhileSubmitted: true,
    states: ['submitted', 'accepted'],
    notWhile: 'anyRound',
  },
  'case.accept': { parts: ['chair'], anyChairWhileSubmitted: true, states: ['submitted'] },
  'case.reopen': { parts: ['chair'], states: ['concluded', 'outcomeKnown'] },
  'team.set': {
    parts: ['chair'],
    anyChairWhileSubmitted: true,
    states: ['submitted', ...working, 'concluded'],
  },
  'settings.change': { parts: ['chair'], states: working },
  'report.read': { parts: team, anyChairWhileSubmitted: true },
  'report.add': { parts: team, states: ['draft', 'returned', 'submitted', ...working] },
  'report.remove': { parts: ['referrer'], states: ['draft', 'returned'] },
  'finding.read': { parts: team, anyChairWhileSubmitted: true },
  'finding.add': { parts: team, states: ['draft', 'returned', ...working] },
  'finding.change': { parts: team, states: ['draft', 'returned', ...working] },
  'candidate.read': { parts: team, anyChairWhileSubmitted: true },
  'candidate.add': { parts: ['contributor', 'chair'], states: working, notWhile: 'sealedRound' },
  'candidate.retire': { parts: ['chair'], states: working, notWhile: 'sealedRound' },
  'round.read': { parts: team },
  'round.open': { parts: ['chair'], states: working, notWhile: 'anyRound' },
  'round.unseal': { parts: ['chair'], states: ['judging'], needsRound: true },
  'round.close': { parts: ['chair'], states: ['judging'], needsRound: true },
  'judgement.give': { parts: ['contributor'], states: ['judging'], needsRound: true },
  'judgement.draft': { parts: ['contributor'], states: ['judging'] },
  'judgement.handIn': { parts: ['contributor'], states: ['judging'], needsRound: true },
  'differential.read': { parts: team, anyChairWhileSubmitted: true },
  'agenda.change': { parts: ['chair'], states: ['judging'] },
  'seal.read': { parts: team },
  'seal.verify': { parts: ['contributor', 'chair'] },
  'panel.read': { parts: team },
  'plan.read': { parts: team },
  'plan.write': { parts: ['chair'], states: working },
  'plan.ask': { parts: ['chair'], states: working, notWhile: 'sealedRound' },
  'plan.stance': { parts: ['contributor'], states: working },
  'plan.conclude': { parts: ['chair'], states: ['judging'], notWhile: 'sealedRound' },
  'summary.read': {
    parts: ['referrer', 'contributor', 'chair', 'liaison'],
    states: ['concluded', 'outcomeKnown', 'judging'],
  },
  'summary.write': { parts: ['liaison'], states: ['concluded', 'outcomeKnown'] },
  'summary.approve': { parts: ['chair'], states: ['concluded', 'outcomeKnown'] },
  'summary.tell': { parts: ['liaison'], states: ['concluded', 'outcomeKnown'] },
  'identity.read': { parts: ['referrer', 'liaison'] },
  'identity.write': {
    parts: ['referrer', 'liaison'],
    states: ['draft', 'submitted', 'returned', ...working, 'concluded', 'outcomeKnown'],
  },
  'outcome.record': { parts: ['chair', 'referrer'], states: ['concluded'] },
  'outcome.read': { parts: team },
  'trail.read': { parts: ['referrer', 'contributor', 'chair', 'liaison'] },
  'export.read': { parts: team },
} as const satisfies Record<string, Rule>;

export type CaseAction = keyof typeof rules;
export const caseActions = Object.keys(rules) as CaseAction[];

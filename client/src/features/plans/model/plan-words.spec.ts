import type { Plan } from '@weighhouse/shared/contracts/plans';
import { describe, expect, it } from 'vitest';
import { lateWords, planTitle, stanceCount, waitingWords } from './plan-words';

const person = (name: string) => ({ id: name, name, specialty: '', centre: '' });
const stance = (name: string, given: 'agree' | 'dissent' | null) => ({
  person: person(name),
  stance: given,
  words: null,
  at: null,
});
const plan = (change: Partial<Plan>): Plan => ({
  id: 'p',
  number: 1,
  version: 1,
  workingDiagnosis: '',
  candidateId: null,
  certainty: null,
  remainingDoubt: '',
  safetyNet: '',
  actions: [],
  askedAt: null,
  stances: [],
  signedAt: null,
  signedBy: null,
  standing: null,
  method: null,
  ...change,
});
const view = (draft: Plan | null, signed: Plan[] = []) => ({ draft, signed, missing: [], abilities: [] });

describe('plan words', () => {
  it('says in the title what is so', () => {
    const stances = [stance('Dr A', 'agree'), stance('Dr B', null), stance('Dr C', null)];
    expect(planTitle(view(null), true)).toBe('No plan yet');
    expect(planTitle(view(plan({ stances })), true)).toBe('Plan 1 is a draft; nobody has been asked yet');
    const asked = plan({ stances, askedAt: '2026-12-01T10:00:00Z' });
    expect(planTitle(view(asked), true)).toBe('Plan 1: one of three contributors answered');
    const silent = { ...asked, stances: [stance('Dr A', null), stance('Dr B', null)] };
    expect(planTitle(view(silent), true)).toBe('Plan 1: none of two contributors answered');
    expect(planTitle(view({ ...asked, stances: [stance('Dr A', 'dissent')] }), true)).toBe(
      'Plan 1: every contributor answered',
    );
    const signed = view(null, [plan({ number: 2 }), plan({ number: 1 })]);
    expect(planTitle(signed, false)).toBe('Closed with plan 2');
    expect(planTitle(signed, true)).toBe('Reopened since plan 2; no later plan yet');
  });

  it('names who has not answered and counts who has', () => {
    const one = plan({ stances: [stance('Dr A', 'agree'), stance('Dr B', null)] });
    expect(waitingWords(one)).toBe('Dr B has not answered yet.');
    expect(stanceCount(one)).toBe('One agrees, nobody dissents.');
    const many = plan({ stances: [stance('Dr A', 'dissent'), stance('Dr B', null), stance('Dr C', null)] });
    expect(waitingWords(many)).toBe('Dr B and Dr C have not answered yet.');
    expect(stanceCount(many)).toBe('Nobody agrees, one dissents.');
    expect(stanceCount(plan({ stances: [stance('Dr A', null)] }))).toBe('Nobody has answered yet.');
  });

  it('is late from the day after the due day, across the end of a month and a change of clocks', () => {
    expect(lateWords('2026-11-27', '2026-11-27')).toBeNull();
    expect(lateWords('2026-11-27', '2026-11-28')).toBe('1 day late');
    expect(lateWords('2026-10-24', '2026-11-01')).toBe('8 days late');
    expect(lateWords('2026-12-24', '2026-12-01')).toBeNull();
  });
});

import type { Plan } from '@weighhouse/shared/contracts/plans';
import { describe, expect, it } from 'vitest';
import { missingToConclude } from './missing-to-conclude.js';

const person = { id: 'a', name: 'Dr A', specialty: '', centre: '' };
const whole: Plan = {
  id: 'p',
  number: 1,
  version: 3,
  workingDiagnosis: 'Giant cell arteritis',
  candidateId: null,
  certainty: 'provisional',
  remainingDoubt: 'The biopsy may still be negative',
  safetyNet: 'Come at once with a change of sight',
  actions: [
    {
      id: 'x',
      what: 'Biopsy',
      owner: person,
      due: '2026-11-30',
      concernsPatient: true,
      doneAt: null,
      doneWords: null,
    },
  ],
  askedAt: '2026-11-02T10:00:00.000Z',
  stances: [],
  signedAt: null,
  signedBy: null,
  standing: null,
  method: null,
};
const ready = { openRound: null, unsealed: true, notAsked: [] };
const paths = (...input: Parameters<typeof missingToConclude>): string[] =>
  missingToConclude(...input).map(({ path }) => path);

describe('missingToConclude', () => {
  it('misses nothing of a whole plan, also while a live round is open', () => {
    expect(missingToConclude(whole, ready)).toEqual([]);
    expect(missingToConclude(whole, { ...ready, openRound: 'live' })).toEqual([]);
  });

  it.each<[string, Partial<Plan>]>([
    ['workingDiagnosis', { workingDiagnosis: '' }],
    ['certainty', { certainty: null }],
    ['remainingDoubt', { remainingDoubt: '' }],
    ['safetyNet', { safetyNet: '' }],
    ['actions', { actions: [] }],
    ['actions[0].ownerId', { actions: whole.actions.map((action) => ({ ...action, owner: null })) }],
    ['actions[0].due', { actions: whole.actions.map((action) => ({ ...action, due: null })) }],
  ])('names %s', (path, change) => {
    expect(paths({ ...whole, ...change }, ready)).toEqual([path]);
  });

  it('names everything at once, and every contributor who was not asked', () => {
    expect(paths(null, { openRound: 'sealed', unsealed: false, notAsked: ['Dr B', 'Dr C'] })).toEqual([
      'plan',
      'stances',
      'stances',
      'round',
      'round',
    ]);
    const [first] = missingToConclude(whole, { ...ready, notAsked: ['Dr B'] });
    expect(first?.message).toBe('Dr B must be asked for agreement or dissent');
  });
});

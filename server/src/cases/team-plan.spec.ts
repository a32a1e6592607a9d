import { describe, expect, it } from 'vitest';
import { changedWeights, missingInTeam, planTeam, type TeamQuestion } from './team-plan.js';

const people = new Map([
  ['ref', { name: 'Dr Referrer', roles: ['referrer'] as const, active: true }],
  ['cha', { name: 'Dr Chair', roles: ['chair'] as const, active: true }],
  ['one', { name: 'Dr One', roles: ['specialist'] as const, active: true }],
  ['two', { name: 'Dr Two', roles: ['specialist'] as const, active: true }],
  ['gone', { name: 'Dr Gone', roles: ['specialist'] as const, active: false }],
  ['lia', { name: 'Nurse', roles: ['liaison'] as const, active: true }],
]);
const seat = (personId: string, weight: number, leftAt: Date | null = null) => ({
  personId,
  part: 'contributor' as const,
  weight,
  reason: weight === 1 ? null : 'knows it well',
  leftAt,
});
const plan = (question: Partial<TeamQuestion>) =>
  planTeam({ input: [], known: [], people, referrerId: 'ref', chairId: 'cha', prefix: 'team', ...question });
const paths = (question: Partial<TeamQuestion>): string[] => plan(question).faults.map(({ path }) => path);
const contributor = (personId: string, more: object = {}) => ({
  personId,
  part: 'contributor' as const,
  ...more,
});

describe('planTeam', () => {
  it('keeps the referrer and the chair, whether they are named or not', () => {
    const named = [
      { personId: 'ref', part: 'referrer' as const },
      { personId: 'cha', part: 'chair' as const },
    ];
    for (const input of [[], named]) {
      expect(plan({ input }).seats.map(({ personId, part }) => [personId, part])).toEqual([
        ['ref', 'referrer'],
        ['cha', 'chair'],
      ]);
      expect(paths({ input })).toEqual([]);
    }
  });

  it('gives weight 1 to somebody new and leaves a known weight with its reason', () => {
    const { seats, faults } = plan({
      input: [contributor('one'), contributor('two')],
      known: [seat('one', 2)],
    });
    expect(faults).toEqual([]);
    expect(seats.slice(2)).toMatchObject([
      { personId: 'one', weight: 2, reason: 'knows it well' },
      { personId: 'two', weight: 1, reason: null },
    ]);
  });

  it('wants a reason for every weight that is new and not 1', () => {
    expect(paths({ input: [contributor('one', { weight: 0 })] })).toEqual(['team[0].reason']);
    expect(paths({ input: [contributor('one', { weight: 0.5 })], known: [seat('one', 2)] })).toEqual([
      'team[0].reason',
    ]);
    expect(paths({ input: [contributor('one', { weight: 1 })], known: [seat('one', 2)] })).toEqual([]);
  });

  it('takes nobody who is unknown, deactivated or without the role', () => {
    const input = [contributor('who'), contributor('gone'), contributor('lia'), contributor('cha')];
    expect(paths({ input })).toEqual(['team[0].personId', 'team[1].personId', 'team[2].part']);
  });

  it('lets somebody stay who was deactivated meanwhile, but not when a chair accepts', () => {
    const input = [contributor('gone')];
    expect(paths({ input, known: [seat('gone', 1)] })).toEqual([]);
    expect(paths({ input, known: [seat('gone', 1)], acceptingChairId: 'cha' })).toEqual(['team[0].personId']);
    expect(paths({ input, known: [seat('gone', 1, new Date())] })).toEqual(['team[0].personId']);
  });
});

describe('a team that is to judge', () => {
  it('lacks what is missing, part by part', () => {
    expect(missingInTeam([seat('one', 1)], 'team')).toHaveLength(2);
    const whole = [
      seat('one', 1),
      seat('two', 1),
      { personId: 'lia', part: 'liaison' as const, weight: null, reason: null },
    ];
    expect(missingInTeam(whole, 'team')).toEqual([]);
  });

  it('has a changed weight also where somebody left and comes back with another', () => {
    const known = [seat('one', 1, new Date()), seat('two', 2)];
    expect(changedWeights([seat('one', 2), seat('two', 2)], known).map(({ personId }) => personId)).toEqual([
      'one',
    ]);
    expect(changedWeights([seat('new', 3)], known)).toEqual([]);
  });
});

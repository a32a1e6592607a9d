import { describe, expect, it } from 'vitest';
import { inputOf, parseWeight, type Seat, stillWrong, teamFaults } from './team-form';

const seat = (personId: string, part: Seat['part'], weight = '1', reason = ''): Seat => ({
  personId,
  name: personId,
  from: '',
  part,
  weight,
  reason,
});
const whole = [
  seat('ref', 'referrer'),
  seat('a', 'contributor'),
  seat('b', 'contributor'),
  seat('l', 'liaison'),
];

describe('the team', () => {
  it.each([
    ['0', 0],
    ['1.5', 1.5],
    ['0,75', 0.75],
    ['3', 3],
    ['3.1', null],
    ['-1', null],
    ['', null],
    ['1e0', null],
    ['two', null],
  ])('reads the weight %s as %s', (typed, weight) => {
    expect(parseWeight(typed)).toBe(weight);
  });

  it('needs two contributors and a liaison', () => {
    expect(teamFaults(whole)).toEqual([]);
    expect(teamFaults(whole.slice(0, 2)).map(({ path }) => path)).toEqual(['contributors', 'liaisons']);
  });

  it('asks for the reason of a weight that is not 1', () => {
    const heavier = [...whole, seat('c', 'contributor', '2')];
    expect(teamFaults(heavier).map(({ path }) => path)).toEqual(['seats.c.reason']);
    expect(teamFaults([...whole, seat('c', 'contributor', '2', 'Sees this weekly')])).toEqual([]);
  });

  it('takes a fault back as soon as it is mended', () => {
    const faults = [...teamFaults([]), { path: 'quorum', message: 'x' }];
    expect(stillWrong(faults, whole.slice(0, 3)).map(({ path }) => path)).toEqual(['liaisons', 'quorum']);
    expect(stillWrong(faults, whole).map(({ path }) => path)).toEqual(['quorum']);
  });

  it('sends no referrer, and a weight for contributors alone', () => {
    expect(inputOf([...whole, seat('c', 'contributor', '0,5', ' Retired ')])).toEqual([
      { personId: 'a', part: 'contributor', weight: 1 },
      { personId: 'b', part: 'contributor', weight: 1 },
      { personId: 'l', part: 'liaison' },
      { personId: 'c', part: 'contributor', weight: 0.5, reason: 'Retired' },
    ]);
  });
});

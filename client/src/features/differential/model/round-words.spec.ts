import type { Round } from '@weighhouse/shared/contracts/rounds';
import { expect, it } from 'vitest';
import { roundCount, roundTitle, unsealHindrance } from './round-words';

const now = new Date('2026-12-01T12:00:00Z');
function makeRound(handedIn: number, deadline: string | null = null): Round {
  return {
    id: 'round',
    number: 2,
    kind: 'sealed',
    state: 'open',
    candidateSet: 1,
    openedAt: '2026-11-30T09:00:00.000Z',
    deadline,
    unsealedAt: null,
    unsealReason: null,
    closedAt: null,
    members: Array.from({ length: 5 }, (_, index) => ({
      person: { id: String(index), name: '', specialty: '', centre: '' },
      handedInAt: index < handedIn ? '2026-12-01T09:00:00.000Z' : null,
      digest: null,
    })),
  };
}
const past = '2026-12-01T11:59:00.000Z';
const coming = '2026-12-01T12:01:00.000Z';

it('lets the chair unseal with a quorum in', () => {
  expect(roundCount(makeRound(3), 3, now)).toMatchObject({ in: 3, of: 5, mayUnseal: 'yes' });
});

it('wants the deadline past, two in and a reason below the quorum', () => {
  expect(roundCount(makeRound(2, past), 3, now).mayUnseal).toBe('withReason');
  expect(roundCount(makeRound(2, coming), 3, now).mayUnseal).toBe('no');
  expect(roundCount(makeRound(2), 3, now).mayUnseal).toBe('no');
  expect(roundCount(makeRound(1, past), 3, now).mayUnseal).toBe('no');
});

it('says what is missing', () => {
  expect(unsealHindrance(roundCount(makeRound(2), 3, now), false)).toBe(
    'Unsealing needs 1 more contributor handed in.',
  );
  expect(unsealHindrance(roundCount(makeRound(1, past), 3, now), true)).toBe(
    'The deadline is past, but fewer than two have handed in.',
  );
});

it('names the round', () => {
  expect(roundTitle(makeRound(0))).toBe('Round 2, sealed');
  expect(roundTitle({ ...makeRound(0), state: 'unsealed' })).toBe('Round 2, unsealed');
  expect(roundTitle({ ...makeRound(0), kind: 'live', state: 'closed' })).toBe('Round 2 is closed');
});

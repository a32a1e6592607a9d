import type { SealedDocument } from '@weighhouse/shared/contracts/rounds';
import { describe, expect, it } from 'vitest';
import { missingToHandIn, missingToOpen, missingToUnseal } from './readiness.js';

const paths = (faults: { path: string }[]) => faults.map((fault) => fault.path);

describe('opening a round', () => {
  const enough = { candidates: 2, findings: 3, unsealedRounds: 1 };

  it('takes two candidates and three findings', () => {
    expect(missingToOpen('sealed', enough)).toEqual([]);
    expect(paths(missingToOpen('sealed', { ...enough, candidates: 1, findings: 2 }))).toEqual([
      'candidates',
      'findings',
    ]);
  });

  it('begins with a sealed round: a live one comes after one that was unsealed', () => {
    expect(missingToOpen('sealed', { ...enough, unsealedRounds: 0 })).toEqual([]);
    expect(paths(missingToOpen('live', { ...enough, unsealedRounds: 0 }))).toEqual(['kind']);
    expect(missingToOpen('live', enough)).toEqual([]);
  });
});

describe('handing in', () => {
  const document = (prior: number[] | null, rows: number, findings: number): SealedDocument => ({
    caseId: 'case',
    roundId: 'round',
    personId: 'person',
    candidateSet: 1,
    findings: Array.from({ length: findings }, (_, k) => `f${String(k)}`),
    judgement: {
      prior,
      rows: Array.from({ length: rows }, (_, k) => ({
        finding: `f${String(k)}`,
        exposure: 'often',
        given: [1],
      })),
    },
  });

  it('takes a prior and half of the rows', () => {
    expect(missingToHandIn(document([500, 500], 2, 4), false)).toEqual([]);
    expect(paths(missingToHandIn(document([500, 500], 2, 5), false))).toEqual(['findings']);
    expect(paths(missingToHandIn(document(null, 0, 4), false))).toEqual(['prior', 'findings']);
  });

  it('or the word that no more will come', () => {
    expect(missingToHandIn(document(null, 1, 4), true)).toEqual([]);
  });
});

describe('unsealing', () => {
  const now = new Date('2026-03-02T10:00:00.000Z');
  const past = new Date('2026-03-02T09:59:59.000Z');
  const round = { handedIn: 3, quorum: 3, deadline: null, now, reason: undefined };

  it.each([
    ['the quorum is in', round, []],
    ['more than the quorum is in', { ...round, handedIn: 4 }, []],
    [
      'the deadline is past, two are in and a reason is given',
      { ...round, handedIn: 2, deadline: past, reason: 'ill' },
      [],
    ],
    ['there is no deadline', { ...round, handedIn: 2, reason: 'ill' }, ['quorum', 'deadline']],
    [
      'the deadline is still to come',
      { ...round, handedIn: 2, deadline: new Date('2026-03-02T10:00:01Z'), reason: 'ill' },
      ['quorum', 'deadline'],
    ],
    ['the reason is missing', { ...round, handedIn: 2, deadline: past }, ['quorum', 'reason']],
    ['only one is in', { ...round, handedIn: 1, deadline: past, reason: 'ill' }, ['quorum', 'handedIn']],
    ['everything is missing', { ...round, handedIn: 0 }, ['quorum', 'deadline', 'handedIn', 'reason']],
  ])('when %s', (_, state, missing) => {
    expect(paths(missingToUnseal(state))).toEqual(missing);
  });
});

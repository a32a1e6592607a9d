import type { CandidateEntry } from '../../findings/candidates.service.js';
import { describe, expect, it } from 'vitest';
import { leaderColumns, leaderOf } from './leader.js';

const candidate = (name: string): CandidateEntry => ({
  id: name,
  name,
  detail: '',
  mustNotMiss: false,
  addedBy: '',
  retired: false,
  retiredWords: null,
  addedInSet: 1,
  retiredInSet: null,
});
const pool = { candidates: [candidate('first'), candidate('second')] };

describe('the leader', () => {
  it('is the largest share, none of these included', () => {
    expect(leaderColumns(pool, { standing: [0.2, 0.3, 0.5], disagreementBits: 0.1 })).toEqual({
      leaderName: 'none of these',
      leaderShare: 0.5,
      disagreementBits: 0.1,
    });
  });

  it('is the first of those equal within 1e-12', () => {
    expect(leaderOf([0.4, 0.4 + 1e-13, 0.2])).toBe(0);
    expect(leaderOf([0.4, 0.4 + 1e-11, 0.2])).toBe(1);
  });

  it('is nobody where there is nothing to pool', () => {
    expect(leaderColumns(pool, null)).toEqual({
      leaderName: null,
      leaderShare: null,
      disagreementBits: null,
    });
  });
});

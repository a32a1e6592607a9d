import { changedWhat } from '@weighhouse/shared/contracts/live';
import { describe, expect, it } from 'vitest';
import { isGap, staleParts } from './live-keys';

describe('live keys', () => {
  it('refetches the case for whatever changed, and the ledger for everything that can move the pool', () => {
    for (const what of changedWhat) expect(staleParts(what)).toContain('case');
    for (const what of ['team', 'settings', 'candidates', 'findings', 'round', 'judgements'] as const)
      expect(staleParts(what)).toEqual(expect.arrayContaining(['differential', 'panel']));
  });

  it('sees a gap only where a revision is missing', () => {
    expect(isGap(undefined, 8)).toBe(false);
    expect(isGap(7, 8)).toBe(false);
    expect(isGap(7, 7)).toBe(false);
    expect(isGap(7, 9)).toBe(true);
  });
});

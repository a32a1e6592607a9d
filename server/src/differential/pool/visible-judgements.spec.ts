import { describe, expect, it } from 'vitest';
import { makeVersion } from '../testing/make-version.js';
import { visibleVersions } from './visible-judgements.js';

const sealed = (id: string, unsealed = false) => ({
  id,
  kind: 'sealed' as const,
  unsealedAt: unsealed ? new Date() : null,
});
const live = (id: string) => ({ id, kind: 'live' as const, unsealedAt: null });
const saved = (personId: string, version: number, roundId: string) =>
  makeVersion({ personId, version, roundId, target: `row ${String(version)}` });
const handIn = (personId: string, version: number, roundId: string) => ({ personId, version, roundId });

const seen = (...parts: Parameters<typeof visibleVersions>) =>
  visibleVersions(...parts).map(({ personId, version }) => `${personId} ${String(version)}`);

describe('the judgements that may be seen', () => {
  const both = [saved('ann', 1, 'r1'), saved('ann', 2, 'r1'), saved('ben', 1, 'r1')];

  it('are none in a sealed round, handed in or not', () => {
    expect(seen([sealed('r1')], [handIn('ann', 2, 'r1')], both)).toEqual([]);
  });

  it('are, once it is unsealed, those that were handed in and no others', () => {
    expect(seen([sealed('r1', true)], [handIn('ann', 2, 'r1')], both)).toEqual(['ann 1', 'ann 2']);
  });

  it('are all those saved in a live round, at once', () => {
    const rounds = [sealed('r1', true), live('r2')];
    const versions = [...both, saved('ann', 3, 'r2')];
    expect(seen(rounds, [handIn('ann', 2, 'r1')], versions)).toEqual(['ann 1', 'ann 2', 'ann 3']);
  });

  it('leave out what somebody not in saved while it was sealed, until they hand in', () => {
    const rounds = [sealed('r1', true), live('r2')];
    const versions = [saved('ben', 1, 'r1'), saved('ben', 2, 'r2')];
    expect(seen(rounds, [], versions)).toEqual(['ben 2']);
    expect(seen(rounds, [handIn('ben', 2, 'r2')], versions)).toEqual(['ben 1', 'ben 2']);
  });

  it('stay those from before while a later sealed round is open, also after a hand-in', () => {
    const rounds = [sealed('r1', true), sealed('r2')];
    const versions = [saved('ann', 1, 'r1'), saved('ann', 2, 'r2')];
    const handIns = [handIn('ann', 1, 'r1'), handIn('ann', 2, 'r2')];
    expect(seen(rounds, handIns, versions)).toEqual(['ann 1']);
  });

  it('never come from a sealed round that was closed without unsealing', () => {
    expect(seen([{ ...sealed('r1') }, live('r2')], [handIn('ann', 2, 'r1')], both)).toEqual([]);
  });

  it('never come from a round that is not known', () => {
    expect(seen([], [handIn('ann', 9, 'r9')], [saved('ann', 1, 'r9')])).toEqual([]);
  });
});

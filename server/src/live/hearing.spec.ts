import type { CaseSubject } from '@weighhouse/shared/access/can';
import { changedWhat } from '@weighhouse/shared/contracts/live';
import { describe, expect, it } from 'vitest';
import { hearingOf, hears, hearsStanding } from './hearing.js';

const nobody = { roles: [] };
const chairAtLarge = { roles: ['chair' as const] };
const subject = (parts: CaseSubject['parts'], more: Partial<CaseSubject> = {}): CaseSubject => ({
  state: 'judging',
  openRound: 'live',
  parts,
  ...more,
});

describe('what somebody hears of a case', () => {
  it.each([
    ['a referrer', nobody, subject(['referrer']), 'panel'],
    ['a contributor', nobody, subject(['contributor']), 'panel'],
    ['the chair', nobody, subject(['chair']), 'panel'],
    ['a liaison', nobody, subject(['liaison']), 'patient'],
    ['a liaison who also contributes', nobody, subject(['liaison', 'contributor']), 'panel'],
    ['a stranger', nobody, subject([]), null],
    ['another chair', chairAtLarge, subject([]), null],
    ['any chair while it is submitted', chairAtLarge, subject([], { state: 'submitted' }), 'panel'],
    ['a contributor of a withdrawn case', nobody, subject(['contributor'], { state: 'withdrawn' }), null],
    ['a liaison of a withdrawn case', nobody, subject(['liaison'], { state: 'withdrawn' }), null],
    ['the referrer of a withdrawn case', nobody, subject(['referrer'], { state: 'withdrawn' }), 'panel'],
    ['a liaison of a draft', nobody, subject(['liaison'], { state: 'draft' }), null],
  ])('%s', (_, actor, about, hearing) => {
    expect(hearingOf(actor, about)).toBe(hearing);
  });

  it('is for the panel everything, while sealed without judgements', () => {
    expect(changedWhat.filter((what) => hears('panel', what, false))).toEqual([...changedWhat]);
    expect(changedWhat.filter((what) => !hears('panel', what, true))).toEqual(['judgements']);
  });

  it('is for a liaison nothing of how the panel judges', () => {
    expect(changedWhat.filter((what) => hears('patient', what, false))).toEqual(['case', 'plan', 'summary']);
  });

  it('is nothing for whoever is not let in', () => {
    expect(changedWhat.filter((what) => hears(null, what, false))).toEqual([]);
  });
});

describe('the standing', () => {
  it('is told to the panel and never to a liaison', () => {
    expect(hearsStanding(nobody, subject(['referrer']), 'panel')).toBe(true);
    expect(hearsStanding(nobody, subject(['liaison']), 'patient')).toBe(false);
  });

  it('is told to nobody while a sealed round is open', () => {
    for (const part of ['referrer', 'contributor', 'chair'] as const)
      expect(hearsStanding(nobody, subject([part], { openRound: 'sealed' }), 'panel')).toBe(false);
  });
});

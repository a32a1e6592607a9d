import { describe, expect, it } from 'vitest';
import type { CaseState, Part } from '../contracts/cases.js';
import { can, type CaseSubject, type Verdict } from './can.js';

const nobody = { roles: [] };
const subject = (parts: Part[], more: Partial<CaseSubject> = {}): CaseSubject => ({
  state: 'judging',
  openRound: 'live',
  parts,
  ...more,
});

describe('changing the agenda', () => {
  it.each<[string, Part[], Verdict]>([
    ['the chair', ['chair'], 'yes'],
    ['a chair who also contributes', ['chair', 'contributor'], 'yes'],
    ['a contributor', ['contributor'], 'wrongPart'],
    ['the referrer', ['referrer'], 'wrongPart'],
    ['a liaison', ['liaison'], 'wrongPart'],
    ['a stranger', [], 'stranger'],
  ])('by %s', (_, parts, verdict) => {
    expect(can(nobody, 'agenda.change', subject(parts))).toBe(verdict);
  });

  it.each<[CaseState, Verdict]>([
    ['draft', 'stranger'],
    ['submitted', 'wrongState'],
    ['returned', 'wrongState'],
    ['accepted', 'wrongState'],
    ['judging', 'yes'],
    ['concluded', 'wrongState'],
    ['outcomeKnown', 'wrongState'],
    ['declined', 'wrongState'],
    ['withdrawn', 'wrongPart'],
  ])('by the chair of a case that is %s', (state, verdict) => {
    expect(can(nobody, 'agenda.change', subject(['chair'], { state, openRound: null }))).toBe(verdict);
  });

  it.each(['sealed', 'live', null] as const)('goes on whatever round is open: %s', (openRound) => {
    expect(can(nobody, 'agenda.change', subject(['chair'], { openRound }))).toBe('yes');
  });

  it('is closed to a chair who is not on the team', () => {
    expect(can({ roles: ['chair'] }, 'agenda.change', subject([]))).toBe('stranger');
    expect(can({ roles: ['chair'] }, 'agenda.change', subject([], { state: 'submitted' }))).toBe('wrongPart');
  });
});

import { describe, expect, it } from 'vitest';
import { makeFinding } from '../testing/make-differential';
import { findingLine } from './finding-words';
import { rowGroups } from './rows';

const error = { words: 'Belongs to another patient', by: 'Dr A', at: '2026-12-01T09:00:00.000Z' };

describe('the groups of the ledger', () => {
  it('put what is known first, pending rows in their own group and errors at the end', () => {
    const groups = rowGroups([
      makeFinding({ id: 'pet', kind: 'imaging', observed: null }),
      makeFinding({ id: 'crp', kind: 'laboratory' }),
      makeFinding({ id: 'wrong', kind: 'sign', enteredInError: error }),
      makeFinding({ id: 'fever', kind: 'symptom' }),
      makeFinding({ id: 'murmur', kind: 'sign', observed: 0 }),
      makeFinding({ id: 'scan', kind: 'test' }),
    ]);
    expect(groups.map((group) => [group.title, group.rows.map((row) => row.id)])).toEqual([
      ['Reported and examined', ['fever', 'murmur']],
      ['Laboratory', ['crp']],
      ['Imaging and tests', ['scan']],
      ['Not known yet', ['pet']],
      ['Entered in error', ['wrong']],
    ]);
  });

  it('are none when there are no findings', () => {
    expect(rowGroups([])).toEqual([]);
  });
});

describe('the line under a finding', () => {
  const date = (day: string) => `on ${day}`;

  it('says its state, where it comes from and how far it can be trusted', () => {
    const source = { reportId: 'r', fileName: 'Microbiology.pdf', page: 2, text: null };
    const finding = makeFinding({ observed: 0, source, observedOn: '2026-11-21', reliability: 0.7 });
    expect(findingLine(finding, date)).toBe('Absent. Microbiology.pdf, page 2, on 2026-11-21. Fair');
  });

  it('names the level where there are more than two', () => {
    const finding = makeFinding({ levelLabels: ['none', 'few', 'many'], observed: 2 });
    expect(findingLine(finding, date)).toBe('Many');
  });

  it('says what a pending finding would take', () => {
    const finding = makeFinding({ observed: null, cost: 1400, waitDays: 1, burden: 2 });
    expect(findingLine(finding, date)).toBe('Not known yet. Cost 1,400, wait 1 day, burden some');
  });

  it('says why a row was struck out', () => {
    expect(findingLine(makeFinding({ enteredInError: error }), date)).toBe(
      'Entered in error: Belongs to another patient',
    );
  });
});

import { describe, expect, it } from 'vitest';
import { changeOf, differences, type DraftForm, formOf, merged } from './draft-form';

const empty: DraftForm = formOf({
  question: '',
  age: null,
  sex: null,
  urgency: null,
  urgencyReason: '',
  consent: null,
  historyHtml: '',
});
const all = new Set(Object.keys(empty) as (keyof DraftForm)[]);

describe('the referral as it is typed', () => {
  it('sends nothing that was not changed', () => {
    expect(changeOf({ ...empty, question: 'Why', age: '34' }, new Set(['age']))).toEqual({
      change: { age: 34 },
      faults: [],
    });
  });

  it('sends emptied fields as missing', () => {
    expect(changeOf(empty, all)).toEqual({
      change: {
        question: '',
        age: null,
        sex: null,
        urgency: null,
        urgencyReason: '',
        consent: null,
        historyHtml: '',
      },
      faults: [],
    });
  });

  it.each(['x', '-3', '3.5', '130', '1e1', '３'])('holds the age %s back and saves the rest', (age) => {
    const { change, faults } = changeOf({ ...empty, age, question: 'Why' }, all);
    expect(change).not.toHaveProperty('age');
    expect(change.question).toBe('Why');
    expect(faults.map((fault) => fault.path)).toEqual(['age']);
  });

  it('waits for the day of the consent without calling it wrong', () => {
    const half: DraftForm = { ...empty, consentHow: 'signed' };
    expect(changeOf(half, all).faults).toEqual([]);
    expect(changeOf(half, all).change).not.toHaveProperty('consent');
    expect(changeOf({ ...half, consentOn: '2026-11-03' }, all).change.consent).toEqual({
      given: true,
      how: 'signed',
      givenOn: '2026-11-03',
    });
  });

  it('names the fields that two people wrote differently', () => {
    expect(differences({ ...empty, question: 'a', age: '3' }, { ...empty, question: 'b', age: '3' })).toEqual(
      ['question'],
    );
  });

  it('loses no field that only one of two people changed', () => {
    const base = { ...empty, question: 'a', age: '3', urgencyReason: 'x' };
    const mine = { ...base, question: 'b' };
    const theirs = { ...base, question: 'c', age: '4' };
    expect(merged(mine, theirs, base)).toEqual({ ...base, question: 'b', age: '4' });
  });
});

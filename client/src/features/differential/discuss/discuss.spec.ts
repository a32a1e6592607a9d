import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import {
  makeAssessment,
  makeCandidate,
  makeDifferential,
  makeFinding,
  makeMine,
  makeOther,
} from '../testing/make-differential';
import { discussRows } from './discuss-rows';
import { apartSentence, swingSentence } from './discuss-words';

const apart = (low: number, high: number, column = 1) => ({
  column,
  low: { contributor: 'a', p: low },
  high: { contributor: 'me', p: high },
});
const row = (swing: number, between: ReturnType<typeof apart> | null) => ({
  weightOfEvidence: [],
  by: {},
  apart: between,
  swing,
});
const findings = ['fever', 'cultures', 'rash', 'settled'].map((id) => makeFinding({ id, title: id }));
const pending = makeFinding({
  id: 'pet',
  title: 'PET-CT',
  observed: null,
  levelLabels: ['none', 'mild', 'intense'],
});
const note = {
  findingId: 'rash',
  note: 'Was it there before the drug?',
  version: 7,
  addedBy: 'Dr Chair',
  addedAt: '2026-12-01T09:00:00.000Z',
};
const differential = makeDifferential({
  candidates: [makeCandidate('Still'), makeCandidate('Endocarditis')],
  findings: [...findings, pending],
  mine: makeMine(),
  others: [makeOther('a', { name: 'Contributor 2' })],
  agenda: [note, { ...note, findingId: 'gone' }],
  assessment: makeAssessment({
    standing: [0.6, 0.3, 0.1],
    rows: {
      fever: row(0.02, apart(0.3, 0.4)),
      cultures: row(0.09, apart(0.08, 0.35)),
      rash: row(0.01, apart(0.2, 0.3)),
      settled: row(0, null),
      pet: row(0, apart(0.2, 0.5)),
    },
  }),
});
const columns = columnsOf(differential.candidates);
const ids = (rows: { finding: { id: string } }[]) => rows.map(({ finding }) => finding.id);

describe('what to discuss first', () => {
  it('is the agenda, then what depends most on whose numbers are taken', () => {
    const { agenda, others } = discussRows(differential);
    expect(ids(agenda)).toEqual(['rash']);
    expect(ids(others)).toEqual(['cultures', 'fever', 'pet']);
    expect(agenda[0]?.item?.note).toBe('Was it there before the drug?');
  });

  it('calls people what the server calls them, so that the referrer sees no names', () => {
    const [first] = discussRows(differential).others;
    expect(first?.apart?.low.name).toBe('Contributor 2');
    expect(first?.apart?.high.name).toBe('You');
  });

  it('is the agenda alone while nothing may be shown', () => {
    const sealed = discussRows({ ...differential, assessment: null, sealed: true });
    expect(ids(sealed.agenda)).toEqual(['rash']);
    expect(sealed.agenda[0]).toMatchObject({ swing: null, apart: null });
    expect(sealed.others).toEqual([]);
  });
});

describe('the words of a row', () => {
  const { others } = discussRows(differential);
  const [cultures, , pet] = others;
  const leader = columns[0];
  it('say who is how far apart, on what', () => {
    expect(cultures && apartSentence(cultures, columns)).toBe(
      'Contributor 2: 8, You: 35 of 100 would show this, on B Endocarditis.',
    );
    expect(pet && apartSentence(pet, columns)).toBe('Contributor 2: 20, You: 50 of 100, on B Endocarditis.');
    expect(cultures && apartSentence({ ...cultures, apart: null }, columns)).toBeNull();
  });
  it('do not make a difference of what nobody can see', () => {
    const same = cultures?.apart && {
      ...cultures,
      apart: { ...cultures.apart, high: { name: 'You', p: 0.084 } },
    };
    expect(same && apartSentence(same, columns)).toBe('All say 8 of 100, or nearly so.');
  });
  it('say what hangs on it', () => {
    if (!leader || !cultures || !pet) throw new Error('the rows are there');
    expect(swingSentence(cultures, leader)).toBe(
      'Taking one person’s numbers instead of the pool moves A Still by up to 9 of 100.',
    );
    expect(swingSentence({ ...cultures, swing: 0.004 }, leader)).toBe(
      'Whose numbers are taken hardly moves A Still.',
    );
    expect(swingSentence(pet, leader)).toBe('Not known yet, so nothing hangs on it now.');
    expect(swingSentence({ ...cultures, swing: null }, leader)).toBeNull();
  });
});

import { assess } from '@weighhouse/shared/reasoning/assess';
import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import {
  makeAssessment,
  makeCandidate,
  makeDifferential,
  makeFinding,
  makeMine,
  makeOther,
  makeRow,
} from '../testing/make-differential';
import { noTrial } from '../trial/trial';
import { ownPanel } from './own-panel';
import { readLedger, wishedPanel } from './read-ledger';
import { readingSentences } from './reading-words';
import { assumed, isPanelsOwn, noWish, usualCoexistence, wishedCoexistence } from './wish';

const oneCause = { coexistence: 0 };
const several = { coexistence: 0.1 };
const candidates = [makeCandidate('still'), makeCandidate('tb')];
const columns = columnsOf(candidates);
const may = { assumption: 'may coexist', trial: noTrial } as const;

describe('the assumption', () => {
  it('is the case’s own until another is chosen, and 5 of 100 where the case has none', () => {
    expect(isPanelsOwn(noWish, oneCause)).toBe(true);
    expect(wishedCoexistence(may, oneCause)).toBe(usualCoexistence);
    expect(wishedCoexistence(may, several)).toBe(0.1);
    expect(wishedCoexistence({ ...noWish, assumption: 'one cause' }, several)).toBe(0);
    expect(isPanelsOwn(may, several)).toBe(true);
  });

  it('is no wish of one’s own when it is the case’s again', () => {
    expect(assumed(may, 'one cause', oneCause)).toEqual(noWish);
    expect(assumed(noWish, 'one cause', several)).toEqual({ ...noWish, assumption: 'one cause' });
  });

  it('reads a tried share, and leaves it for one cause when that is chosen', () => {
    const trial = { ...noTrial, coexistence: 0.2 };
    expect(wishedCoexistence({ assumption: null, trial }, oneCause)).toBe(0.2);
    expect(wishedCoexistence({ assumption: 'one cause', trial }, oneCause)).toBe(0);
    expect(
      wishedCoexistence(assumed({ assumption: 'one cause', trial }, 'may coexist', oneCause), oneCause),
    ).toBe(0.2);
  });

  it('says which reading is shown, which the panel’s is, and where the share comes from', () => {
    const words = readingSentences(0.05, 0, false).join(' ');
    expect(words).toContain('5 of 100 patients like this');
    expect(words).toContain('The panel reads the same numbers as one cause.');
    expect(words).toContain('the chair has set no share');
    expect(readingSentences(0, 0, true)).toEqual([]);
  });
});

const mine = makeMine({
  key: 'me',
  prior: {
    candidateSet: 1,
    version: 1,
    outOf100: [30, 30, 40],
    reason: null,
    savedAt: '2026-12-01T09:00:00.000Z',
  },
  priorInForce: true,
  findings: [makeRow('f1', [80, 40, 20]), makeRow('struck', [1, 2, 3])],
});
const findings = [
  makeFinding({ id: 'f1' }),
  makeFinding({
    id: 'struck',
    enteredInError: { by: 'Dr A', at: '2026-12-01T09:00:00.000Z', words: 'wrong' },
  }),
];
const sealed = makeDifferential({ candidates, findings, mine, sealed: true });

describe('one’s own numbers alone, while the others’ are sealed', () => {
  it('are a panel of one, without what was entered in error', () => {
    const panel = ownPanel(sealed, 0);
    expect(panel.contributors).toEqual([
      {
        id: 'me',
        weight: 1,
        prior: [0.3, 0.3, 0.4],
        likelihoods: { f1: { exposure: 'often', given: [0.8, 0.4, 0.2] } },
      },
    ]);
    expect(panel.findings.map(({ id }) => id)).toEqual(['f1']);
    expect(assess(panel).standing).toHaveLength(3);
  });

  it('are read even if somebody else’s numbers were about, and nothing is read without one’s own', () => {
    const others = [makeOther('other', { findings: [makeRow('f1', [1, 1, 99])] })];
    const panel = wishedPanel({ ...sealed, others }, null, may, columns, 1);
    expect(panel?.contributors.map(({ id }) => id)).toEqual(['me']);
    expect(wishedPanel({ ...sealed, mine: null }, null, may, columns, 1)).toBeNull();
    expect(wishedPanel({ ...sealed, mine: makeMine() }, null, may, columns, 1)).toBeNull();
  });

  it('move one’s own standing and make no assessment of the panel', () => {
    const assessment = makeAssessment({ standing: [0.6, 0.3, 0.2] });
    const read = readLedger(sealed, may, columns, assessment);
    expect(read.assessment).toBeNull();
    expect(read.mine?.standing).toEqual([0.6, 0.3, 0.2]);
  });
});

describe('the ledger of another reading', () => {
  const saved = makeDifferential({
    candidates,
    findings,
    mine,
    assessment: makeAssessment(),
    before: [0.2, 0.3, 0.5],
  });

  it('needs no computing for the panel’s own, and waits for numbers that fit the columns', () => {
    const panel = { ...ownPanel(saved, 0) };
    expect(wishedPanel(saved, panel, noWish, columns, 1)).toBeNull();
    expect(wishedPanel(saved, null, may, columns, 1)).toBeNull();
    expect(wishedPanel(saved, { ...panel, candidates: ['tb', 'still'] }, may, columns, 1)).toBeNull();
    expect(wishedPanel(saved, panel, may, columns, 1)?.coexistence).toBe(usualCoexistence);
  });

  it('takes every number from one assessment, and no mark of a round that was read otherwise', () => {
    const assessment = makeAssessment({ standing: [0.5, 0.4, 0.2] });
    const read = readLedger(saved, may, columns, assessment);
    expect(read.assessment).toBe(assessment);
    expect(read.settings.coexistence).toBe(usualCoexistence);
    expect(read.before).toBeNull();
    const tried = { assumption: null, trial: { ...noTrial, tempering: 1 } };
    expect(readLedger(saved, tried, columns, assessment).before).toEqual(saved.before);
  });
});

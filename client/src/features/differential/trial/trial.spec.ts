import { assess } from '@weighhouse/shared/reasoning/assess';
import type { PanelView } from '@weighhouse/shared/contracts/differential';
import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import {
  makeAssessment,
  makeCandidate,
  makeDifferential,
  makeFinding,
  makeMine,
  makeRow,
} from '../testing/make-differential';
import { tryOnLedger } from './apply-to-ledger';
import { tryOnPanel } from './apply-to-panel';
import { isEmptyTrial, noTrial, type Trial, withCell, withExposure, withObserved, withoutOwn } from './trial';
import { trialChanges } from './trial-changes';

const candidates = [makeCandidate('still'), makeCandidate('tb')];
const columns = columnsOf(candidates);
const own = { key: 'me', weight: 1 };

function makePanel(parts: Partial<PanelView> = {}): PanelView {
  return {
    candidates: ['still', 'tb'],
    coexistence: 0,
    tempering: 0.6,
    together: [],
    groups: [{ id: 'g', overlap: 0.5 }],
    findings: [
      { id: 'fever', levels: 2, observed: 1, reliability: 1, group: 'g' },
      { id: 'ferritin', levels: 3, observed: 2, reliability: 1 },
    ],
    contributors: [
      {
        id: 'me',
        weight: 1,
        prior: [0.3, 0.3, 0.4],
        likelihoods: { fever: { exposure: 'often', given: [0.8, 0.4, 0.2] } },
      },
      {
        id: 'other',
        weight: 2,
        prior: [0.2, 0.2, 0.6],
        likelihoods: { fever: { exposure: 'seldom', given: [0.5, 0.5, 0.1] } },
      },
    ],
    ...parts,
  };
}

const trial = (parts: Partial<Trial>): Trial => ({ ...noTrial, ...parts });

describe('a trial on the panel', () => {
  it('changes one cell of one’s own and nothing of anybody else', () => {
    const panel = makePanel();
    const tried = tryOnPanel(panel, withCell(noTrial, 'fever', 'tb', 90), columns, own);
    expect(tried.contributors[0]?.likelihoods.fever).toEqual({ exposure: 'often', given: [0.8, 0.9, 0.2] });
    expect(tried.contributors[1]).toBe(panel.contributors[1]);
    expect(panel.contributors[0]?.likelihoods.fever?.given).toEqual([0.8, 0.4, 0.2]);
  });

  it('moves the standing as if it had been saved', () => {
    const saved = makePanel();
    saved.contributors[0]!.likelihoods.fever!.given = [0.8, 0.9, 0.2];
    const tried = tryOnPanel(makePanel(), withCell(noTrial, 'fever', 'tb', 90), columns, own);
    expect(assess(tried)).toEqual(assess(saved));
  });

  it('stays when the panel under it moves', () => {
    const moved = makePanel();
    moved.contributors[1]!.likelihoods.fever!.given = [0.1, 0.9, 0.5];
    const tried = tryOnPanel(moved, withCell(noTrial, 'fever', 'tb', 90), columns, own);
    expect(tried.contributors[0]?.likelihoods.fever?.given[1]).toBe(0.9);
    expect(tried.contributors[1]?.likelihoods.fever?.given).toEqual([0.1, 0.9, 0.5]);
  });

  it('counts a new row only with an exposure, and then with the levels of the finding', () => {
    const cell = withCell(noTrial, 'ferritin', 'still', [10, 20, 70]);
    expect(tryOnPanel(makePanel(), cell, columns, own).contributors[0]?.likelihoods.ferritin).toBeUndefined();
    const whole = withExposure(cell, 'ferritin', 'sometimes');
    expect(tryOnPanel(makePanel(), whole, columns, own).contributors[0]?.likelihoods.ferritin).toEqual({
      exposure: 'sometimes',
      given: [[0.1, 0.2, 0.7], null, null],
    });
  });

  it('leaves out what no longer fits: another number of levels, a level, a finding, a column that is gone', () => {
    const tries = [
      withExposure(withCell(noTrial, 'ferritin', 'still', 50), 'ferritin', 'often'),
      withObserved(noTrial, 'fever', 4),
      withCell(noTrial, 'gone', 'still', 50),
      withCell(noTrial, 'fever', 'gone', 50),
      trial({ prior: { still: 50, none: 50 } }),
      trial({ overlaps: { gone: 1 } }),
    ];
    for (const one of tries) expect(tryOnPanel(makePanel(), one, columns, own)).toEqual(makePanel());
  });

  it('tries a state, an overlap, the tempering and a prior', () => {
    const parts = {
      observed: { fever: null },
      overlaps: { g: 1 },
      tempering: 1,
      prior: { still: 50, tb: 25, none: 25 },
    };
    const tried = tryOnPanel(makePanel(), trial(parts), columns, own);
    expect(tried).toMatchObject({ tempering: 1, groups: [{ id: 'g', overlap: 1 }] });
    expect(tried.findings[0]?.observed).toBeNull();
    expect(tried.contributors[0]?.prior).toEqual([0.5, 0.25, 0.25]);
  });

  it('takes a whole row out, and puts somebody in who was not there', () => {
    let blank: Trial = noTrial;
    for (const column of columns) blank = withCell(blank, 'fever', column.id, null);
    expect(tryOnPanel(makePanel(), blank, columns, own).contributors[0]?.likelihoods).toEqual({});
    const others = makePanel({ contributors: makePanel().contributors.slice(1) });
    const prior = trial({ prior: { still: 50, tb: 25, none: 25 } });
    expect(tryOnPanel(others, prior, columns, { key: 'me', weight: 2 }).contributors[1]).toMatchObject({
      id: 'me',
      weight: 2,
    });
    expect(tryOnPanel(others, noTrial, columns, own)).toEqual(others);
  });

  it('touches nobody’s numbers for somebody who judges nothing', () => {
    const tried = tryOnPanel(makePanel(), withCell(noTrial, 'fever', 'tb', 90), columns, null);
    expect(tried).toEqual(makePanel());
  });
});

const saved = makeDifferential({
  candidates,
  findings: [makeFinding({ id: 'fever' })],
  mine: makeMine({ findings: [makeRow('fever', [80, 40, 20])] }),
  assessment: makeAssessment(),
});

describe('a trial on the ledger', () => {
  it('shows one’s own number as tried and keeps what is saved', () => {
    const tried = tryOnLedger(saved, withCell(noTrial, 'fever', 'tb', null), columns);
    expect(tried.mine?.findings[0]?.outOf100).toEqual([80, null, 20]);
    expect(saved.mine?.findings[0]?.outOf100).toEqual([80, 40, 20]);
  });

  it('keeps a finding that is not tried the same, so that its row is not drawn anew', () => {
    const tried = tryOnLedger(saved, withObserved(noTrial, 'other', 0), columns);
    expect(tried.findings[0]).toBe(saved.findings[0]);
  });
});

describe('what is tried, in words', () => {
  it('says every change, whose it is, and takes each back alone', () => {
    const both = withObserved(withCell(noTrial, 'fever', 'tb', 90), 'fever', null);
    const changes = trialChanges({ ...both, tempering: 1 }, saved, columns);
    expect(changes.map(({ sentence, own }) => [sentence, own])).toEqual([
      ['Fever: not known instead of present', false],
      ['Fever, B tb: you 90 instead of 40', true],
      ['Every finding counts at 100 instead of 60 of 100 of its strength', false],
    ]);
    expect(changes[1]?.undone).toEqual({ ...withObserved(noTrial, 'fever', null), tempering: 1 });
  });

  it('ends empty when everything is taken back', () => {
    const one = withExposure(withCell(noTrial, 'fever', 'tb', 90), 'fever', 'seldom');
    const back = withExposure(withCell(one, 'fever', 'tb', undefined), 'fever', null);
    expect(isEmptyTrial(back)).toBe(true);
    expect(isEmptyTrial(withoutOwn({ ...one, tempering: 1 }))).toBe(false);
  });
});

import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeCandidate, makeRow } from '../testing/make-differential';
import { type Draft, draftFromWire, draftOfRow, emptyDraft, sameDraft, wireDraft, withText } from './draft';
import { readPrior, readRow } from './read-draft';

const columns = columnsOf([makeCandidate('still'), makeCandidate('lymphoma')]);
const typed = (texts: Record<string, string[]>, parts: Partial<Draft> = {}): Draft => ({
  ...emptyDraft(1),
  cells: new Map(Object.entries(texts)),
  ...parts,
});

describe('a draft', () => {
  it('goes to the server and comes back the same', () => {
    const draft = typed({ still: ['6'], none: ['1', '', '9'] }, { exposure: 'seldom', reason: 'half a th' });
    const kept = { ...wireDraft('f1', draft, columns), savedAt: '2026-12-01T09:00:00.000Z' };
    expect(kept.typed).toEqual([['6'], [], ['1', '', '9']]);
    expect(sameDraft(draftFromWire(kept, columns, 1, 0), draft, columns)).toBe(true);
  });

  it('keeps its numbers with their candidates when another candidate is added or one retired', () => {
    const draft = typed({ still: ['60'], lymphoma: ['20'], none: ['20'] });
    const added = columnsOf([makeCandidate('gout'), makeCandidate('lymphoma')]);
    expect(wireDraft('prior', draft, added).typed).toEqual([[], ['20'], ['20']]);
  });

  it('never puts a number beside another candidate when the set has changed where it was kept', () => {
    const draft = typed({ still: ['60'], lymphoma: ['20'], none: ['20'] }, { reason: 'why' });
    const kept = { ...wireDraft('prior', draft, columns), savedAt: '2026-12-01T09:00:00.000Z' };
    const back = draftFromWire(kept, columns, 2, 0);
    expect([...back.cells]).toEqual([['none', ['20']]]);
    expect(back.reason).toBe('why');
  });

  it('starts from what is saved', () => {
    const draft = draftOfRow(makeRow('f1', [65, [10.5, 20, 69.5], null]), columns, 1);
    expect([...draft.cells.values()]).toEqual([['65'], ['10.5', '20', '69.5'], []]);
    expect(draft.exposure).toBe('often');
    expect(sameDraft(draft, withText(draft, 'none', 0, 1, ' '), columns)).toBe(true);
    expect(sameDraft(draft, withText(draft, 'none', 0, 1, '5'), columns)).toBe(false);
  });
});

describe('reading a row', () => {
  it('takes numbers and blanks', () => {
    const draft = typed({ still: ['65'], lymphoma: [' '] }, { exposure: 'often' });
    expect(readRow(draft, columns, 2)).toEqual({ outOf100: [65, null, null], filled: 1, faults: [] });
  });

  it('asks for the exposure only where something is filled', () => {
    expect(readRow(typed({ still: ['65'] }), columns, 2).faults.map((fault) => fault.message)).toEqual([
      'say how often you see this picture: seldom, sometimes or often',
    ]);
    expect(readRow(typed({}), columns, 2).faults).toEqual([]);
  });

  it('names every fault, not only the first', () => {
    const draft = typed({ still: ['0'], lymphoma: ['x'] }, { exposure: 'often' });
    expect(readRow(draft, columns, 2).faults.map((fault) => fault.columnId)).toEqual(['still', 'lymphoma']);
  });

  it('wants every level of a column or none', () => {
    const draft = typed({ still: ['10', '20', '70'], lymphoma: ['10', '', ''] }, { exposure: 'often' });
    const read = readRow(draft, columns, 3);
    expect(read.outOf100).toEqual([[10, 20, 70], null, null]);
    expect(read.faults).toEqual([
      {
        columnId: 'lymphoma',
        level: null,
        message: 'all levels together must be 100: 90 of 100 left, 2 shares still blank',
      },
    ]);
  });
});

it('reads a prior as shares of 100', () => {
  expect(readPrior(typed({ still: ['60'], lymphoma: ['20'], none: ['20'] }), columns).complete).toBe(true);
  expect(readPrior(typed({ still: ['60'], lymphoma: ['40'] }), columns)).toMatchObject({
    blanks: 1,
    complete: false,
  });
});

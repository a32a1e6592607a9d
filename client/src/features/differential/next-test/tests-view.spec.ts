import { describe, expect, it } from 'vitest';
import { columnsOf } from '../model/columns';
import { makeAssessment, makeCandidate, makeDifferential, makeFinding } from '../testing/make-differential';
import { largestOf, shownColumns } from './shown-columns';
import { pendingOf, testsOf, unjudgedTests, unsaid } from './tests-view';

const error = { words: 'wrong patient', by: 'Dr A', at: '2026-12-01T09:00:00.000Z' };
const biopsy = makeFinding({
  id: 'biopsy',
  observed: null,
  levelLabels: ['Lymphoma', 'Granulomas', 'Reactive'],
});
const echo = makeFinding({ id: 'echo', observed: null });
const struck = makeFinding({ id: 'struck', observed: null, enteredInError: error });
const next = (finding: string, standings: number[][], p = [0.5, 0.5]) => ({
  finding,
  bits: 0.2,
  leaderChanges: 0.5,
  frontier: true,
  levels: standings.map((standing, level) => ({ p: p[level] ?? 0, standing })),
});
const differential = makeDifferential({
  candidates: [makeCandidate('still'), makeCandidate('lymphoma')],
  findings: [makeFinding(), biopsy, echo, struck],
  assessment: makeAssessment({
    standing: [0.5, 0.3, 0.2],
    nextTests: [
      next('biopsy', [
        [0.2, 0.7, 0.1],
        [0.5, 0.5, 0],
        [0.8, 0.1, 0.1],
      ]),
      next('struck', [[0.2, 0.7, 0.1]]),
    ],
  }),
});

describe('the tests as they are shown', () => {
  it('have a name for each result and say who would be first', () => {
    const [test, ...others] = testsOf(differential);
    expect(others).toEqual([]);
    expect(test?.rank).toBe(1);
    expect(test?.results.map(({ name, leader, takesFirst }) => [name, leader, takesFirst])).toEqual([
      ['Lymphoma', 1, true],
      // Level with another, the one that is first stays first.
      ['Granulomas', 0, false],
      ['Reactive', 0, false],
    ]);
  });

  it('are none where nothing may be worked out, as while a round is sealed', () => {
    expect(testsOf({ ...differential, assessment: null, sealed: true })).toEqual([]);
  });

  it('leave what nobody judged to a list of its own, and what was entered in error to none', () => {
    expect(unjudgedTests(differential).map(({ id }) => id)).toEqual(['echo']);
    expect(pendingOf(differential.findings).map(({ id }) => id)).toEqual(['biopsy', 'echo']);
  });

  it('tell what was never said from what is nothing', () => {
    expect(unsaid(makeFinding({ cost: 0, waitDays: null, burden: 0 }))).toEqual(['wait']);
    expect(unsaid(makeFinding())).toEqual(['cost', 'wait', 'burden']);
  });
});

describe('the columns of a result', () => {
  const columns = columnsOf(Array.from({ length: 9 }, (_, index) => makeCandidate(`c${String(index)}`)));
  const now = [0.3, 0.2, 0.1, 0.1, 0.1, 0.05, 0.05, 0.04, 0.03, 0.03];
  const after = [0.3, 0.2, 0.1, 0.1, 0.05, 0, 0, 0, 0.22, 0.03];
  const results = [{ level: 0, name: '', p: 1, standing: after, leader: 0, takesFirst: false }];
  it('are those that stand high now or after some result, in the order of the ledger', () => {
    const { shown, rest } = shownColumns(columns, { results }, now, 6);
    expect(shown.map(({ index }) => index)).toEqual([0, 1, 2, 3, 4, 8]);
    expect(rest.map(({ index }) => index)).toEqual([5, 6, 7, 9]);
    expect(largestOf(rest, after)).toBe(0.03);
  });
  it('are all where the rest would be one', () => {
    expect(shownColumns(columns.slice(0, 7), { results }, now, 6).rest).toEqual([]);
  });
});

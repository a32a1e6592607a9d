import type { Candidate } from '@weighhouse/shared/contracts/findings';
import { describe, expect, it } from 'vitest';
import { columnLabel, columnLetter, columnsOf } from './columns';

const candidate = (name: string, retired = false): Candidate => ({
  id: `id-${name}`,
  name,
  detail: '',
  mustNotMiss: name === 'Lymphoma',
  addedBy: 'somebody',
  retired,
  retiredWords: null,
});

describe('columns', () => {
  it('are the candidates in force in order, and none of these at the end', () => {
    const columns = columnsOf([candidate('Still'), candidate('Gout', true), candidate('Lymphoma')]);
    expect(columns.map(columnLabel)).toEqual(['A Still', 'B Lymphoma', 'None of these']);
    expect(columns.map((column) => column.index)).toEqual([0, 1, 2]);
    expect(columns.map((column) => column.mustNotMiss)).toEqual([false, true, false]);
  });

  it('hold none of these alone when there is no candidate yet', () => {
    expect(columnsOf([]).map((column) => column.none)).toEqual([true]);
  });

  it('leave a bracketed tail out of the short name, never the whole name', () => {
    const [first, second] = columnsOf([candidate('Endocarditis (Q fever, Bartonella)'), candidate('(rare)')]);
    expect(first?.short).toBe('Endocarditis');
    expect(second?.short).toBe('(rare)');
  });

  it('count on with two letters after Z', () => {
    expect([0, 25, 26, 29].map(columnLetter)).toEqual(['A', 'Z', 'AA', 'AD']);
  });
});

import { describe, expect, it } from 'vitest';
import { makeCandidate } from '../testing/make-differential';
import { columnsOf } from './columns';
import { fewColumns } from './few-columns';

const columns = (count: number) =>
  columnsOf(Array.from({ length: count }, (_, index) => makeCandidate(`c${String(index)}`)));
const ids = (shown: { id: string }[]) => shown.map(({ id }) => id);

describe('a list of many candidates', () => {
  it('shows all of them in their order as long as they are few', () => {
    const { shown, rest } = fewColumns(columns(8), [0, 0, 0, 0, 0, 0, 0, 0.9, 0.1]);
    expect(ids(shown)).toEqual(ids(columns(8)));
    expect(rest).toEqual([]);
  });
  it('begins with those that lead, keeps none of these, and names how small the rest is', () => {
    const standing = [0.01, 0.3, 0.005, 0.6, 0.02, 0.01, 0.01, 0.01, 0.01, 0.01, 0.015];
    const { shown, rest, words } = fewColumns(columns(10), standing);
    expect(ids(shown)).toEqual(['c3', 'c1', 'c4', 'none']);
    expect(rest).toHaveLength(7);
    expect(words).toBe('and 7 others under 2 of 100');
    expect(rest.every((column) => (standing[column.index] ?? 1) < 0.02)).toBe(true);
  });
  it('shows three even where all but one are small', () => {
    const standing = [0.001, 0.98, 0.002, 0.003, 0, 0, 0, 0, 0, 0, 0.001];
    expect(ids(fewColumns(columns(10), standing).shown)).toEqual(['c1', 'c3', 'c2', 'none']);
  });
  it('takes the first of the ledger while where the panel stands is told to nobody', () => {
    const { shown, words } = fewColumns(columns(30), null);
    expect(ids(shown)).toEqual(['c0', 'c1', 'c2', 'c3', 'c4', 'c5', 'c6', 'c7', 'none']);
    expect(words).toBe('and 22 others');
  });
});

import type { Column } from '../model/columns';
import type { TestView } from './tests-view';

/** How many candidates a result is drawn for before the rest is summed up in words. */
export const mostColumns = 6;

/**
 * The columns that matter for a test: those with the largest share now or after any of its results, in the order of
 * the ledger. One column more than the limit is shown rather than a rest of one.
 */
export function shownColumns(
  columns: readonly Column[],
  test: Pick<TestView, 'results'>,
  now: readonly number[],
  most = mostColumns,
): { shown: Column[]; rest: Column[] } {
  if (columns.length <= most + 1) return { shown: [...columns], rest: [] };
  const reach = ({ index }: Column) =>
    Math.max(now[index] ?? 0, ...test.results.map(({ standing }) => standing[index] ?? 0));
  const kept = new Set(columns.toSorted((one, other) => reach(other) - reach(one)).slice(0, most));
  return {
    shown: columns.filter((column) => kept.has(column)),
    rest: columns.filter((column) => !kept.has(column)),
  };
}

/** The largest share among the columns that are not drawn. */
export function largestOf(rest: readonly Column[], standing: readonly number[]): number {
  return Math.max(0, ...rest.map(({ index }) => standing[index] ?? 0));
}

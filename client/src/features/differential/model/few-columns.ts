import { foldBelow } from '../columns/column-choice';
import type { Column } from './columns';

/** Up to so many candidates a list shows all of them. */
const allUpTo = 8;

/**
 * The columns of a list below each other, where there are many: the leading ones first, *none of these* with them, and
 * the rest to be asked for. Where nothing may be shown yet, the first of the ledger.
 */
export function fewColumns(
  columns: readonly Column[],
  standing: readonly number[] | null,
): { shown: Column[]; rest: Column[]; words: string } {
  if (columns.length <= allUpTo + 1) return { shown: [...columns], rest: [], words: '' };
  const share = (column: Column) => standing?.[column.index] ?? 0;
  const ordered = standing ? columns.toSorted((one, other) => share(other) - share(one)) : columns;
  const few = (column: Column, place: number) =>
    column.none || (standing ? share(column) >= foldBelow || place < 3 : place < allUpTo);
  const shown = ordered.filter(few);
  const rest = ordered.filter((column, place) => !few(column, place));
  return { shown, rest, words: restWords(rest.length, standing !== null) };
}

function restWords(count: number, known: boolean): string {
  const others = `and ${String(count)} ${count === 1 ? 'other' : 'others'}`;
  return known ? `${others} under 2 of 100` : others;
}

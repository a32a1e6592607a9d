import type { Column } from './columns';

/** The columns with the largest shares, in the order of the ledger; without a standing the first ones. */
export function leadingColumns(
  columns: readonly Column[],
  standing: readonly number[] | null,
  count: number,
): Column[] {
  if (!standing) return columns.slice(0, count);
  const share = (column: Column) => standing[column.index] ?? 0;
  const leading = columns.toSorted((one, other) => share(other) - share(one)).slice(0, count);
  return columns.filter((column) => leading.includes(column));
}

import { meanOverColumns } from '../evidence/reported.js';
import type { CheckedFinding } from '../validation/checked-panel.js';
import { type MoreLevelTable, moreLevelSpace, moreLevelTable } from './more-level-table.js';
import type { SetTable } from './set-table.js';
import { type TwoLevelSpace, type TwoLevelTable, twoLevelSpace, twoLevelTable } from './two-level-table.js';

/** P'(level | set) of one row and one level for all sets, as small tables over the low and the high halves. */
export type RowTable = TwoLevelTable | MoreLevelTable;

/** Room for the table of one row. What was in it is written over by the next. */
export interface RowSpace {
  sets: SetTable;
  two: TwoLevelSpace;
  more: MoreLevelTable;
}

export function rowSpace(sets: SetTable): RowSpace {
  return { sets, two: twoLevelSpace(sets), more: moreLevelSpace(sets) };
}

/**
 * The table of a row whose cells are those of `cells`, its reliability
 * included. It stays as it is until the space is used again.
 *
 * @param cells all cells of a view, where the findings say
 */
export function rowTable(
  { sets, two, more }: RowSpace,
  cells: Float64Array,
  finding: CheckedFinding,
  columns: number,
  level: number,
): RowTable {
  const { start, levels, reliability } = finding;
  const mixed = (1 - reliability) * meanOverColumns(cells, finding, columns, level);
  return levels === 2
    ? twoLevelTable(two, sets, cells, start, reliability, mixed, level)
    : moreLevelTable(more, sets, cells, finding, level, mixed);
}

import { meanOverColumns } from '../evidence/reported.js';
import type { CheckedFinding } from '../validation/checked-panel.js';
import { type MoreLevelTable, moreLevelTable } from './more-level-table.js';
import type { SetTable } from './set-table.js';
import { type TwoLevelTable, twoLevelTable } from './two-level-table.js';

/** P'(level | set) of one row and one level for all sets, as small tables over the low and the high halves. */
export type RowTable = TwoLevelTable | MoreLevelTable;

/**
 * The table of a row whose cells are those of `cells`, its reliability included.
 *
 * @param cells all cells of a view, where the findings say
 */
export function rowTable(
  table: SetTable,
  cells: Float64Array,
  finding: CheckedFinding,
  columns: number,
  level: number,
): RowTable {
  const mixed = (1 - finding.reliability) * meanOverColumns(cells, finding, columns, level);
  return finding.levels === 2
    ? twoLevelTable(table, cells, finding.start, finding.reliability, mixed, level)
    : moreLevelTable(table, cells, finding, level, mixed);
}

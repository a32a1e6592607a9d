import { multiplyByRow, multiplyByTwoRows } from './row-kernels.js';
import { type RowSpace, type RowTable, rowSpace } from './row-table.js';
import type { SetTable } from './set-table.js';
import type { TwoLevelTable } from './two-level-table.js';

/**
 * For each set the product of P' over rows, begun anew as often as wanted. A row
 * of two levels waits for a second one, so that memory is gone through once for
 * both.
 */
export class RowProduct {
  /** The product, once `settle` was called. */
  readonly entries: Float64Array;
  private readonly spaces: readonly [RowSpace, RowSpace];
  private waiting: TwoLevelTable | null = null;

  constructor(private readonly sets: SetTable) {
    this.entries = new Float64Array(sets.size).fill(1);
    this.spaces = [rowSpace(sets), rowSpace(sets)];
  }

  /** Where the table of the next row may be written without touching the one that waits. */
  get space(): RowSpace {
    return this.waiting === this.spaces[0].two.table ? this.spaces[1] : this.spaces[0];
  }

  restart(): void {
    this.waiting = null;
    this.entries.fill(1);
  }

  multiplyBy(row: RowTable): void {
    if (row.kind === 'more') multiplyByRow(this.entries, this.sets, row);
    else if (this.waiting) {
      multiplyByTwoRows(this.entries, this.sets, this.waiting, row);
      this.waiting = null;
    } else this.waiting = row;
  }

  settle(): void {
    if (this.waiting) multiplyByRow(this.entries, this.sets, this.waiting);
    this.waiting = null;
  }
}

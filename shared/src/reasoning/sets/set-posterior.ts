import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { fastLog } from './fast-log.js';
import { multiplyByRows } from './row-kernels.js';
import { type RowTable, rowTable } from './row-table.js';
import type { SetAssumption, SetPrior } from './set-prior.js';
import type { SetTable } from './set-table.js';

/** A product of P' is turned into its logarithm before it could fall below e to this. */
const lowestProduct = -640;

/** For each set ln( weight × τ ), before any finding. */
export function priorLogs({ table, together }: SetAssumption, prior: SetPrior): Float64Array {
  const { starts, lows, size, high } = table;
  const logs = new Float64Array(size);
  for (let h = 0; h < high.members.length; h += 1) {
    const end = starts[h + 1]!;
    const outer = prior.high[h]!;
    for (let p = starts[h]!; p < end; p += 1) logs[p] = outer + prior.low[lows[p]!]!;
  }
  if (together) for (let p = 0; p < size; p += 1) logs[p]! += together[p]!;
  logs[0] = prior.none;
  return logs;
}

/**
 * Adds to each set's entry exponent × Σ ln P'(observed | set) over some rows.
 * The rows are multiplied first and turned into a logarithm once, or as often
 * as it takes for the product not to underflow.
 *
 * @param product scratch space, as long as there are sets
 */
export function addRowLogs(
  panel: CheckedPanel,
  table: SetTable,
  view: View,
  rows: readonly number[],
  exponent: number,
  sums: Float64Array,
  product: Float64Array,
): void {
  let waiting: RowTable[] = [];
  let lowest = 0;
  const enter = () => {
    product.fill(1);
    multiplyByRows(product, table, waiting);
    for (let p = 0; p < product.length; p += 1) sums[p]! += exponent * fastLog(product[p]!);
    waiting = [];
    lowest = 0;
  };
  for (const r of rows) {
    const finding = panel.findings[r]!;
    const row = rowTable(table, view.cells, finding, panel.columns, finding.observed ?? 0);
    const least = Math.log(row.least);
    if (waiting.length > 0 && lowest + least < lowestProduct) enter();
    waiting.push(row);
    lowest += least;
  }
  if (waiting.length > 0) enter();
}

/** Turns logarithms into shares that sum to 1, in place, with the maximum subtracted. */
export function normaliseLogs(logs: Float64Array): Float64Array {
  let top = -Infinity;
  for (let p = 0; p < logs.length; p += 1) if (logs[p]! > top) top = logs[p]!;
  let sum = 0;
  for (let p = 0; p < logs.length; p += 1) sum += logs[p] = Math.exp(logs[p]! - top);
  for (let p = 0; p < logs.length; p += 1) logs[p]! /= sum;
  return logs;
}

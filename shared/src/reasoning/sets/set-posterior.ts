import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { fastLog } from './fast-log.js';
import type { RowProduct } from './row-product.js';
import { rowTable } from './row-table.js';
import type { SetAssumption, SetPrior } from './set-prior.js';

/** A product of P' is turned into its logarithm before it could fall below e to this. */
const lowestProduct = -640;

/** Writes for each set ln( weight × τ ), before any finding. */
export function priorLogs(
  { table, together }: SetAssumption,
  prior: SetPrior,
  logs: Float64Array,
): Float64Array {
  const { starts, lows, size, high } = table;
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
 * @param product working space
 */
export function addRowLogs(
  panel: CheckedPanel,
  view: View,
  rows: readonly number[],
  exponent: number,
  sums: Float64Array,
  product: RowProduct,
): void {
  const { entries } = product;
  const enter = () => {
    product.settle();
    for (let p = 0; p < entries.length; p += 1) sums[p]! += exponent * fastLog(entries[p]!);
  };
  let lowest = 0;
  product.restart();
  for (const r of rows) {
    const finding = panel.findings[r]!;
    const row = rowTable(product.space, view.cells, finding, panel.columns, finding.observed ?? 0);
    const least = Math.log(row.least);
    if (lowest < 0 && lowest + least < lowestProduct) {
      enter();
      product.restart();
      lowest = 0;
    }
    product.multiplyBy(row);
    lowest += least;
  }
  if (rows.length > 0) enter();
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

import type { CheckedContributor, CheckedFinding, CheckedPanel } from '../validation/checked-panel.js';
import { at, upTo } from './at.js';
import { logPool } from './log-pool.js';

/** For each column, the shares of the levels. */
export type Row = readonly (readonly number[])[];

/** One way to see the panel: a prior, and a row for each finding (null: nobody judged it). */
export interface View {
  prior: readonly number[];
  rows: readonly (Row | null)[];
}

/** One contributor's cell, or null for a blank. */
export function cellOf(contributor: CheckedContributor, { start, levels }: CheckedFinding, column: number) {
  const from = start + column * levels;
  const cell = Array.from(contributor.cells.subarray(from, from + levels));
  return cell[0] === 0 ? null : cell;
}

const counting = (contributors: readonly CheckedContributor[]) =>
  contributors.filter(({ weight }) => weight > 0);

export function pooledPrior(panel: CheckedPanel): number[] {
  const giving = counting(panel.contributors).filter(({ prior }) => prior !== null);
  if (giving.length === 0) return upTo(panel.columns).map(() => 1 / panel.columns);
  return logPool(
    giving.map(({ prior }) => prior ?? []),
    giving.map(({ weight }) => weight),
  );
}

/** The pooled cells of a finding before unjudged columns are filled in (null there). */
export function judgedCells(panel: CheckedPanel, finding: number): (number[] | null)[] {
  const largest = Math.max(...panel.contributors.map(({ weight }) => weight));
  return upTo(panel.columns).map((column) => {
    const cells: number[][] = [];
    const weights: number[] = [];
    for (const contributor of counting(panel.contributors)) {
      const cell = cellOf(contributor, at(panel.findings, finding), column);
      if (!cell) continue;
      cells.push(cell);
      weights.push((contributor.weight / largest) * at(Array.from(contributor.exposures), finding));
    }
    return cells.length === 0 ? null : logPool(cells, weights);
  });
}

/** The pooled row: a column nobody judged takes the equal-weight log pool of those that somebody judged. */
export function pooledRow(panel: CheckedPanel, finding: number): Row | null {
  const judged = judgedCells(panel, finding);
  const filled = judged.filter((cell) => cell !== null);
  if (filled.length === 0) return null;
  const neutral = logPool(
    filled,
    filled.map(() => 1),
  );
  return judged.map((cell) => cell ?? neutral);
}

export function pooledView(panel: CheckedPanel): View {
  return { prior: pooledPrior(panel), rows: panel.findings.map((_, finding) => pooledRow(panel, finding)) };
}

/** The row with one contributor's cells in place of the pooled ones; blanks stay pooled. */
export function rowOf(contributor: CheckedContributor, finding: CheckedFinding, pooled: Row): Row {
  return pooled.map((cell, column) => cellOf(contributor, finding, column) ?? cell);
}

/** The panel as one contributor sees it; rows that are unjudged in the pool stay out. */
export function ownView(panel: CheckedPanel, contributor: CheckedContributor, pooled: View): View {
  return {
    prior: contributor.prior ?? pooled.prior,
    rows: pooled.rows.map((row, finding) => row && rowOf(contributor, at(panel.findings, finding), row)),
  };
}

import type { CheckedFinding, CheckedPanel } from '../validation/checked-panel.js';
import { countingWeights } from './counting-weights.js';
import { fillUnjudged, writeCell, writeOdds } from './odds.js';

/** Rows as pooled: all cells, where the findings say, and for each finding whether anybody of positive weight judged it. */
export interface Pooled {
  cells: Float64Array;
  judged: readonly boolean[];
}

export interface PooledRows extends Pooled {
  /** Total weight behind each cell, at the cell's first place; 0 where nobody judged it. */
  weights: Float64Array;
  /**
   * For each contributor in turn the rows pooled without them. Only observed
   * rows are worked out, and each answer writes over the one before.
   */
  withoutEach<Value>(use: (contributor: number, pooled: Pooled) => Value): Value[];
}

/** Pools every cell over those who filled it in, weights w_j × exposure. */
export function poolRows(panel: CheckedPanel): PooledRows {
  const { cellCount, contributors, findings } = panel;
  const counting = countingWeights(panel);
  const terms = contributors.map((_, j) => weightedOdds(panel, j, counting[j]!));
  const all = new Float64Array(cellCount);
  for (const term of terms) add(term, all);
  const cells = new Float64Array(cellCount);
  return {
    cells,
    weights: all,
    judged: findings.map((finding) => writePooledRow(finding, panel.columns, all, cells)),

    /*
     * The sum without somebody is that of those before plus that of those
     * after. Nothing is subtracted, so that a small weight beside a large one
     * loses no digits.
     */
    withoutEach(use) {
      const after = terms.map(() => new Float64Array(cellCount));
      for (let j = terms.length - 2; j >= 0; j -= 1) {
        after[j]!.set(after[j + 1]!);
        add(terms[j + 1]!, after[j]!);
      }
      const before = new Float64Array(cellCount);
      const others = new Float64Array(cellCount);
      const pooled = new Float64Array(cellCount);
      return terms.map((term, j) => {
        others.set(before);
        add(after[j]!, others);
        add(term, before);
        const judged = findings.map(
          (finding) => finding.observed !== null && writePooledRow(finding, panel.columns, others, pooled),
        );
        return use(j, { cells: pooled, judged });
      });
    },
  };
}

/** One contributor's log odds times weight × exposure, with that weight itself in the first place of each cell. */
function weightedOdds(
  { columns, findings, cellCount, contributors }: CheckedPanel,
  j: number,
  counting: number,
): Float64Array {
  const { cells, exposures } = contributors[j]!;
  const term = new Float64Array(cellCount);
  if (counting === 0) return term;
  for (let r = 0; r < findings.length; r += 1) {
    const { start, levels } = findings[r]!;
    const weight = counting * exposures[r]!;
    if (weight === 0) continue;
    const end = start + columns * levels;
    for (let from = start; from < end; from += levels) {
      if (cells[from] === 0) continue;
      writeOdds(cells, term, from, levels);
      term[from] = weight;
      for (let level = 1; level < levels; level += 1) term[from + level]! *= weight;
    }
  }
  return term;
}

function add(terms: Float64Array, sums: Float64Array): void {
  for (let index = 0; index < sums.length; index += 1) sums[index]! += terms[index]!;
}

/**
 * Turns the sums of one row into mean log odds, in place, fills its unjudged
 * columns and writes its cells. Returns whether anybody judged the row.
 */
function writePooledRow(
  finding: CheckedFinding,
  columns: number,
  sums: Float64Array,
  cells: Float64Array,
): boolean {
  const { start, levels } = finding;
  const end = start + columns * levels;
  let judged = false;
  for (let from = start; from < end; from += levels) {
    const weight = sums[from]!;
    if (weight === 0) continue;
    judged = true;
    for (let level = 1; level < levels; level += 1) sums[from + level]! /= weight;
  }
  if (!judged) return false;
  fillUnjudged(sums, finding, columns);
  for (let from = start; from < end; from += levels) writeCell(sums, cells, from, levels);
  return true;
}

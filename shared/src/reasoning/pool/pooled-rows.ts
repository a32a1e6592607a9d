import type { CheckedPanel } from '../validation/checked-panel.js';
import { countingWeights } from './counting-weights.js';
import { fillUnjudged, writeCell, writeOdds } from './odds.js';

/** Every row pooled over all contributors, and over all but one. */
export interface PooledRows {
  /** All pooled cells, where the findings say; zeros in rows nobody judged. */
  cells: Float64Array;
  /** Total weight behind each cell, at the cell's first place. */
  weights: Float64Array;
  /** For each finding: whether anybody of positive weight judged it. */
  judged: readonly boolean[];
  /** The same with one contributor left out. */
  without(contributor: number): Pick<PooledRows, 'cells' | 'judged'>;
}

/**
 * Pools every cell over those who filled it in, weights w_j × exposure.
 *
 * Leaving one contributor out adds the sums of those before and those after;
 * nothing is subtracted, so that a small weight beside a large one loses no digits.
 */
export function poolRows(panel: CheckedPanel): PooledRows {
  const { cellCount, contributors } = panel;
  const counting = countingWeights(panel);
  /** Sums over the contributors before j (j from 0 to their number): odds × weight, and the weight in the first place. */
  const before = Array.from({ length: contributors.length + 1 }, () => new Float64Array(cellCount));
  const terms = contributors.map((_, j) => {
    const term = weightedOdds(panel, j, counting[j]!);
    addLists(before[j]!, term, before[j + 1]!);
    return term;
  });
  const all = finish(panel, before[contributors.length]!);
  /** Sums over the contributors after j, made when first asked for. */
  const after: Float64Array[] = [];
  const sumAfter = (j: number): Float64Array => {
    const known = after[j];
    if (known) return known;
    const sum = new Float64Array(cellCount);
    if (j + 1 < contributors.length) addLists(terms[j + 1]!, sumAfter(j + 1), sum);
    return (after[j] = sum);
  };
  return {
    ...all,
    without(j) {
      const sum = new Float64Array(cellCount);
      addLists(before[j]!, sumAfter(j), sum);
      return finish(panel, sum);
    },
  };
}

/** One contributor's log odds times weight × exposure, with that weight itself in the first place of each cell. */
function weightedOdds(
  { columns, findings, cellCount, contributors }: CheckedPanel,
  j: number,
  counting: number,
) {
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

function addLists(one: Float64Array, other: Float64Array, sum: Float64Array): void {
  for (let index = 0; index < sum.length; index += 1) sum[index] = one[index]! + other[index]!;
}

/** Divides the sums by their weights, fills unjudged columns and turns odds into shares. */
function finish({ columns, findings }: CheckedPanel, sums: Float64Array) {
  const cells = new Float64Array(sums.length);
  const odds = new Float64Array(sums.length);
  const judged = findings.map((finding) => {
    const { start, levels } = finding;
    const end = start + columns * levels;
    let filled = false;
    for (let from = start; from < end; from += levels) {
      const weight = sums[from]!;
      if (weight === 0) continue;
      filled = true;
      for (let level = 1; level < levels; level += 1) odds[from + level] = sums[from + level]! / weight;
    }
    if (!filled) return false;
    fillUnjudged(odds, sums, finding, columns);
    for (let from = start; from < end; from += levels) writeCell(odds, cells, from, levels);
    return true;
  });
  return { cells, weights: sums, judged };
}

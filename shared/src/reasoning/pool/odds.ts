import type { CheckedFinding } from '../validation/checked-panel.js';

/**
 * A cell as log odds of each level but the first against the first. In this
 * form a log pool is a weighted mean, and a cell of two levels needs one
 * logarithm to enter and one exponential to leave.
 *
 * They lie in the places of the levels 1 and up of the same cell, the place of
 * level 0 being unused, so that cells and odds share their positions.
 */
export function writeOdds(cells: Float64Array, odds: Float64Array, from: number, levels: number): void {
  const first = cells[from]!;
  for (let level = 1; level < levels; level += 1) odds[from + level] = Math.log(cells[from + level]! / first);
}

/** The cell that has these log odds. Pooled odds stay within ±7, so no exponential overflows. */
export function writeCell(odds: Float64Array, cells: Float64Array, from: number, levels: number): void {
  let sum = 1;
  for (let level = 1; level < levels; level += 1) sum += cells[from + level] = Math.exp(odds[from + level]!);
  cells[from] = 1 / sum;
  for (let level = 1; level < levels; level += 1) cells[from + level]! /= sum;
}

/**
 * Fills the columns of a row that nobody judged with the equal-weight log pool
 * of those that somebody judged, at least one.
 *
 * @param odds with the total weight behind each cell at the cell's first place: 0 where nobody judged it
 */
export function fillUnjudged(odds: Float64Array, { start, levels }: CheckedFinding, columns: number): void {
  const end = start + columns * levels;
  let judged = 0;
  for (let from = start; from < end; from += levels) if (odds[from]! > 0) judged += 1;
  if (judged === columns) return;
  for (let level = 1; level < levels; level += 1) {
    let sum = 0;
    for (let from = start; from < end; from += levels) if (odds[from]! > 0) sum += odds[from + level]!;
    for (let from = start; from < end; from += levels)
      if (odds[from] === 0) odds[from + level] = sum / judged;
  }
}

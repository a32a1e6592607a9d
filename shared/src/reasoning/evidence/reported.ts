import type { CheckedFinding } from '../validation/checked-panel.js';

/** Mean over the K+1 columns of P(level | column): what an unreliable report falls back on. */
export function meanOverColumns(
  cells: Float64Array,
  { start, levels }: CheckedFinding,
  columns: number,
  level: number,
): number {
  let sum = 0;
  for (let column = 0; column < columns; column += 1) sum += cells[start + column * levels + level]!;
  return sum / columns;
}

/**
 * For each column P'(level | column): with chance 1 - reliability the report
 * would have been the same whatever the cause.
 *
 * P'(v | k) = ρ P(v | k) + (1 - ρ) m(v), m the mean over the columns.
 */
export function writeReported(
  cells: Float64Array,
  finding: CheckedFinding,
  columns: number,
  level: number,
  target: Float64Array,
): void {
  const { start, levels, reliability } = finding;
  const mixed = (1 - reliability) * meanOverColumns(cells, finding, columns, level);
  for (let column = 0; column < columns; column += 1) {
    target[column] = reliability * cells[start + column * levels + level]! + mixed;
  }
}

/**
 * Brier score of one case in its multi-class form, Σ_k (π_k - y_k)²: 0 is best,
 * 2 worst. Of two classes it is twice the (p - y)² that is also called by this
 * name.
 *
 * Source: Brier 1950, Monthly Weather Review 78:1-3.
 *
 * @param standing shares that sum to 1, *none of these* last
 * @param happened the column that was the case
 * @throws RangeError where there is no such column
 * @example brierScore([0.7, 0.2, 0.1], 0) // 0.14
 */
export function brierScore(standing: readonly number[], happened: number): number {
  requireColumn(standing, happened);
  return standing.reduce((sum, share, column) => sum + (share - (column === happened ? 1 : 0)) ** 2, 0);
}

/**
 * Log score of one case in bits, -log2 of the share that what happened was
 * given: 0 is best, there is no worst.
 *
 * Source: Good 1952, J. R. Statist. Soc. B 14:107-114.
 *
 * @throws RangeError where there is no such column
 * @example logScoreBits([0.5, 0.25, 0.25], 1) // 2
 */
export function logScoreBits(standing: readonly number[], happened: number): number {
  requireColumn(standing, happened);
  // A share of 1 gives -0, which would print as a minus.
  return -Math.log2(standing[happened]!) || 0;
}

function requireColumn(standing: readonly number[], column: number): void {
  if (!(Number.isInteger(column) && column >= 0 && column < standing.length)) {
    throw new RangeError(`no column ${column} in a standing of ${standing.length}`);
  }
}

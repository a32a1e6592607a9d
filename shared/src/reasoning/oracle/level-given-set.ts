import { at, normalised, sum, upTo } from './at.js';
import type { Row } from './view.js';

/**
 * P(level | set) for each level, from the cells of a row. For a single
 * candidate both forms give back its own cell.
 *
 * Two levels: leaky noisy-OR (Pearl 1988; Henrion 1989), candidates that make
 * the finding rarer as inhibitors. More levels: ratios to *none of these*
 * multiplied.
 */
export function levelsGivenSet(row: Row, set: readonly number[]): number[] {
  const none = at(row, row.length - 1);
  if (set.length === 0) return [...none];
  if (set.length === 1) return [...at(row, at(set, 0))];
  if (none.length > 2) {
    const products = none.map((share, level) =>
      set.reduce((product, candidate) => product * (at(at(row, candidate), level) / share), share),
    );
    return normalised(products);
  }
  const leak = at(none, 1);
  let quiet = 1;
  let damped = 1;
  for (const candidate of set) {
    const present = at(at(row, candidate), 1);
    if (present >= leak) quiet *= (1 - present) / (1 - leak);
    else damped *= present / leak;
  }
  const present = (1 - (1 - leak) * quiet) * damped;
  return [1 - present, present];
}

/** With chance 1 - reliability the report would have been the same whatever the cause. */
export function reportedGivenSet(row: Row, set: readonly number[], reliability: number): number[] {
  const columns = row.length;
  const mean = at(row, 0).map(
    (_, level) => sum(upTo(columns).map((column) => at(at(row, column), level))) / columns,
  );
  return levelsGivenSet(row, set).map(
    (share, level) => reliability * share + (1 - reliability) * at(mean, level),
  );
}

import { limits } from '../validation/limits.js';
import type { CheckedFinding } from '../validation/checked-panel.js';
import type { Half, SetTable } from './set-table.js';

/**
 * P'(level | set) = mixed + reliability / (1 + Σ_v low[l, v] × high[h, v]) over
 * the other levels v: one division per set.
 */
export interface MoreLevelTable {
  kind: 'more';
  /** Number of the other levels. */
  others: number;
  reliability: number;
  mixed: number;
  /** Subset × others: what is said for each other level against this one. */
  low: Float64Array;
  high: Float64Array;
  /** No value is below this. */
  least: number;
}

/** Room for one table of any number of levels, used again for row after row. */
export function moreLevelSpace({ low, high }: SetTable): MoreLevelTable {
  const most = limits.levels - 1;
  return {
    kind: 'more',
    others: most,
    reliability: 1,
    mixed: 0,
    low: new Float64Array(low.members.length * most),
    high: new Float64Array(high.members.length * most),
    least: 0,
  };
}

/**
 * P(v | S) ∝ P(v | none) Π_{k∈S} P(v | k) / P(v | none), divided by the term of
 * the level asked for.
 *
 * @returns the table given as room for it, filled
 */
export function moreLevelTable(
  table: MoreLevelTable,
  sets: SetTable,
  cells: Float64Array,
  { start, levels, reliability }: CheckedFinding,
  level: number,
  mixed: number,
): MoreLevelTable {
  const others = levels - 1;
  const none = start + sets.candidates * levels;
  let most = 1;
  for (let other = 0; other < others; other += 1) {
    const v = other < level ? other : other + 1;
    // The odds of *none of these* itself come in once, with the low half.
    const odds = cells[none + v]! / cells[none + level]!;
    const largestLow = writeOdds(table.low, sets.low, cells, start, levels, other, v, level, none, odds);
    const largestHigh = writeOdds(table.high, sets.high, cells, start, levels, other, v, level, none, 1);
    most += largestLow * largestHigh;
  }
  table.others = others;
  table.reliability = reliability;
  table.mixed = mixed;
  table.least = mixed + reliability / most;
  return table;
}

/**
 * For each subset of a half the product over its members of the odds of v
 * against the level asked for, each divided by those of *none of these*, times
 * `first`. Returns the largest.
 */
function writeOdds(
  odds: Float64Array,
  { parents, added }: Half,
  cells: Float64Array,
  start: number,
  levels: number,
  other: number,
  v: number,
  level: number,
  none: number,
  first: number,
): number {
  const others = levels - 1;
  const against = cells[none + level]! / cells[none + v]!;
  odds[other] = first;
  let largest = first;
  for (let index = 1; index < parents.length; index += 1) {
    const cell = start + added[index]! * levels;
    const value =
      (odds[parents[index]! * others + other]! * cells[cell + v]! * against) / cells[cell + level]!;
    odds[index * others + other] = value;
    if (value > largest) largest = value;
  }
  return largest;
}

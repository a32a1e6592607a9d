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

/** P(v | S) ∝ P(v | none) Π_{k∈S} P(v | k) / P(v | none), divided by the term of the level asked for. */
export function moreLevelTable(
  table: SetTable,
  cells: Float64Array,
  { start, levels, reliability }: CheckedFinding,
  level: number,
  mixed: number,
): MoreLevelTable {
  const others = levels - 1;
  const none = start + table.candidates * levels;
  const low = halfOdds(table.low, cells, start, levels, level, none);
  const high = halfOdds(table.high, cells, start, levels, level, none);
  let most = 1;
  for (let other = 0; other < others; other += 1) {
    // The odds of *none of these* itself come in once, with the low half.
    const odds = cells[none + (other < level ? other : other + 1)]! / cells[none + level]!;
    for (let place = other; place < low.length; place += others) low[place]! *= odds;
    most += largest(low, other, others) * largest(high, other, others);
  }
  return { kind: 'more', others, reliability, mixed, low, high, least: mixed + reliability / most };
}

/**
 * For each subset of a half and each other level v the product over its members
 * of the odds of v against the level asked for, each divided by those of *none
 * of these*; 1 for the empty subset.
 */
function halfOdds(
  half: Half,
  cells: Float64Array,
  start: number,
  levels: number,
  level: number,
  none: number,
): Float64Array {
  const { parents, added } = half;
  const others = levels - 1;
  const odds = new Float64Array(parents.length * others).fill(1, 0, others);
  for (let index = 1; index < parents.length; index += 1) {
    const cell = start + added[index]! * levels;
    const against = cells[none + level]! / cells[cell + level]!;
    for (let other = 0; other < others; other += 1) {
      const v = other < level ? other : other + 1;
      const change = (cells[cell + v]! / cells[none + v]!) * against;
      odds[index * others + other] = odds[parents[index]! * others + other]! * change;
    }
  }
  return odds;
}

function largest(values: Float64Array, from: number, step: number): number {
  let most = 0;
  for (let place = from; place < values.length; place += step)
    if (values[place]! > most) most = values[place]!;
  return most;
}

import type { Half, SetTable } from './set-table.js';

/**
 * P'(level | set) = base[h] + first[h] × one[l] + second[h] × other[l], for the
 * set with the low half l and the high half h. Nothing in it is negative.
 */
export interface TwoLevelTable {
  kind: 'two';
  base: Float64Array;
  first: Float64Array;
  second: Float64Array;
  one: Float64Array;
  other: Float64Array;
  /** No value is below this. */
  least: number;
}

/**
 * For each subset of a half what its members leave of the finding. Causes are
 * candidates that make it no rarer than the leak, inhibitors the others:
 * `quiet` is the chance that no cause brings it about (in the low half also
 * that the leak does not), `loud` what is missing from 1; `open` the chance
 * that no inhibitor suppresses it, `shut` what is missing from 1. All are built
 * by additions and multiplications, never by 1 - x, so that no digits are lost.
 */
interface HalfEffects {
  quiet: Float64Array;
  loud: Float64Array;
  open: Float64Array;
  shut: Float64Array;
}

function halfEffects(
  half: Half,
  cells: Float64Array,
  start: number,
  leak: number,
  loudAtFirst: number,
): HalfEffects {
  const { parents, added } = half;
  const size = parents.length;
  const quiet = new Float64Array(size);
  const loud = new Float64Array(size);
  const open = new Float64Array(size);
  const shut = new Float64Array(size);
  quiet[0] = 1 - loudAtFirst;
  loud[0] = loudAtFirst;
  open[0] = 1;
  for (let index = 1; index < size; index += 1) {
    const parent = parents[index]!;
    const cell = start + 2 * added[index]!;
    const present = cells[cell + 1]!;
    if (present >= leak) {
      const brings = (present - leak) / (1 - leak);
      loud[index] = loud[parent]! + quiet[parent]! * brings;
      quiet[index] = (quiet[parent]! * cells[cell]!) / (1 - leak);
      open[index] = open[parent]!;
      shut[index] = shut[parent]!;
    } else {
      loud[index] = loud[parent]!;
      quiet[index] = quiet[parent]!;
      shut[index] = shut[parent]! + (open[parent]! * (leak - present)) / leak;
      open[index] = (open[parent]! * present) / leak;
    }
  }
  return { quiet, loud, open, shut };
}

/**
 * Leaky noisy-OR with inhibitors (Pearl 1988; Henrion 1989):
 * P(present | S) = loud × open, P(absent | S) = shut + open × quiet.
 *
 * @param start where the row's cells begin: absent, present for each column, *none of these* last
 * @param mixed the part of P' that does not depend on the set
 */
export function twoLevelTable(
  table: SetTable,
  cells: Float64Array,
  start: number,
  reliability: number,
  mixed: number,
  level: number,
): TwoLevelTable {
  const leak = cells[start + 2 * table.candidates + 1]!;
  const low = halfEffects(table.low, cells, start, leak, leak);
  const high = halfEffects(table.high, cells, start, leak, 0);
  const present = level === 1;
  // The tables of the high half are written over what they are made of; nothing else needs it.
  const base = high.shut;
  const first = high.open;
  const second = present ? high.loud : high.quiet;
  for (let h = 0; h < base.length; h += 1) {
    base[h] = present ? mixed : mixed + reliability * base[h]!;
    first[h]! *= reliability;
    second[h]! *= first[h]!;
  }
  const one = present ? low.loud : low.shut;
  const other = low.quiet;
  for (let l = 0; l < one.length; l += 1) {
    other[l]! *= low.open[l]!;
    if (present) one[l]! *= low.open[l]!;
  }
  return { kind: 'two', base, first, second, one, other, least: leastOf(base, first, second, one, other) };
}

function leastOf(
  base: Float64Array,
  first: Float64Array,
  second: Float64Array,
  one: Float64Array,
  other: Float64Array,
): number {
  const smallestOne = smallest(one);
  const smallestOther = smallest(other);
  let least = Infinity;
  for (let h = 0; h < base.length; h += 1) {
    const value = base[h]! + first[h]! * smallestOne + second[h]! * smallestOther;
    if (value < least) least = value;
  }
  return least;
}

function smallest(values: Float64Array): number {
  let least = Infinity;
  for (let index = 0; index < values.length; index += 1) if (values[index]! < least) least = values[index]!;
  return least;
}

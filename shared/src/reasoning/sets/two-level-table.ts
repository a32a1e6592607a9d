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

/** Room for one table, used again for row after row: making lists takes longer than filling them. */
export interface TwoLevelSpace {
  low: HalfEffects;
  high: HalfEffects;
  table: TwoLevelTable;
}

export function twoLevelSpace({ low, high }: SetTable): TwoLevelSpace {
  const effectsOf = ({ members }: Half): HalfEffects => ({
    quiet: new Float64Array(members.length),
    loud: new Float64Array(members.length),
    open: new Float64Array(members.length),
    shut: new Float64Array(members.length),
  });
  const lowEffects = effectsOf(low);
  const highEffects = effectsOf(high);
  return {
    low: lowEffects,
    high: highEffects,
    table: {
      kind: 'two',
      base: highEffects.shut,
      first: highEffects.open,
      second: highEffects.loud,
      one: lowEffects.loud,
      other: lowEffects.quiet,
      least: 0,
    },
  };
}

/**
 * Leaky noisy-OR with inhibitors (Pearl 1988; Henrion 1989):
 * P(present | S) = loud × open, P(absent | S) = shut + open × quiet.
 *
 * @param start where the row's cells begin: absent, present for each column, *none of these* last
 * @param mixed the part of P' that does not depend on the set
 * @returns the table of the space, filled
 */
export function twoLevelTable(
  space: TwoLevelSpace,
  sets: SetTable,
  cells: Float64Array,
  start: number,
  reliability: number,
  mixed: number,
  level: number,
): TwoLevelTable {
  const { low, high, table } = space;
  const leak = cells[start + 2 * sets.candidates + 1]!;
  writeEffects(low, sets.low, cells, start, leak, leak);
  writeEffects(high, sets.high, cells, start, leak, 0);
  const present = level === 1;
  table.second = present ? high.loud : high.quiet;
  table.one = present ? low.loud : low.shut;
  const { base, first, second, one, other } = table;
  // The tables are written over what they are made of: `base` is `shut`, `first` is `open`.
  for (let h = 0; h < base.length; h += 1) {
    base[h] = present ? mixed : mixed + reliability * base[h]!;
    first[h]! *= reliability;
    second[h]! *= first[h]!;
  }
  let leastOne = Infinity;
  let leastOther = Infinity;
  for (let l = 0; l < one.length; l += 1) {
    other[l]! *= low.open[l]!;
    if (present) one[l]! *= low.open[l]!;
    if (one[l]! < leastOne) leastOne = one[l]!;
    if (other[l]! < leastOther) leastOther = other[l]!;
  }
  table.least = Infinity;
  for (let h = 0; h < base.length; h += 1) {
    const value = base[h]! + first[h]! * leastOne + second[h]! * leastOther;
    if (value < table.least) table.least = value;
  }
  return table;
}

function writeEffects(
  { quiet, loud, open, shut }: HalfEffects,
  { parents, added }: Half,
  cells: Float64Array,
  start: number,
  leak: number,
  loudAtFirst: number,
): void {
  quiet[0] = 1 - loudAtFirst;
  loud[0] = loudAtFirst;
  open[0] = 1;
  shut[0] = 0;
  const perQuiet = 1 / (1 - leak);
  const perLeak = 1 / leak;
  for (let index = 1; index < parents.length; index += 1) {
    const parent = parents[index]!;
    const cell = start + 2 * added[index]!;
    const present = cells[cell + 1]!;
    if (present >= leak) {
      loud[index] = loud[parent]! + quiet[parent]! * (present - leak) * perQuiet;
      quiet[index] = quiet[parent]! * cells[cell]! * perQuiet;
      open[index] = open[parent]!;
      shut[index] = shut[parent]!;
    } else {
      loud[index] = loud[parent]!;
      quiet[index] = quiet[parent]!;
      shut[index] = shut[parent]! + open[parent]! * (leak - present) * perLeak;
      open[index] = open[parent]! * present * perLeak;
    }
  }
}

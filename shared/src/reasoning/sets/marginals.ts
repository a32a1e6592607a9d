import type { SetList, SetTable } from './set-table.js';

/**
 * For each candidate the sum of the entries of the sets it is in, and the entry
 * of the empty set last. One pass adds the entries up by low and by high half;
 * the candidates' sums come from those.
 *
 * @param list the sets that the entries belong to, all of the table's or some of them
 * @param none the entry of the empty set
 */
export function marginals(table: SetTable, { starts, lows }: SetList, entries: Float64Array, none: number) {
  const { low, high, candidates } = table;
  const byLow = new Float64Array(low.members.length);
  const byHigh = new Float64Array(high.members.length);
  for (let h = 0; h < byHigh.length; h += 1) {
    const end = starts[h + 1]!;
    let sum = 0;
    for (let p = starts[h]!; p < end; p += 1) {
      const entry = entries[p]!;
      sum += entry;
      byLow[lows[p]!]! += entry;
    }
    byHigh[h] = sum;
  }
  const sums = new Float64Array(candidates + 1);
  for (const [half, values] of [
    [low, byLow],
    [high, byHigh],
  ] as const) {
    for (let index = 1; index < values.length; index += 1) {
      for (let rest = half.members[index]!; rest !== 0; rest &= rest - 1) {
        sums[half.from + 31 - Math.clz32(rest & -rest)]! += values[index]!;
      }
    }
  }
  sums[candidates] = none;
  return sums;
}

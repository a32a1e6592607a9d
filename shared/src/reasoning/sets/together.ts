import type { CheckedPair } from '../validation/checked-panel.js';
import type { Half, SetTable } from './set-table.js';

/**
 * For each set the sum of ln t_ab over its pairs, -Infinity where a pair is
 * excluded; null where every pair occurs as often as chance says.
 */
export function togetherLogs(table: SetTable, pairs: readonly CheckedPair[]): Float64Array | null {
  if (pairs.every(({ times }) => times === 1)) return null;
  const logs = new Float64Array(table.candidates * table.candidates);
  for (const { a, b, times } of pairs) {
    logs[a * table.candidates + b] = Math.log(times);
    logs[b * table.candidates + a] = Math.log(times);
  }
  const { low, high, starts, lows, size } = table;
  const withinLow = withinHalf(low, logs, table.candidates);
  const withinHigh = withinHalf(high, logs, table.candidates);
  const sums = new Float64Array(size);
  const across = new Float64Array(low.members.length);
  for (let h = 0; h < high.members.length; h += 1) {
    const end = starts[h + 1]!;
    for (let p = starts[h]!; p < end; p += 1) {
      const l = lows[p]!;
      // A subset's pairs across are those of the subset without its highest member, and that member's.
      if (l > 0)
        across[l] = across[low.parents[l]!]! + towards(high, h, logs, low.added[l]! * table.candidates);
      sums[p] = withinLow[l]! + withinHigh[h]! + across[l]!;
    }
  }
  return sums;
}

function withinHalf(half: Half, logs: Float64Array, candidates: number): Float64Array {
  const sums = new Float64Array(half.members.length);
  for (let index = 1; index < sums.length; index += 1) {
    const parent = half.parents[index]!;
    sums[index] = sums[parent]! + towards(half, parent, logs, half.added[index]! * candidates);
  }
  return sums;
}

/** Sum of the logarithms of one candidate, from `row`, with the members of a subset. */
function towards(half: Half, subset: number, logs: Float64Array, row: number): number {
  let sum = 0;
  for (let rest = half.members[subset]!; rest !== 0; rest &= rest - 1) {
    sum += logs[row + half.from + 31 - Math.clz32(rest & -rest)]!;
  }
  return sum;
}

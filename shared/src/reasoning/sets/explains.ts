import type { Explanation } from '../assessment.js';
import { descending } from '../descending.js';
import type { SetTable } from './set-table.js';

const mostListed = 5;

/**
 * Explaining away: the five ordered pairs of candidates for which
 * P(then | if) falls furthest below P(then); drops within rounding are none.
 *
 * @param shares posterior of each set
 * @param standing P(k is in the set) for each candidate
 */
export function explains(table: SetTable, shares: Float64Array, standing: Float64Array): Explanation[] {
  const { candidates } = table;
  const both = jointShares(table, shares);
  const drops: Explanation[] = [];
  for (let given = 0; given < candidates; given += 1) {
    for (let then = 0; then < candidates; then += 1) {
      const share = standing[given]!;
      if (then === given || share === 0) continue;
      const from = standing[then]!;
      const to = both[given * candidates + then]! / share;
      if (from - to > 1e-12) drops.push({ if: given, then, from, to });
    }
  }
  return descending(drops, ({ from, to }) => from - to).slice(0, mostListed);
}

/** For each two candidates the share of the sets that have both, at one × K + other. */
function jointShares({ candidates, low, high, starts, lows }: SetTable, shares: Float64Array): Float64Array {
  const both = new Float64Array(candidates * candidates);
  const byLow = new Float64Array(low.members.length);
  /** Of the sets with one high half: their share, and the shares of those with each low candidate. */
  const withLow = new Float64Array(low.count);
  for (let h = 0; h < high.members.length; h += 1) {
    withLow.fill(0);
    let sum = 0;
    for (let p = starts[h]!; p < starts[h + 1]!; p += 1) {
      const share = shares[p]!;
      sum += share;
      byLow[lows[p]!]! += share;
      for (let rest = low.members[lows[p]!]!; rest !== 0; rest &= rest - 1) {
        withLow[31 - Math.clz32(rest & -rest)]! += share;
      }
    }
    const members = membersOf(high.members[h]!, high.from);
    addPairs(both, candidates, members, sum);
    for (const one of members) {
      for (let other = 0; other < low.count; other += 1) {
        both[one * candidates + other]! += withLow[other]!;
        both[other * candidates + one]! += withLow[other]!;
      }
    }
  }
  low.members.forEach((members, l) => addPairs(both, candidates, membersOf(members, low.from), byLow[l]!));
  return both;
}

function addPairs(both: Float64Array, candidates: number, members: readonly number[], share: number): void {
  for (const one of members) {
    for (const other of members) if (one !== other) both[one * candidates + other]! += share;
  }
}

/** The members of a subset given as bits, ascending. */
export function membersOf(bits: number, from: number): number[] {
  const members: number[] = [];
  for (let rest = bits; rest !== 0; rest &= rest - 1) members.push(from + 31 - Math.clz32(rest & -rest));
  return members;
}

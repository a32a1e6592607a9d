import type { CandidateSet } from '../assessment.js';
import { byFallingShare, equalShare, mostSetsListed } from './by-falling-share.js';
import { membersOf } from './explains.js';
import type { SetTable } from './set-table.js';

/** The most probable of the counted sets, at most 8. */
export function mostProbableSets(
  { low, high, starts, lows }: SetTable,
  shares: Float64Array,
): CandidateSet[] {
  const least = smallestListed(shares) * (1 - 2 * equalShare);
  const sets: CandidateSet[] = [];
  for (let h = 0; h < high.members.length; h += 1) {
    for (let p = starts[h]!; p < starts[h + 1]!; p += 1) {
      if (!(shares[p]! >= least)) continue;
      const members = [
        ...membersOf(low.members[lows[p]!]!, low.from),
        ...membersOf(high.members[h]!, high.from),
      ];
      sets.push({ members, p: shares[p]! });
    }
  }
  return byFallingShare(sets);
}

/** The eighth largest share, or the smallest where there are fewer. */
function smallestListed(shares: Float64Array): number {
  const largest = new Float64Array(Math.min(mostSetsListed, shares.length)).fill(-1);
  for (let p = 0; p < shares.length; p += 1) {
    const share = shares[p]!;
    if (share <= largest[0]!) continue;
    // The list stays ascending: what is smaller than the new one moves down.
    let place = 1;
    for (; place < largest.length && largest[place]! < share; place += 1)
      largest[place - 1] = largest[place]!;
    largest[place - 1] = share;
  }
  return largest[0]!;
}

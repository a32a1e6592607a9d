import type { SetList, SetTable } from './set-table.js';

/** The sets a question about the posterior is answered over. */
export interface Support extends SetList {
  /** Posterior of each set in the list; the empty set is always the first. */
  shares: Float64Array;
  /** Where each set stands in the table. */
  positions: Int32Array;
  /** Posterior of all sets that are not in the list. */
  aside: number;
  /** Working space, a number for each set of the list. */
  work: Float64Array;
  divided: Float64Array;
  /** For columns that were asked for, whether they are the case in each set. */
  holds: Map<number, Float64Array>;
}

/**
 * The sets that are left when the least probable ones are left aside, as many
 * as together have no more than `budget` of the posterior. After some findings
 * most sets are such that all of them together could not change a digit.
 */
export function significantSets(table: SetTable, shares: Float64Array, budget: number): Support {
  const { starts, lows, size } = table;
  const least = thresholdFor(shares, budget);
  const keptStarts = new Int32Array(starts.length);
  const keptLows = new Uint16Array(size);
  const keptShares = new Float64Array(size);
  const positions = new Int32Array(size);
  let aside = 0;
  let count = 0;
  for (let h = 0; h + 1 < starts.length; h += 1) {
    for (let p = starts[h]!; p < starts[h + 1]!; p += 1) {
      if (shares[p]! < least && p > 0) {
        aside += shares[p]!;
        continue;
      }
      keptLows[count] = lows[p]!;
      keptShares[count] = shares[p]!;
      positions[count] = p;
      count += 1;
    }
    keptStarts[h + 1] = count;
  }
  return support(keptStarts, keptLows.subarray(0, count), keptShares.subarray(0, count), positions, aside);
}

/** All sets, for the rare question that the significant ones cannot answer. */
export function allSets({ starts, lows, size }: SetTable, shares: Float64Array): Support {
  const positions = new Int32Array(size);
  for (let p = 0; p < size; p += 1) positions[p] = p;
  return support(starts, lows, shares, positions, 0);
}

function support(
  starts: Int32Array,
  lows: Uint16Array,
  shares: Float64Array,
  positions: Int32Array,
  aside: number,
): Support {
  const size = shares.length;
  const [work, divided] = [new Float64Array(size), new Float64Array(size)];
  return { starts, lows, size, shares, positions, aside, work, divided, holds: new Map() };
}

/** A share such that all smaller ones sum to at most the budget, within a factor of 2 of the largest such. */
function thresholdFor(shares: Float64Array, budget: number): number {
  let threshold = budget / shares.length;
  while (threshold < 1 && sumBelow(shares, 2 * threshold) <= budget) threshold *= 2;
  return threshold;
}

function sumBelow(shares: Float64Array, threshold: number): number {
  let sum = 0;
  for (let p = 0; p < shares.length; p += 1) if (shares[p]! < threshold) sum += shares[p]!;
  return sum;
}

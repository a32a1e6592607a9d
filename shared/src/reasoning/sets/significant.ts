import type { SetList, SetTable } from './set-table.js';

/** Sets with a smaller share of the posterior than this are left aside where that provably changes nothing. */
const leastShare = 1e-24;

/** Relative change that leaving sets aside may make, far below the 1e-12 that is promised. */
export const harmless = 1e-14;

/** The sets a question about the posterior is answered over. */
export interface Support extends SetList {
  /** Posterior of each set in the list. */
  shares: Float64Array;
  /** Where each set stands in the table. */
  positions: Int32Array;
  /** Posterior of all sets that are not in the list. */
  aside: number;
}

/** The sets whose share is worth counting. After a few findings they are a small part of all. */
export function significantSets({ starts, lows, size }: SetTable, shares: Float64Array): Support {
  const positions = new Int32Array(size);
  const kept: Support = {
    starts: new Int32Array(starts.length),
    lows: new Uint16Array(size),
    size: 0,
    shares: new Float64Array(size),
    positions,
    aside: 0,
  };
  let count = 0;
  for (let h = 0; h + 1 < starts.length; h += 1) {
    for (let p = starts[h]!; p < starts[h + 1]!; p += 1) {
      // The empty set always stays, so that it can be found at the first place.
      if (shares[p]! < leastShare && p > 0) {
        kept.aside += shares[p]!;
        continue;
      }
      kept.lows[count] = lows[p]!;
      kept.shares[count] = shares[p]!;
      positions[count] = p;
      count += 1;
    }
    kept.starts[h + 1] = count;
  }
  return {
    ...kept,
    size: count,
    lows: kept.lows.subarray(0, count),
    shares: kept.shares.subarray(0, count),
    positions: positions.subarray(0, count),
  };
}

/** All sets, for the rare question that the significant ones cannot answer. */
export function allSets({ starts, lows, size }: SetTable, shares: Float64Array): Support {
  return { starts, lows, size, shares, positions: Int32Array.from({ length: size }, (_, p) => p), aside: 0 };
}

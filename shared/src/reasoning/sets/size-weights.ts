import type { Half, SetTable } from './set-table.js';

/**
 * For each size m the sum of Π p over the sets of m candidates, for all sizes
 * up to K: elementary symmetric polynomials, built by additions alone.
 */
export function symmetricSums(prior: Float64Array, candidates: number): Float64Array {
  const sums = new Float64Array(candidates + 1);
  sums[0] = 1;
  for (let candidate = 0; candidate < candidates; candidate += 1) {
    for (let size = candidate + 1; size > 0; size -= 1) sums[size]! += prior[candidate]! * sums[size - 1]!;
  }
  return sums;
}

/**
 * What the pairs are worth to each set, in a scale in which nothing that
 * matters underflows: factor(S) = exp( Σ ln t - (|S| - 1) shift ), at most 1.
 */
export interface TogetherFactors {
  factors: Float64Array;
  shift: number;
}

/** Null where every set of two or more is excluded. */
export function togetherFactors(table: SetTable, logs: Float64Array): TogetherFactors | null {
  const sizes = setSizes(table);
  let shift = -Infinity;
  for (let p = 0; p < table.size; p += 1) {
    if (sizes[p]! > 1) shift = Math.max(shift, logs[p]! / (sizes[p]! - 1));
  }
  if (shift === -Infinity) return null;
  const factors = logs.map((log, p) => (sizes[p]! > 1 ? Math.exp(log - (sizes[p]! - 1) * shift) : 1));
  return { factors, shift };
}

/** The sums of Π p × factor over the counted sets of each size, for pairs that go together or avoid each other. */
export function pairedSums(table: SetTable, prior: Float64Array, { factors }: TogetherFactors): Float64Array {
  const { low, high, starts, lows, largest } = table;
  const lowProducts = products(low, prior);
  const highProducts = products(high, prior);
  const lowSizes = sizesOf(low);
  const highSizes = sizesOf(high);
  const sums = new Float64Array(largest + 1);
  for (let h = 0; h < highProducts.length; h += 1) {
    const end = starts[h + 1]!;
    for (let p = starts[h]!; p < end; p += 1) {
      const l = lows[p]!;
      sums[highSizes[h]! + lowSizes[l]!]! += highProducts[h]! * lowProducts[l]! * factors[p]!;
    }
  }
  return sums;
}

function products({ parents, added }: Half, prior: Float64Array): Float64Array {
  const values = new Float64Array(parents.length).fill(1);
  for (let index = 1; index < values.length; index += 1) {
    values[index] = values[parents[index]!]! * prior[added[index]!]!;
  }
  return values;
}

function sizesOf({ parents }: Half): Uint8Array {
  const sizes = new Uint8Array(parents.length);
  for (let index = 1; index < sizes.length; index += 1) sizes[index] = sizes[parents[index]!]! + 1;
  return sizes;
}

/** Number of members of each set. */
export function setSizes({ low, high, starts, lows, size }: SetTable): Uint8Array {
  const lowSizes = sizesOf(low);
  const highSizes = sizesOf(high);
  const sizes = new Uint8Array(size);
  for (let h = 0; h < highSizes.length; h += 1) {
    for (let p = starts[h]!; p < starts[h + 1]!; p += 1) sizes[p] = highSizes[h]! + lowSizes[lows[p]!]!;
  }
  return sizes;
}

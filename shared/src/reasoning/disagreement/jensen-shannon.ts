import { linearPool } from './linear-pool.js';

/**
 * Weighted Jensen-Shannon divergence in bits: Σ_j w̄_j KL(d_j ‖ Σ w̄ d). 0 where
 * all agree, at most the entropy of the weights.
 *
 * Source: Lin 1991, IEEE Trans. Inf. Theory 37:145-151.
 *
 * @param distributions at least one, all of the same length; a share may be 0
 * @param weights 0 or more, not all 0
 * @example jensenShannonBits([[1, 0], [0, 1]], [1, 1]) // 1
 */
export function jensenShannonBits(
  distributions: readonly ArrayLike<number>[],
  weights: ArrayLike<number>,
): number {
  const mixture = linearPool(distributions, weights);
  let total = 0;
  let sum = 0;
  distributions.forEach((distribution, j) => {
    total += weights[j]!;
    for (let column = 0; column < mixture.length; column += 1) {
      const share = distribution[column]!;
      // A positive share may belong to a weight too small to show in the mixture; it then counts for nothing.
      if (share > 0 && mixture[column]! > 0) sum += weights[j]! * share * Math.log2(share / mixture[column]!);
    }
  });
  return Math.max(0, sum / total);
}

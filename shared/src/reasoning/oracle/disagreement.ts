import { at, normalised, sum } from './at.js';

function entropyBits(shares: readonly number[]): number {
  return -sum(shares.map((share) => (share > 0 ? share * Math.log2(share) : 0)));
}

/** Σ_j w̄_j d_j. */
export function linearPool(
  distributions: readonly (readonly number[])[],
  weights: readonly number[],
): number[] {
  const shares = normalised(weights);
  return at(distributions, 0).map((_, index) =>
    sum(distributions.map((distribution, j) => at(shares, j) * at(distribution, index))),
  );
}

/**
 * Weighted Jensen-Shannon divergence in bits: H(Σ w̄ d) - Σ w̄ H(d).
 *
 * Source: Lin 1991, IEEE Trans. Inf. Theory 37:145-151.
 */
export function jensenShannonBits(
  distributions: readonly (readonly number[])[],
  weights: readonly number[],
): number {
  const shares = normalised(weights);
  const mean = sum(distributions.map((distribution, j) => at(shares, j) * entropyBits(distribution)));
  return Math.max(0, entropyBits(linearPool(distributions, weights)) - mean);
}

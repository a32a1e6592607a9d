import { at, normalised, sum } from './at.js';

/**
 * Logarithmic opinion pool: pool(i) ∝ exp(Σ_j w̄_j ln d_j(i)), w̄ the weights
 * divided by their sum.
 *
 * Source: Genest & Zidek 1986, Statistical Science 1(1):114-135.
 *
 * @example logPool([[0.5, 0.5], [0.9, 0.1]], [1, 1]) // [0.75, 0.25]
 */
export function logPool(distributions: readonly (readonly number[])[], weights: readonly number[]): number[] {
  const largest = Math.max(...weights);
  const shares = normalised(weights.map((weight) => weight / largest));
  const logs = at(distributions, 0).map((_, index) =>
    sum(distributions.map((distribution, j) => at(shares, j) * Math.log(at(distribution, index)))),
  );
  const top = Math.max(...logs);
  return normalised(logs.map((log) => Math.exp(log - top)));
}

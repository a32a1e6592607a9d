/**
 * Linear opinion pool Σ_j w̄_j d_j, the weights w̄ summing to 1. Unlike the log
 * pool it keeps dissent visible: what one contributor holds likely stays likely.
 *
 * Source: Genest & Zidek 1986, Statistical Science 1(1):114-135.
 *
 * @param distributions at least one, all of the same length
 * @param weights 0 or more, not all 0
 * @example linearPool([[0.5, 0.5], [0.9, 0.1]], [1, 1]) // [0.7, 0.3]
 */
export function linearPool(
  distributions: readonly ArrayLike<number>[],
  weights: ArrayLike<number>,
): number[] {
  let total = 0;
  for (let j = 0; j < distributions.length; j += 1) total += weights[j]!;
  const pool = new Array<number>(distributions[0]!.length).fill(0);
  distributions.forEach((distribution, j) => {
    const weight = weights[j]! / total;
    for (let column = 0; column < pool.length; column += 1) pool[column]! += weight * distribution[column]!;
  });
  return pool;
}

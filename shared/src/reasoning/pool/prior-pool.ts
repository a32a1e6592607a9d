import type { CheckedPanel } from '../validation/checked-panel.js';
import { countingWeights } from './counting-weights.js';

/**
 * The log pool of the priors that were given, over the K+1 columns, by weight;
 * uniform where nobody of positive weight gave one.
 *
 * pool(i) ∝ exp(Σ_j w̄_j ln d_j(i)), the weights w̄ summing to 1.
 * Source: Genest & Zidek 1986, Statistical Science 1(1):114-135.
 *
 * @param without position of a contributor to leave out, -1 for none
 * @example two priors [0.5, 0.5] and [0.9, 0.1] of equal weight pool to [0.75, 0.25]
 */
export function pooledPrior(panel: CheckedPanel, without = -1): Float64Array {
  const { columns, contributors } = panel;
  const weights = countingWeights(panel);
  const pool = new Float64Array(columns);
  let total = 0;
  for (let j = 0; j < contributors.length; j += 1) {
    const { prior } = contributors[j]!;
    if (!prior || weights[j] === 0 || j === without) continue;
    total += weights[j]!;
    for (let column = 0; column < columns; column += 1)
      pool[column]! += weights[j]! * Math.log(prior[column]!);
  }
  if (total === 0) return pool.fill(1 / columns);
  const top = pool.reduce((most, log) => Math.max(most, log), -Infinity);
  let sum = 0;
  for (let column = 0; column < columns; column += 1)
    sum += pool[column] = Math.exp((pool[column]! - top) / total);
  for (let column = 0; column < columns; column += 1) pool[column]! /= sum;
  return pool;
}

/** Whether anybody of positive weight gave a prior. */
export function priorGiven(panel: CheckedPanel): boolean {
  return panel.contributors.some(({ weight, prior }) => weight > 0 && prior !== null);
}

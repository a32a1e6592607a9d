import type { CheckedPanel } from '../validation/checked-panel.js';

/** A positive weight is never less than this share of the largest, so that weight × exposure cannot underflow to 0. */
const least = 1e-300;

/** The contributors' weights with the largest at 1. Only their ratios matter, and weight 0 stays 0. */
export function countingWeights({ contributors }: CheckedPanel): Float64Array {
  const weights = Float64Array.from(contributors, ({ weight }) => weight);
  const largest = weights.reduce((most, weight) => Math.max(most, weight), 0);
  return weights.map((weight) => (weight > 0 ? Math.max(weight / largest, least) : 0));
}

import type { Faults } from './faults.js';
import { limits } from './limits.js';

/**
 * Checks one distribution and writes it, renormalised, into `target` from `offset`.
 *
 * Refuses: another length than `length`, a share outside `smallestShare` to
 * `largest`, a sum further from 1 than 0.0005. Every share at fault is named.
 *
 * @returns whether it was taken
 */
export function readDistribution(
  value: unknown,
  length: number,
  largest: number,
  target: Float64Array | number[],
  offset: number,
  path: () => string,
  faults: Faults,
): boolean {
  if (!Array.isArray(value)) {
    faults.add(path(), `must be a list of ${length} shares`);
    return false;
  }
  const shares = value as readonly unknown[];
  if (shares.length !== length) faults.add(path(), `must have ${length} entries, has ${shares.length}`);
  let sound = shares.length === length;
  let numeric = true;
  let sum = 0;
  for (let index = 0; index < shares.length; index += 1) {
    const share = shares[index];
    if (typeof share === 'number' && share >= limits.smallestShare && share <= largest) {
      sum += share;
      if (index < length) target[offset + index] = share;
    } else {
      sound = false;
      if (typeof share === 'number' && Number.isFinite(share)) sum += share;
      else numeric = false;
      faults.add(`${path()}[${index}]`, `must be a share from ${limits.smallestShare} to ${largest}`);
    }
  }
  if (shares.length === length && numeric && !(Math.abs(sum - 1) <= limits.sum)) {
    faults.add(path(), `must sum to 1, sums to ${Number(sum.toPrecision(6))}`);
    return false;
  }
  if (!sound) return false;
  for (let index = 0; index < length; index += 1) target[offset + index] = target[offset + index]! / sum;
  return true;
}

import type { CandidateSet } from '../assessment.js';
import { descending } from '../descending.js';

export const mostSetsListed = 8;

/** Shares that differ by less than this part of themselves count as equal. */
export const equalShare = 1e-9;

/**
 * The most probable sets, at most 8, by falling share; equal ones with fewer
 * members first, then in panel order. Sets without any share are left away.
 */
export function byFallingShare(sets: readonly CandidateSet[]): CandidateSet[] {
  const inPanelOrder = sets
    .filter(({ p }) => p > 0)
    .sort((one, other) => compare(one.members, other.members));
  return descending(inPanelOrder, ({ p }) => Math.log(p), equalShare).slice(0, mostSetsListed);
}

function compare(one: readonly number[], other: readonly number[]): number {
  if (one.length !== other.length) return one.length - other.length;
  const difference = one.findIndex((member, index) => member !== other[index]);
  return difference < 0 ? 0 : one[difference]! - other[difference]!;
}

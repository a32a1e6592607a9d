import type { StandingRange } from './assessment.js';

/** Lowest and highest share of each column over several standings of the same panel. */
export function standingRange(standings: readonly ArrayLike<number>[]): StandingRange[] {
  return Array.from(standings[0]!, (_, column) => {
    let low = Infinity;
    let high = -Infinity;
    for (const standing of standings) {
      low = Math.min(low, standing[column]!);
      high = Math.max(high, standing[column]!);
    }
    return { low, high };
  });
}

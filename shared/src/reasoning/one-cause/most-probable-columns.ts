import type { CandidateSet } from '../assessment.js';
import { byFallingShare } from '../sets/by-falling-share.js';

/** The columns as sets of one candidate, none of these as the empty one; at most 8. */
export function mostProbableColumns(standing: Float64Array): CandidateSet[] {
  const candidates = standing.length - 1;
  const sets: CandidateSet[] = [{ members: [], p: standing[candidates]! }];
  for (let candidate = 0; candidate < candidates; candidate += 1) {
    sets.push({ members: [candidate], p: standing[candidate]! });
  }
  return byFallingShare(sets);
}

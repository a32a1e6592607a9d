import type { CandidateSet, Explanation } from '../assessment.js';
import { descending } from '../descending.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import { at, sum, upTo } from './at.js';
import { type Posterior, standingOf } from './posterior.js';

/** The most probable sets, at most 8; equal ones with fewer members first, then in panel order. */
export function mostProbableSets({ sets, shares }: Posterior): CandidateSet[] {
  const listed = sets.map((members, index) => ({ members, p: at(shares, index) })).filter(({ p }) => p > 0);
  return descending(listed, ({ p }) => Math.log(p), 1e-9).slice(0, 8);
}

/** The five largest drops P(i) - P(i | k) over ordered pairs, when sets of two or more are counted. */
export function explanations(panel: CheckedPanel, now: Posterior): Explanation[] {
  const { sets, shares } = now;
  if (!sets.some((set) => set.length > 1)) return [];
  const standing = standingOf(now, panel.candidates);
  const both = (one: number, other: number) =>
    sum(shares.filter((_, index) => at(sets, index).includes(one) && at(sets, index).includes(other)));
  const drops = upTo(panel.candidates)
    .flatMap((given) =>
      upTo(panel.candidates)
        .filter((then) => then !== given && at(standing, given) > 0)
        .map((then) => ({
          if: given,
          then,
          from: at(standing, then),
          to: both(given, then) / at(standing, given),
        })),
    )
    .filter(({ from, to }) => from - to > 1e-12);
  return descending(drops, ({ from, to }) => from - to).slice(0, 5);
}

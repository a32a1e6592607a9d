/** Closed cases below which nothing is suggested: a few cases say more about luck than about a person. */
const fewestCases = 10;
/** Cases that equal weight counts for: the suggestion starts there and moves with what is known. */
const priorCases = 10;
const smallest = 0.33;
const largest = 3;

/** The Brier scores of one closed case. */
export interface ScoredCase {
  own: number;
  panel: number;
}

/**
 * A weight to suggest to the chair for a contributor, from the cases closed
 * with both them and the panel scored: (n s + 10) / (n + 10) within 0.33 and 3,
 * s being the panel's mean Brier score divided by their own. Common practice
 * (shrinking a score towards equal weight), not a published constant. It is a
 * suggestion, and never a ranking of people.
 *
 * @returns null below ten cases
 * @throws RangeError for a score outside 0 to 2
 * @example ten cases scored as well as the panel's suggest 1
 */
export function suggestedWeight(cases: readonly ScoredCase[]): number | null {
  for (const { own, panel } of cases) {
    if (!(own >= 0 && own <= 2 && panel >= 0 && panel <= 2)) throw new RangeError('not a Brier score');
  }
  const count = cases.length;
  if (count < fewestCases) return null;
  const own = cases.reduce((sum, scored) => sum + scored.own, 0);
  const panel = cases.reduce((sum, scored) => sum + scored.panel, 0);
  // Both without any error are equals; an own score of 0 beside another is as good as can be.
  const skill = own === panel ? 1 : panel / own;
  return Math.min(largest, Math.max(smallest, (count * skill + priorCases) / (count + priorCases)));
}

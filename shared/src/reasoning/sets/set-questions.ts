import type { Reasoning } from '../reasoning.js';
import { Asked, type Bounded, type Posterior } from './asked.js';
import { expectation } from './expectation.js';
import { type Support, allSets, significantSets } from './significant.js';
import { swapping } from './swapped.js';
import { withoutFinding } from './without-finding.js';

/** The part of an answer that sets left aside may account for, well below the 1e-12 that is promised. */
const harmless = 1e-13;

/** How much of the posterior may be left aside at first, and when that was too much for an answer. */
const budgets = [1e-16, 1e-20];

/**
 * Questions about a posterior that is known: each divides a row out of it or
 * multiplies one in, over the significant sets. Where the sets left aside could
 * account for more than a harmless part of the answer, it is asked again of
 * more, in the end of all.
 */
export function questions(
  posterior: Posterior,
): Pick<Reasoning, 'withoutFinding' | 'swapped' | 'expectation'> {
  const { table, shares } = posterior;
  const asked = new Asked(posterior);
  const supports: Support[] = [];
  const ask = <Value>(question: (support: Support) => Bounded<Value>): Value => {
    for (const [index, budget] of budgets.entries()) {
      const support = (supports[index] ??= significantSets(table, shares, budget));
      const { value, missed } = question(support);
      if (missed <= harmless) return value;
    }
    return question((supports[budgets.length] ??= allSets(table, shares))).value;
  };
  return {
    withoutFinding: (finding) => ask((support) => withoutFinding(asked, support, finding)),
    swapped(finding, views, column) {
      const swap = swapping(asked, finding, column);
      return views.map((other) => ask((support) => swap(support, other)));
    },
    expectation: (finding) => ask((support) => expectation(asked, support, finding)),
  };
}

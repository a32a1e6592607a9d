import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { type Against, decibansOf, factorOf, oddsOf } from './comparison';
import { addedUp, type WhySum } from './why-sum';

/** The standing when these findings count and no others; none at the start. */
export type StandingWith = (counted: readonly string[]) => readonly number[];

/**
 * The odds finding by finding: each push is what the odds change by when this finding is counted after those before
 * it. Adds up by construction, and holds where single columns do not add up: against everything else, and where
 * candidates may coexist.
 */
export function stepSum(
  order: readonly string[],
  standingWith: StandingWith,
  { column, against, oneCause }: { column: number; against: Against; oneCause: boolean },
): WhySum {
  const at = (standing: readonly number[]) => decibansOf(oddsOf(standing, column, against, oneCause));
  const start = at(standingWith([]));
  let before = start;
  const steps = order.map((findingId, index) => {
    const standing = standingWith(order.slice(0, index + 1));
    const now = at(standing);
    const decibans = now - before;
    before = now;
    return { findingId, decibans, share: standing[column] ?? 0 };
  });
  return addedUp(start, steps, true);
}

/**
 * The findings that count, by how much the odds of this column would change without each: what matters most comes
 * first. The same measure under both assumptions; it does not depend on the order that it makes.
 */
export function orderBySize(
  { standing, without }: Pick<AssessmentView, 'standing' | 'without'>,
  column: number,
  against: Against,
  oneCause: boolean,
): string[] {
  const at = (shares: readonly number[]) => decibansOf(oddsOf(shares, column, against, oneCause));
  const now = at(standing);
  return Object.entries(without.findings)
    .map(([findingId, shares]) => ({ findingId, size: Math.abs(now - at(shares)) }))
    .toSorted((one, other) => other.size - one.size)
    .map(({ findingId }) => findingId);
}

/** Under one cause the standing of some findings follows from the assessment: prior times what each row adds. */
export function oneCauseStandings({ pooledPrior, rows }: Pick<AssessmentView, 'pooledPrior' | 'rows'>) {
  return (counted: readonly string[]): number[] => {
    const decibans = pooledPrior.map((_, column) =>
      counted.reduce((sum, id) => sum + (rows[id]?.weightOfEvidence[column] ?? 0), 0),
    );
    const most = Math.max(...decibans);
    const parts = pooledPrior.map((share, column) => share * factorOf((decibans[column] ?? 0) - most));
    const total = parts.reduce((sum, part) => sum + part, 0);
    return parts.map((part) => part / total);
  };
}

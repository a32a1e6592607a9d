import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { type Against, decibansOf, factorOf, oddsOf } from './comparison';
import { addedUp, type Push, type WhySum } from './why-sum';

/** The standing when these findings count and no others; none at the start. */
export type StandingWith = (counted: readonly string[]) => readonly number[];

export interface Comparison {
  column: number;
  against: Against;
  oneCause: boolean;
}

/**
 * The odds finding by finding: each push is what the odds change by when this finding is counted after those before
 * it. Adds up by construction, and holds where single columns do not add up: against everything else, and where
 * candidates may coexist. What matters most comes first: the order is by how much the odds would change if this
 * finding alone were not counted.
 *
 * Yields how many standings have been asked for, so that whoever runs it can pause; there are 2 n + 2 in all.
 * @param findings those that count, each once
 */
export function* stepByStep(
  findings: readonly string[],
  standingWith: StandingWith,
  { column, against, oneCause }: Comparison,
): Generator<number, WhySum> {
  let asked = 0;
  const odds = (shares: readonly number[]) => decibansOf(oddsOf(shares, column, against, oneCause));
  const now = odds(standingWith(findings));
  yield ++asked;
  const sizes: { findingId: string; size: number }[] = [];
  for (const findingId of findings) {
    const without = standingWith(findings.filter((other) => other !== findingId));
    sizes.push({ findingId, size: Math.abs(now - odds(without)) });
    yield ++asked;
  }
  const order = sizes.toSorted((one, other) => other.size - one.size).map(({ findingId }) => findingId);
  const start = odds(standingWith([]));
  yield ++asked;
  const steps: Omit<Push, 'soFar'>[] = [];
  let before = start;
  for (const [index, findingId] of order.entries()) {
    const standing = standingWith(order.slice(0, index + 1));
    const after = odds(standing);
    steps.push({ findingId, decibans: after - before, share: standing[column] ?? 0 });
    before = after;
    yield ++asked;
  }
  return addedUp(start, steps, true);
}

/** The same without pausing. */
export function stepSum(
  findings: readonly string[],
  standingWith: StandingWith,
  comparison: Comparison,
): WhySum {
  const steps = stepByStep(findings, standingWith, comparison);
  for (;;) {
    const next = steps.next();
    if (next.done === true) return next.value;
  }
}

/** The findings that are observed and judged: those whose row carries a weight of evidence. */
export const countingFindings = ({ rows }: Pick<AssessmentView, 'rows'>): string[] =>
  Object.entries(rows).flatMap(([id, row]) => (row.weightOfEvidence.length > 0 ? [id] : []));

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

import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { decibansOf } from './comparison';
import { addedUp, type WhySum } from './why-sum';

type Parts = Pick<AssessmentView, 'pooledPrior' | 'rows'>;

/**
 * One column against another under one cause: log prior odds, and for each observed and judged finding the difference
 * of the two weights of evidence. Exact in any order, because both columns are divided by the same sum.
 * @example a prior of 1 to 4 (-6.0 decibans) and one finding four times as often (+6.0) end at even odds (0)
 */
export function columnSum({ pooledPrior, rows }: Parts, column: number, against: number): WhySum {
  const start = decibansOf((pooledPrior[column] ?? 0) / (pooledPrior[against] ?? 0));
  const steps = Object.entries(rows).flatMap(([findingId, { weightOfEvidence: weights }]) => {
    const [here, there] = [weights[column], weights[against]];
    return here === undefined || there === undefined
      ? []
      : [{ findingId, decibans: here - there, share: null }];
  });
  return addedUp(
    start,
    steps.toSorted((one, other) => Math.abs(other.decibans) - Math.abs(one.decibans)),
    false,
  );
}

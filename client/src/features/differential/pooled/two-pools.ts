import type { AssessmentView } from '@weighhouse/shared/contracts/assessment';
import { naturalFrequency } from '@weighhouse/shared/reasoning/natural-frequency';
import { type Column, columnLabel } from '../model/columns';

type Pools = Pick<AssessmentView, 'standing' | 'linearPool'>;

/** Below this difference of shares the two read alike; three of a hundred is our own measure, no published one exists. */
const worthSaying = 0.03;

/** When a pool of odds and an average part, and whether they do here, on which column most. */
export function partingWords({ standing, linearPool }: Pools, columns: readonly Column[]): string {
  const when =
    'The pool averages on the scale of odds, so it goes with what nobody finds unlikely; the average of where each stands alone keeps one person’s view visible. They part where people are far apart.';
  const [most] = columns
    .map((column) => ({
      column,
      pool: standing[column.index] ?? 0,
      average: linearPool[column.index] ?? 0,
    }))
    .toSorted((one, other) => Math.abs(other.pool - other.average) - Math.abs(one.pool - one.average));
  if (!most) return when;
  const [pool, average] = [naturalFrequency(most.pool), naturalFrequency(most.average)];
  const figures = `${String(pool.outOf100)} in the pool, ${average.words} on average`;
  const apart = Math.abs(most.pool - most.average);
  if (pool.outOf100 === average.outOf100) return `${when} Here they do not part by a whole number anywhere.`;
  return apart < worthSaying
    ? `${when} Here they hardly part, most on ${columnLabel(most.column)}: ${figures}.`
    : `${when} Here they part, most on ${columnLabel(most.column)}: ${figures}.`;
}

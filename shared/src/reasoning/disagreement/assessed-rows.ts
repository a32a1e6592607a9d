import type { AssessedRow } from '../assessment.js';
import { keyed } from '../keyed.js';
import { leaderOf } from '../leader.js';
import type { Reasoning } from '../reasoning.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { furthestApart } from './furthest-apart.js';

const decibansPerNat = 10 / Math.LN10;

/**
 * For each finding what it says about each column, pooled and by contributor,
 * where contributors are furthest apart, and how much the leader's standing
 * depends on whose cells are taken.
 */
export function assessedRows(
  panel: CheckedPanel,
  pooled: View,
  own: readonly View[],
  exponents: Float64Array,
  reasoning: Reasoning,
): Record<string, AssessedRow> {
  const leader = leaderOf(reasoning.standing);
  return keyed(
    panel.findings.map(({ id, observed }, r): [string, AssessedRow] => {
      const counts = observed !== null && pooled.judged[r]!;
      return [
        id,
        {
          weightOfEvidence: counts ? decibans(panel, pooled, r, exponents[r]!) : [],
          by: keyed(
            panel.contributors.map(({ id: contributor }, j): [string, (number | null)[]] => [
              contributor,
              counts ? decibansBy(panel, own[j]!, r, exponents[r]!, j) : [],
            ]),
          ),
          apart: furthestApart(panel, r),
          swing: counts ? swing(panel, own, r, leader, reasoning) : 0,
        },
      ];
    }),
  );
}

/** Weight of evidence (Good 1950), in decibans against the mean of the row. */
function decibans(
  { columns }: CheckedPanel,
  { evidence }: View,
  finding: number,
  exponent: number,
): number[] {
  const list = new Array<number>(columns);
  for (let column = 0; column < columns; column += 1) {
    list[column] = decibansPerNat * exponent * evidence[finding * columns + column]!;
  }
  return list;
}

/** The same with one contributor's cells; null where they left the column blank. */
function decibansBy(
  panel: CheckedPanel,
  own: View,
  finding: number,
  exponent: number,
  j: number,
): (number | null)[] {
  const { start, levels } = panel.findings[finding]!;
  const { cells } = panel.contributors[j]!;
  const list: (number | null)[] = decibans(panel, own, finding, exponent);
  for (let column = 0; column < panel.columns; column += 1) {
    if (cells[start + column * levels] === 0) list[column] = null;
  }
  return list;
}

/** The largest change of the leader's standing when the row takes one contributor's cells. */
function swing(
  { contributors }: CheckedPanel,
  own: readonly View[],
  finding: number,
  leader: number,
  reasoning: Reasoning,
): number {
  const judging = own.filter(
    (_, j) => contributors[j]!.weight > 0 && contributors[j]!.exposures[finding]! > 0,
  );
  const before = reasoning.standing[leader]!;
  return reasoning
    .swapped(finding, judging, leader)
    .reduce((most, share) => Math.max(most, Math.abs(share - before)), 0);
}

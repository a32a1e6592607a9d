import type { AssessedRow, FurthestApart } from '../assessment.js';
import { keyed } from '../keyed.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import { at, sum, upTo } from './at.js';
import { reportedGivenSet } from './level-given-set.js';
import { leaderOf, posterior, standingOf } from './posterior.js';
import { type Row, type View, cellOf, rowOf } from './view.js';

/**
 * Decibans for each column: 10 log10 of P'(observed | column)^γ, minus the mean
 * over the columns. Source: Good 1950, Probability and the Weighing of Evidence.
 */
function weightOfEvidence(row: Row, observed: number, reliability: number, exponent: number): number[] {
  const columns = row.length;
  const decibans = upTo(columns).map((column) => {
    const set = column === columns - 1 ? [] : [column];
    return 10 * exponent * Math.log10(at(reportedGivenSet(row, set, reliability), observed));
  });
  const mean = sum(decibans) / columns;
  return decibans.map((deciban) => deciban - mean);
}

/** The widest gap between two contributors of positive weight, or null where fewer than two judged a column. */
function furthestApart(panel: CheckedPanel, finding: number): FurthestApart | null {
  const { levels, observed } = at(panel.findings, finding);
  const compared = levels === 2 ? [1] : observed !== null ? [observed] : upTo(levels);
  let widest: FurthestApart | null = null;
  let gap = -1;
  for (const column of upTo(panel.columns)) {
    for (const level of compared) {
      const judged = panel.contributors.flatMap((contributor) => {
        const cell = contributor.weight > 0 ? cellOf(contributor, at(panel.findings, finding), column) : null;
        return cell ? [{ contributor: contributor.id, p: at(cell, level) }] : [];
      });
      if (judged.length < 2) continue;
      const low = judged.reduce((least, one) => (one.p < least.p ? one : least));
      const high = judged.filter((one) => one !== low).reduce((most, one) => (one.p > most.p ? one : most));
      if (high.p - low.p > gap + 1e-12) {
        gap = high.p - low.p;
        widest = { column, low, high };
      }
    }
  }
  return widest;
}

/** Largest change of the leader's share when the row takes one contributor's cells instead of the pooled ones. */
function swing(
  panel: CheckedPanel,
  view: View,
  exponents: readonly number[],
  standing: readonly number[],
  finding: number,
): number {
  const leader = leaderOf(standing);
  const pooled = at(view.rows, finding);
  if (!pooled) return 0;
  const changes = panel.contributors
    .filter(({ weight, exposures }) => weight > 0 && exposures[finding] !== 0)
    .map((contributor) => {
      const rows = view.rows.map((row, index) =>
        index === finding ? rowOf(contributor, at(panel.findings, finding), pooled) : row,
      );
      const swapped = standingOf(posterior(panel, { ...view, rows }, exponents), panel.candidates);
      return Math.abs(at(swapped, leader) - at(standing, leader));
    });
  return Math.max(0, ...changes);
}

export function assessRows(
  panel: CheckedPanel,
  view: View,
  exponents: readonly number[],
  standing: readonly number[],
): Record<string, AssessedRow> {
  return keyed(
    panel.findings.map((described, finding): [string, AssessedRow] => {
      const { id, observed, reliability } = described;
      const row = at(view.rows, finding);
      const apart = furthestApart(panel, finding);
      const exponent = at(exponents, finding);
      const counts = row !== null && observed !== null;
      const by = panel.contributors.map((contributor): [string, (number | null)[]] => {
        if (!counts) return [contributor.id, []];
        const decibans = weightOfEvidence(
          rowOf(contributor, described, row),
          observed,
          reliability,
          exponent,
        );
        const cells = decibans.map((deciban, column) =>
          cellOf(contributor, described, column) ? deciban : null,
        );
        return [contributor.id, cells];
      });
      return [
        id,
        {
          weightOfEvidence: counts ? weightOfEvidence(row, observed, reliability, exponent) : [],
          by: keyed(by),
          apart,
          swing: counts ? swing(panel, view, exponents, standing, finding) : 0,
        },
      ];
    }),
  );
}

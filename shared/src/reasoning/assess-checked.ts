import type { Assessment, StandingOnly, UnjudgedCell } from './assessment.js';
import { assessedRows } from './disagreement/assessed-rows.js';
import { jensenShannonBits } from './disagreement/jensen-shannon.js';
import { linearPool } from './disagreement/linear-pool.js';
import { type Exponents, exponents } from './evidence/exponents.js';
import { keyed } from './keyed.js';
import { listed } from './listed.js';
import { nextTests } from './next-test/next-tests.js';
import { reasonOverColumns } from './one-cause/reason-over-columns.js';
import { type PooledRows, poolRows } from './pool/pooled-rows.js';
import { pooledPrior, priorGiven } from './pool/prior-pool.js';
import { standingRange } from './range.js';
import type { Reasoning } from './reasoning.js';
import { reasonOverSets } from './sets/reason-over-sets.js';
import { setAssumption } from './sets/set-prior.js';
import type { CheckedPanel } from './validation/checked-panel.js';
import { type View, ownView, viewOf } from './view.js';

const method = 'weighhouse/1';

interface Reasoned {
  rows: PooledRows;
  view: View;
  exponents: Exponents;
  reasoning: Reasoning;
}

function reason(panel: CheckedPanel): Reasoned {
  const rows = poolRows(panel);
  const view = viewOf(panel, pooledPrior(panel), rows);
  const raised = exponents(panel, rows.judged, panel.tempering);
  const assumption = setAssumption(panel);
  const reasoning = assumption
    ? reasonOverSets(panel, assumption, view, raised)
    : reasonOverColumns(panel, view, raised);
  return { rows, view, exponents: raised, reasoning };
}

/** The standing of a checked panel alone. */
export function standingOfChecked(panel: CheckedPanel): StandingOnly {
  return { method, standing: listed(reason(panel).reasoning.standing) };
}

/** The whole assessment of a checked panel. */
export function assessChecked(panel: CheckedPanel): Assessment {
  const { rows, view, exponents: raised, reasoning } = reason(panel);
  const { contributors } = panel;
  const standing = listed(reasoning.standing);
  const ownViews = contributors.map((_, j) => ownView(panel, j, view));
  const own = ownViews.map((one) => listed(reasoning.standingOf(one, raised)));
  const weights = contributors.map(({ weight }) => weight);
  const without = withoutEach(panel, rows, view, reasoning);
  return {
    method,
    exact: reasoning.exact,
    leftOut: reasoning.leftOut,
    priorGiven: priorGiven(panel),
    pooledPrior: listed(view.prior),
    pooledCells: pooledCells(panel, rows),
    unjudged: unjudged(panel, rows),
    standing,
    sets: reasoning.sets(),
    explains: reasoning.explains(),
    own: keyed(contributors.map(({ id }, j) => [id, own[j]!] as const)),
    linearPool: own.length > 0 ? linearPool(own, weights) : [...standing],
    disagreementBits: disagreement(panel, view, raised, ownViews),
    rows: assessedRows(panel, view, ownViews, raised.rows, reasoning),
    nextTests: nextTests(panel, view.judged, reasoning),
    without,
    range: standingRange([
      standing,
      ...Object.values(without.contributors).filter((one) => one !== null),
      ...Object.values(without.findings),
      reasoning.tempered(0.6),
      reasoning.tempered(1 / panel.tempering),
    ]),
  };
}

function withoutEach(
  panel: CheckedPanel,
  rows: PooledRows,
  view: View,
  reasoning: Reasoning,
): Assessment['without'] {
  const counting = panel.contributors.filter(({ weight }) => weight > 0).length;
  const contributors = rows.withoutEach((j, others): [string, number[] | null] => {
    const { id, weight } = panel.contributors[j]!;
    if (weight === 0) return [id, listed(reasoning.standing)];
    if (counting === 1) return [id, null];
    const view = viewOf(panel, pooledPrior(panel, j), others);
    return [id, listed(reasoning.standingOf(view, exponents(panel, view.judged, panel.tempering)))];
  });
  return {
    contributors: keyed(contributors),
    findings: keyed(
      panel.findings.flatMap(({ id, observed }, r): [string, number[]][] =>
        observed !== null && view.judged[r] ? [[id, listed(reasoning.withoutFinding(r))]] : [],
      ),
    ),
  };
}

/** How far the own standings are apart under one cause, whatever the panel assumes. */
function disagreement(panel: CheckedPanel, view: View, raised: Exponents, ownViews: readonly View[]): number {
  if (ownViews.length === 0) return 0;
  const oneCause = reasonOverColumns(panel, view, raised);
  return jensenShannonBits(
    ownViews.map((own) => oneCause.standingOf(own, raised)),
    panel.contributors.map(({ weight }) => weight),
  );
}

function pooledCells(
  { columns, findings }: CheckedPanel,
  { cells, judged }: PooledRows,
): Record<string, number[][]> {
  return keyed(
    findings.flatMap(({ id, start, levels }, r): [string, number[][]][] => {
      if (!judged[r]) return [];
      const row: number[][] = [];
      for (let column = 0; column < columns; column += 1) {
        row.push(listed(cells, start + column * levels, start + (column + 1) * levels));
      }
      return [[id, row]];
    }),
  );
}

function unjudged({ columns, findings }: CheckedPanel, { weights }: PooledRows): UnjudgedCell[] {
  const cells: UnjudgedCell[] = [];
  for (const { id, start, levels } of findings) {
    for (let column = 0; column < columns; column += 1) {
      if (weights[start + column * levels] === 0) cells.push({ finding: id, column });
    }
  }
  return cells;
}

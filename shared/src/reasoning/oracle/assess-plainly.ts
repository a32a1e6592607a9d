import type { Assessment, StandingRange, UnjudgedCell } from '../assessment.js';
import { keyed } from '../keyed.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import { at, upTo } from './at.js';
import { jensenShannonBits, linearPool } from './disagreement.js';
import { exponents } from './exponents.js';
import { nextTests } from './next-tests.js';
import { type Posterior, posterior, standingOf } from './posterior.js';
import { assessRows } from './rows.js';
import { explanations, mostProbableSets } from './sets-and-explains.js';
import { type View, judgedCells, ownView, pooledView } from './view.js';

/** The pooled view, its exponents and its posterior. */
export function judgePlainly(
  panel: CheckedPanel,
  tempering = panel.tempering,
): { view: View; exponents: number[]; now: Posterior; standing: number[] } {
  const view = pooledView(panel);
  const raised = exponents(
    panel,
    view.rows.map((row) => row !== null),
    tempering,
  );
  const now = posterior(panel, view, raised);
  return { view, exponents: raised, now, standing: standingOf(now, panel.candidates) };
}

/**
 * The whole assessment, straight from the definitions: every set is listed,
 * every question is answered by a new computation. Readable rather than fast.
 */
export function assessPlainly(panel: CheckedPanel): Assessment {
  const { view, exponents: raised, now, standing } = judgePlainly(panel);
  const views = panel.contributors.map((contributor) => ownView(panel, contributor, view));
  const own = views.map((one) => standingOf(posterior(panel, one, raised), panel.candidates));
  const ownAlone = views.map((one) => standingOf(posterior(panel, one, raised, 0), panel.candidates));
  const weights = panel.contributors.map(({ weight }) => weight);
  const without = leftOut(panel, view);
  return {
    method: 'weighhouse/1',
    exact: now.exact,
    leftOut: now.leftOut,
    priorGiven: panel.contributors.some(({ weight, prior }) => weight > 0 && prior !== null),
    pooledPrior: [...view.prior],
    pooledCells: keyed(
      view.rows.flatMap((row, index): [string, number[][]][] =>
        row ? [[at(panel.findings, index).id, row.map((cell) => [...cell])]] : [],
      ),
    ),
    unjudged: unjudged(panel),
    standing,
    sets: mostProbableSets(now),
    explains: explanations(panel, now),
    own: keyed(panel.contributors.map(({ id }, index) => [id, at(own, index)] as const)),
    linearPool: own.length > 0 ? linearPool(own, weights) : standing,
    disagreementBits: own.length > 0 ? jensenShannonBits(ownAlone, weights) : 0,
    rows: assessRows(panel, view, raised, standing),
    nextTests: nextTests(panel, view, raised, now),
    without,
    range: range(panel, standing, without),
  };
}

function unjudged(panel: CheckedPanel): UnjudgedCell[] {
  return panel.findings.flatMap(({ id }, finding) =>
    judgedCells(panel, finding).flatMap((cell, column) => (cell ? [] : [{ finding: id, column }])),
  );
}

/** The standing without each contributor, and without each observed and judged finding. */
function leftOut(panel: CheckedPanel, view: View): Assessment['without'] {
  return {
    contributors: keyed(
      panel.contributors.map(({ id }) => {
        const contributors = panel.contributors.filter((other) => other.id !== id);
        const someone = contributors.some(({ weight }) => weight > 0);
        return [id, someone ? judgePlainly({ ...panel, contributors }).standing : null] as const;
      }),
    ),
    findings: keyed(
      panel.findings
        .filter(({ observed }, finding) => observed !== null && at(view.rows, finding) !== null)
        .map(({ id }) => {
          const findings = panel.findings.map((other) =>
            other.id === id ? { ...other, observed: null } : other,
          );
          return [id, judgePlainly({ ...panel, findings }).standing] as const;
        }),
    ),
  };
}

/** Lowest and highest share of each column: as is, with one opinion or finding left out, more and less tempered. */
function range(
  panel: CheckedPanel,
  standing: readonly number[],
  without: Assessment['without'],
): StandingRange[] {
  const standings = [
    standing,
    ...Object.values(without.contributors).filter((one) => one !== null),
    ...Object.values(without.findings),
    judgePlainly(panel, panel.tempering * 0.6).standing,
    judgePlainly(panel, 1).standing,
  ];
  return upTo(panel.columns).map((column) => ({
    low: Math.min(...standings.map((one) => at(one, column))),
    high: Math.max(...standings.map((one) => at(one, column))),
  }));
}

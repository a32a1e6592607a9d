import { type Exponents } from '../evidence/exponents.js';
import type { Reasoning } from '../reasoning.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { explains } from './explains.js';
import { marginals } from './marginals.js';
import { mostProbableSets } from './most-probable-sets.js';
import { RowProduct } from './row-product.js';
import { rowClasses } from './row-classes.js';
import { addRowLogs, normaliseLogs, priorLogs } from './set-posterior.js';
import { type SetAssumption, setPrior, shareLeftOut } from './set-prior.js';
import { questions } from './set-questions.js';

/**
 * Reasoning under *may coexist*: the patient has a set of candidates, and a
 * posterior is a share for each counted set.
 */
export function reasonOverSets(
  panel: CheckedPanel,
  assumption: SetAssumption,
  view: View,
  exponents: Exponents,
): Reasoning {
  const { table } = assumption;
  const prior = setPrior(assumption, view.prior);
  const product = new RowProduct(table);
  /** For each set Σ γ ln P'(observed | set). */
  const evidence = new Float64Array(table.size);
  addEvidence(panel, view, exponents, evidence, product);

  /** Writes the posterior were every exponent `factor` times what it is. */
  const posterior = (factor: number, logs: Float64Array) => {
    priorLogs(assumption, prior, logs);
    for (let p = 0; p < logs.length; p += 1) logs[p]! += factor * evidence[p]!;
    return normaliseLogs(logs);
  };
  const standingIn = (shares: Float64Array) => marginals(table, table, shares, shares[0]!);
  const shares = posterior(1, new Float64Array(table.size));
  const standing = standingIn(shares);

  // Not needed for the standing alone, so made when first asked for.
  let scratch: Float64Array | null = null;
  const space = () => (scratch ??= new Float64Array(table.size));
  let asked: ReturnType<typeof questions> | null = null;
  const ask = () => (asked ??= questions({ panel, table, view, exponents, shares, product }));

  return {
    exact: table.largest === table.candidates,
    leftOut: shareLeftOut(assumption, view.prior, prior.logTau),
    standing,
    sets: () => mostProbableSets(table, shares),
    explains: () => explains(table, shares, standing),
    tempered: (factor) => standingIn(posterior(factor, space())),
    standingOf(other, otherExponents) {
      const logs = priorLogs(assumption, setPrior(assumption, other.prior), space());
      addEvidence(panel, other, otherExponents, logs, product);
      return standingIn(normaliseLogs(logs));
    },
    withoutFinding: (finding) => ask().withoutFinding(finding),
    swapped: (finding, views, column) => ask().swapped(finding, views, column),
    expectation: (finding) => ask().expectation(finding),
  };
}

/** Adds γ ln P'(observed | set) of every row that counts, rows of equal exponent together. */
function addEvidence(
  panel: CheckedPanel,
  view: View,
  exponents: Exponents,
  logs: Float64Array,
  product: RowProduct,
): void {
  for (const { exponent, rows } of rowClasses(panel, view, exponents.rows)) {
    addRowLogs(panel, view, rows, exponent, logs, product);
  }
}

import { type Exponents } from '../evidence/exponents.js';
import type { Reasoning } from '../reasoning.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { explains } from './explains.js';
import { marginals } from './marginals.js';
import { mostProbableSets } from './most-probable-sets.js';
import { RowProduct } from './row-product.js';
import { classesByExponent, classesByGroup } from './row-classes.js';
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
  const before = priorLogs(assumption, prior, new Float64Array(table.size));
  /** Working space, reused by every computation over all sets. */
  const product = new RowProduct(table);
  const scratch = new Float64Array(table.size);
  /** For each group Σ ln P' over its rows, without the exponent; the rows without a group are at -1. */
  const groupLogs = new Map<number, Float64Array>();
  const evidence = new Float64Array(table.size);
  for (const [group, { exponent, rows }] of classesByGroup(panel, view, exponents.rows)) {
    const logs = new Float64Array(table.size);
    addRowLogs(panel, view, rows, 1, logs, product);
    for (let p = 0; p < logs.length; p += 1) evidence[p]! += exponent * logs[p]!;
    if (group >= 0) groupLogs.set(group, logs);
  }
  const posterior = (factor: number, logs: Float64Array) => {
    for (let p = 0; p < logs.length; p += 1) logs[p] = before[p]! + factor * evidence[p]!;
    return normaliseLogs(logs);
  };
  const standingIn = (shares: Float64Array) => marginals(table, table, shares, shares[0]!);
  const shares = posterior(1, new Float64Array(table.size));
  const standing = standingIn(shares);

  return {
    exact: table.largest === table.candidates,
    leftOut: shareLeftOut(assumption, view.prior, prior.logTau),
    standing,
    sets: () => mostProbableSets(table, shares),
    explains: () => explains(table, shares, standing),
    tempered: (factor) => standingIn(posterior(factor, scratch)),
    standingOf(other, otherExponents) {
      const logs = priorLogs(assumption, setPrior(assumption, other.prior), scratch);
      for (const { exponent, rows } of classesByExponent(panel, other, otherExponents.rows)) {
        addRowLogs(panel, other, rows, exponent, logs, product);
      }
      return standingIn(normaliseLogs(logs));
    },
    ...questions({ panel, table, view, exponents, shares, groupLogs }),
  };
}

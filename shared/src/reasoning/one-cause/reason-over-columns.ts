import { type Exponents } from '../evidence/exponents.js';
import { writeReported } from '../evidence/reported.js';
import type { Expectation, Reasoning } from '../reasoning.js';
import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';
import { mostProbableColumns } from './most-probable-columns.js';

/**
 * Reasoning under *one cause*: exactly one of the K+1 columns is the case, so a
 * posterior is K+1 numbers and every row is a vector of logarithms that are
 * added with their exponents.
 */
export function reasonOverColumns(panel: CheckedPanel, view: View, exponents: Exponents): Reasoning {
  const { columns, findings } = panel;
  const logs = logPosterior(panel, view, exponents.rows, 1);
  const standing = normalise(logs.slice());

  return {
    exact: true,
    leftOut: 0,
    standing,
    sets: () => mostProbableColumns(standing),
    explains: () => [],
    standingOf: (other, otherExponents) => normalise(logPosterior(panel, other, otherExponents.rows, 1)),
    tempered: (factor) => normalise(logPosterior(panel, view, exponents.rows, factor)),

    withoutFinding(finding) {
      const { group } = findings[finding]!;
      const changed = logs.slice();
      // Its own row goes; the others of its group count for a little more.
      addRow(changed, view.evidence, finding, -exponents.rows[finding]!);
      const more = exponents.withoutOne[finding]! - exponents.rows[finding]!;
      for (let r = 0; r < findings.length; r += 1) {
        if (group >= 0 && r !== finding && findings[r]!.group === group)
          addRow(changed, view.evidence, r, more);
      }
      return normalise(changed);
    },

    swapped(finding, views, column) {
      const from = finding * columns;
      const exponent = exponents.rows[finding]!;
      return views.map((other) => {
        let sum = 0;
        let held = 0;
        for (let k = 0; k < columns; k += 1) {
          const change = other.evidence[from + k]! - view.evidence[from + k]!;
          const share = standing[k]! * Math.exp(exponent * change);
          sum += share;
          if (k === column) held = share;
        }
        return held / sum;
      });
    },

    expectation: (finding) => expectation(panel, view, standing, finding, exponents.rows[finding]!),
  };
}

/** ln prior + Σ γ × factor × evidence. Pending and unjudged rows have no evidence. */
function logPosterior(panel: CheckedPanel, view: View, rows: Float64Array, factor: number): Float64Array {
  const logs = view.prior.map(Math.log);
  for (let r = 0; r < panel.findings.length; r += 1) addRow(logs, view.evidence, r, rows[r]! * factor);
  return logs;
}

function addRow(logs: Float64Array, evidence: Float64Array, finding: number, exponent: number): void {
  const from = finding * logs.length;
  for (let column = 0; column < logs.length; column += 1)
    logs[column]! += exponent * evidence[from + column]!;
}

/** Turns logarithms into shares, in place, with the maximum subtracted. */
function normalise(logs: Float64Array): Float64Array {
  let top = -Infinity;
  for (let column = 0; column < logs.length; column += 1) if (logs[column]! > top) top = logs[column]!;
  let sum = 0;
  for (let column = 0; column < logs.length; column += 1) sum += logs[column] = Math.exp(logs[column]! - top);
  for (let column = 0; column < logs.length; column += 1) logs[column]! /= sum;
  return logs;
}

/** Expected divergence of the posterior from what it is now. Source: Lindley 1956, Ann. Math. Statist. 27:986-1005. */
function expectation(
  panel: CheckedPanel,
  view: View,
  standing: Float64Array,
  finding: number,
  exponent: number,
): Expectation {
  const { columns, findings } = panel;
  const reported = new Float64Array(columns);
  const levels: Expectation['levels'] = [];
  let nats = 0;
  for (let level = 0; level < findings[finding]!.levels; level += 1) {
    writeReported(view.cells, findings[finding]!, columns, level, reported);
    const after = new Float64Array(columns);
    let p = 0;
    let total = 0;
    let logs = 0;
    for (let column = 0; column < columns; column += 1) {
      const raised = exponent * Math.log(reported[column]!);
      p += standing[column]! * reported[column]!;
      total += after[column] = standing[column]! * Math.exp(raised);
      logs += after[column]! * raised;
    }
    for (let column = 0; column < columns; column += 1) after[column]! /= total;
    nats += p * (logs / total - Math.log(total));
    levels.push({ p, standing: after });
  }
  return { bits: Math.max(0, nats) / Math.LN2, levels };
}

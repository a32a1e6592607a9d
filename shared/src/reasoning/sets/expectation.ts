import type { Expectation } from '../reasoning.js';
import type { Asked, Bounded } from './asked.js';
import { fastLog } from './fast-log.js';
import { marginals } from './marginals.js';
import { writeRow } from './row-kernels.js';
import type { Support } from './significant.js';

/**
 * Expected divergence of the posterior over sets from what it is now, and where
 * the standing would be after each level of a pending finding.
 *
 * Source: Lindley 1956, Ann. Math. Statist. 27:986-1005.
 */
export function expectation(asked: Asked, support: Support, finding: number): Bounded<Expectation> {
  const { panel, table, view, exponents } = asked.posterior;
  const { shares, work, divided: after } = support;
  const exponent = exponents.rows[finding]!;
  const power = asked.power(exponent);
  const levels: Expectation['levels'] = [];
  let nats = 0;
  let missed = 0;
  for (let level = 0; level < panel.findings[finding]!.levels; level += 1) {
    writeRow(work, support, asked.row(view, finding, level));
    const p = sumAndLogs(shares, work, after);
    power.raise(work);
    let total = 0;
    let logs = 0;
    for (let index = 0; index < work.length; index += 1) {
      const share = shares[index]! * work[index]!;
      total += share;
      logs += share * after[index]!;
      after[index] = share;
    }
    for (let index = 0; index < after.length; index += 1) after[index]! /= total;
    // KL(after ‖ now), after / now being P'^γ / total.
    nats += p * ((exponent * logs) / total - Math.log(total));
    missed = Math.max(missed, support.aside / total);
    levels.push({ p, standing: marginals(table, support, after, after[0]!) });
  }
  return { value: { bits: Math.max(0, nats) / Math.LN2, levels }, missed };
}

/** Writes the logarithm of each likelihood, and returns Σ share × likelihood: how likely the level is. */
function sumAndLogs(shares: Float64Array, likelihoods: Float64Array, logs: Float64Array): number {
  let sum = 0;
  for (let index = 0; index < likelihoods.length; index += 1) {
    sum += shares[index]! * likelihoods[index]!;
    logs[index] = fastLog(likelihoods[index]!);
  }
  return sum;
}

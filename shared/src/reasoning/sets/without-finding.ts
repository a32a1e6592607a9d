import type { Asked, Bounded } from './asked.js';
import { marginals } from './marginals.js';
import { writeRow } from './row-kernels.js';
import type { Support } from './significant.js';

/**
 * The standing without one finding: its row is divided out of the posterior,
 * and the others of its group count for a little more, since n_g is one less.
 */
export function withoutFinding(asked: Asked, support: Support, finding: number): Bounded<Float64Array> {
  const { panel, table, view, exponents } = asked.posterior;
  const { shares, positions, work } = support;
  const exponent = exponents.withoutOne[finding]!;
  const more = exponent - exponents.rows[finding]!;
  const group = more > 0 ? asked.groupLogs(panel.findings[finding]!.group) : null;
  const row = asked.row(view, finding);
  writeRow(work, support, row);
  asked.power(exponent).raise(work);
  let total = 0;
  for (let p = 0; p < work.length; p += 1) {
    const others = group ? Math.exp(more * group[positions[p]!]!) : 1;
    total += work[p] = (shares[p]! * others) / work[p]!;
  }
  for (let p = 0; p < work.length; p += 1) work[p]! /= total;
  // P' of the others is at most 1, so no set left aside can have gained more than its own row took.
  return {
    value: marginals(table, support, work, work[0]!),
    missed: support.aside / row.least ** exponent / total,
  };
}

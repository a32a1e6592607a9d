import type { CheckedPanel } from '../validation/checked-panel.js';

/** How much each row counts, and what changes when one more or one fewer of its group is observed. */
export interface Exponents {
  /** For each finding γ = κ / (1 + (n_g - 1) o_g); a pending row counts as the next of its group. */
  rows: Float64Array;
  /** The exponent of the rows of a finding's group were it not observed; κ where it has no group. */
  withoutOne: Float64Array;
}

/**
 * Two findings that always come together would otherwise count twice: the rows
 * of a group are discounted by its overlap o_g and by n_g, the number of its
 * findings that are observed and judged by someone of positive weight.
 *
 * @param judged for each finding, whether someone of positive weight judged it
 * @param tempering κ, 0.3 to 1
 * @example two observed findings with overlap 1 get the exponent κ / 2 each
 */
export function exponents(panel: CheckedPanel, judged: readonly boolean[], tempering: number): Exponents {
  const { findings, overlaps } = panel;
  const sizes = overlaps.map(() => 0);
  findings.forEach(({ group, observed }, r) => {
    if (group >= 0 && observed !== null && judged[r]) sizes[group]! += 1;
  });
  const rows = new Float64Array(findings.length).fill(tempering);
  const withoutOne = new Float64Array(findings.length).fill(tempering);
  findings.forEach(({ group, observed }, r) => {
    if (group < 0) return;
    const size = sizes[group]! + (observed === null ? 1 : 0);
    // An observed row that nobody judged is not among those counted and may be alone in its group.
    rows[r] = tempering / (1 + Math.max(size - 1, 0) * overlaps[group]!);
    withoutOne[r] = tempering / (1 + Math.max(size - 2, 0) * overlaps[group]!);
  });
  return { rows, withoutOne };
}

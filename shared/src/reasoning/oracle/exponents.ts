import type { CheckedPanel } from '../validation/checked-panel.js';
import { at } from './at.js';

/**
 * How much each row counts: κ / (1 + (n_g - 1) o_g), n_g the findings of its
 * group that are observed and judged. A pending row is counted as if it were
 * the next of its group.
 */
export function exponents(panel: CheckedPanel, judged: readonly boolean[], tempering: number): number[] {
  return panel.findings.map(({ group, observed }) => {
    if (group < 0) return tempering;
    const others = panel.findings.filter(
      (other, index) => other.group === group && other.observed !== null && judged[index],
    ).length;
    const size = observed === null ? others + 1 : others;
    return tempering / (1 + (size - 1) * at(panel.overlaps, group));
  });
}

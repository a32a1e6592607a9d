import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';

/** Rows that count with the same exponent: they are multiplied first and raised once. */
export interface RowClass {
  exponent: number;
  rows: number[];
}

/** The observed and judged rows by `keyOf`, which must be the same only for rows of equal exponent. */
function classesBy(panel: CheckedPanel, view: View, exponents: Float64Array, keyOf: (row: number) => number) {
  const classes = new Map<number, RowClass>();
  panel.findings.forEach(({ observed }, r) => {
    if (observed === null || !view.judged[r]) return;
    const known = classes.get(keyOf(r));
    if (known) known.rows.push(r);
    else classes.set(keyOf(r), { exponent: exponents[r]!, rows: [r] });
  });
  return classes;
}

/** As few classes as there are different exponents. */
export function classesByExponent(
  panel: CheckedPanel,
  view: View,
  exponents: Float64Array,
): Iterable<RowClass> {
  return classesBy(panel, view, exponents, (r) => exponents[r]!).values();
}

/** A class for each group, by its position, and one for the rows without a group, at -1. */
export function classesByGroup(
  panel: CheckedPanel,
  view: View,
  exponents: Float64Array,
): ReadonlyMap<number, RowClass> {
  return classesBy(panel, view, exponents, (r) => panel.findings[r]!.group);
}

import type { CheckedPanel } from '../validation/checked-panel.js';
import type { View } from '../view.js';

/** Rows that count with the same exponent: they are multiplied first and raised once. */
export interface RowClass {
  exponent: number;
  rows: number[];
}

/** The observed and judged rows, in as few classes as there are different exponents. */
export function rowClasses(panel: CheckedPanel, view: View, exponents: Float64Array): Iterable<RowClass> {
  const classes = new Map<number, RowClass>();
  panel.findings.forEach(({ observed }, r) => {
    if (observed === null || !view.judged[r]) return;
    const exponent = exponents[r]!;
    const known = classes.get(exponent);
    if (known) known.rows.push(r);
    else classes.set(exponent, { exponent, rows: [r] });
  });
  return classes.values();
}

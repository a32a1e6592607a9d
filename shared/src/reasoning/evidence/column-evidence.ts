import type { CheckedPanel } from '../validation/checked-panel.js';
import { writeReported } from './reported.js';

/**
 * For each finding the logarithm of P'(observed | column) minus its mean over
 * the columns, K+1 numbers from position finding × (K+1); zeros for pending
 * and unjudged rows. What is common to all columns says nothing about any of
 * them, and without it the sums over 300 findings stay small.
 *
 * Natural logarithms, before the exponent of the row. Source: Good 1950,
 * Probability and the Weighing of Evidence.
 */
export function columnEvidence(
  panel: CheckedPanel,
  cells: Float64Array,
  judged: readonly boolean[],
): Float64Array {
  const { columns, findings } = panel;
  const evidence = new Float64Array(findings.length * columns);
  const reported = new Float64Array(columns);
  for (let r = 0; r < findings.length; r += 1) {
    const finding = findings[r]!;
    if (finding.observed === null || !judged[r]) continue;
    writeReported(cells, finding, columns, finding.observed, reported);
    const from = r * columns;
    let sum = 0;
    for (let column = 0; column < columns; column += 1) {
      sum += evidence[from + column] = Math.log(reported[column]!);
    }
    const mean = sum / columns;
    for (let column = 0; column < columns; column += 1) evidence[from + column]! -= mean;
  }
  return evidence;
}

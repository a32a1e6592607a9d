import type { CandidateSet, Explanation } from './assessment.js';
import type { Exponents } from './evidence/exponents.js';
import type { View } from './view.js';

/** What a pending finding is expected to do to the standing. */
export interface Expectation {
  bits: number;
  levels: { p: number; standing: Float64Array }[];
}

/**
 * The pooled view of a panel reasoned through under one assumption (one cause,
 * or candidates that may coexist), and the questions that can be put to it.
 * Standings are K+1 shares with *none of these* last.
 */
export interface Reasoning {
  exact: boolean;
  leftOut: number | null;
  standing: Float64Array;
  sets(): CandidateSet[];
  explains(): Explanation[];
  /** The standing of another view, its exponents taken anew. */
  standingOf(view: View, exponents: Exponents): Float64Array;
  /** The standing were every exponent `factor` times what it is. */
  tempered(factor: number): Float64Array;
  /** The standing were an observed and judged finding not observed. */
  withoutFinding(finding: number): Float64Array;
  /** One column's standing when a row takes the cells of each of these views instead of the pooled ones. */
  swapped(finding: number, views: readonly View[], column: number): number[];
  /** What to expect of a pending, judged finding. */
  expectation(finding: number): Expectation;
}

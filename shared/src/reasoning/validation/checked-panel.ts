/**
 * A panel after checking: defaults filled in, ids replaced by positions, every
 * distribution renormalised to sum 1. The engines take nothing else.
 */
export interface CheckedPanel {
  candidates: number;
  /** candidates + 1: none of these is the last column. */
  columns: number;
  coexistence: number;
  tempering: number;
  pairs: readonly CheckedPair[];
  /** Overlap of each group. */
  overlaps: readonly number[];
  findings: readonly CheckedFinding[];
  /** Length of the list that holds all cells of a view: the sum of columns × levels over the findings. */
  cellCount: number;
  contributors: readonly CheckedContributor[];
}

export interface CheckedPair {
  a: number;
  b: number;
  times: number;
}

export interface CheckedFinding {
  id: string;
  levels: number;
  observed: number | null;
  reliability: number;
  /** Position of the group, or -1. */
  group: number;
  cost: number;
  waitDays: number;
  burden: number;
  /** Where its cells begin in a list of all cells: columns × levels of them, one column after the other. */
  start: number;
}

export interface CheckedContributor {
  id: string;
  weight: number;
  prior: readonly number[] | null;
  /**
   * For each finding 0.25, 0.5 or 1 by how often the contributor meets it, and
   * 0 where the whole row was left blank.
   */
  exposures: Float64Array;
  /**
   * All cells, where the findings say. A column left blank is all zeros: a
   * judged share is never below 0.001, so a zero cannot be mistaken for one.
   */
  cells: Float64Array;
}

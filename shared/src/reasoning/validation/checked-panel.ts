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
}

export interface CheckedContributor {
  id: string;
  weight: number;
  prior: readonly number[] | null;
  /** For each finding; null where the contributor left the whole row blank. */
  judgements: readonly (Judgement | null)[];
}

export interface Judgement {
  /** 0.25, 0.5 or 1. */
  exposure: number;
  /**
   * columns × levels, one column after the other. A column left blank is all
   * zeros: a judged share is never below 0.001, so a zero cannot be mistaken.
   */
  cells: Float64Array;
}

/**
 * An assessment as it travels: what `assess` returns, what the server sends and
 * what `npm run assess` prints. Shares are fractions; lists over columns have
 * K+1 entries with *none of these* last.
 *
 * Objects keyed by ids have no prototype, so that an id such as `__proto__` is a
 * key like any other.
 */
export interface UnjudgedCell {
  finding: string;
  column: number;
}

/** A set of candidates (columns, ascending; empty: none of these) and its share. */
export interface CandidateSet {
  members: number[];
  p: number;
}

/** If candidate `if` is there, candidate `then` falls from share `from` to share `to`. */
export interface Explanation {
  if: number;
  then: number;
  from: number;
  to: number;
}

/** The column on which two contributors are furthest apart, in the probability of one level. */
export interface FurthestApart {
  column: number;
  low: { contributor: string; p: number };
  high: { contributor: string; p: number };
}

export interface AssessedRow {
  /** Decibans for each column, against the mean of the row; [] for pending or unjudged rows. */
  weightOfEvidence: number[];
  /** The same with one contributor's cells, by contributor; null where they left the column blank. */
  by: Record<string, (number | null)[]>;
  apart: FurthestApart | null;
  /** Largest change of the leader's share when the row takes one contributor's cells. */
  swing: number;
}

export interface NextTest {
  finding: string;
  /** What the result is expected to settle, in bits. */
  bits: number;
  /** Chance that the leader is another after the result. */
  leaderChanges: number;
  /** No other test settles as much for as little cost, wait and burden. */
  frontier: boolean;
  /** For each level: how likely it is, and the standing after it. */
  levels: { p: number; standing: number[] }[];
}

export interface StandingRange {
  low: number;
  high: number;
}

/** What `assess(panel, { only: 'standing' })` returns. */
export interface StandingOnly {
  method: 'weighhouse/1';
  standing: number[];
}

export interface Assessment extends StandingOnly {
  /** False where sets beyond a size were left out. */
  exact: boolean;
  /** Prior share of the sets that were not counted; null where pairs make it incomputable. */
  leftOut: number | null;
  priorGiven: boolean;
  pooledPrior: number[];
  /** For each judged finding, for each column, a share for each level. */
  pooledCells: Record<string, number[][]>;
  unjudged: UnjudgedCell[];
  sets: CandidateSet[];
  explains: Explanation[];
  own: Record<string, number[]>;
  linearPool: number[];
  disagreementBits: number;
  rows: Record<string, AssessedRow>;
  nextTests: NextTest[];
  without: {
    contributors: Record<string, number[] | null>;
    findings: Record<string, number[]>;
  };
  range: StandingRange[];
}

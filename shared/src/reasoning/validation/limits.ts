/**
 * The bounds of the method. A likelihood or a prior share of 0 or 1 would be a
 * veto that no later evidence could undo (Cromwell's rule: Lindley, Making
 * Decisions, 1985; quoted from memory), hence `smallestShare`.
 */
export const limits = {
  candidates: 30,
  findings: 300,
  contributors: 25,
  levels: 6,
  weight: 3,
  smallestShare: 0.001,
  largestLikelihood: 0.999,
  /** How far a sum of shares may be from 1; the rest is rounding of decimal input. */
  sum: 0.0005 + 1e-12,
  coexistence: 0.5,
  smallestTempering: 0.3,
  times: 100,
  burden: 3,
} as const;

/** How much a judgement counts by how often its author meets the finding. */
export const exposures: ReadonlyMap<unknown, number> = new Map([
  ['seldom', 0.25],
  ['sometimes', 0.5],
  ['often', 1],
]);

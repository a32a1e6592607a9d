/** What one finding adds. */
export interface Push {
  findingId: string;
  /** Above 0 it counts for the candidate, below 0 against. */
  decibans: number;
  /** The start and every push up to this one. */
  soFar: number;
  /** The candidate's share once this finding is counted; null where the order does not matter. */
  share: number | null;
}

/** A standing as a sum on the scale of odds, in decibans: start + all pushes = end. */
export interface WhySum {
  start: number;
  /** In order of size. */
  pushes: Push[];
  end: number;
  /** The pushes depend on the order in which the findings are counted. */
  inThisOrder: boolean;
}

/** Adds up what was worked out finding by finding. */
export function addedUp(start: number, steps: readonly Omit<Push, 'soFar'>[], inThisOrder: boolean): WhySum {
  let soFar = start;
  const pushes = steps.map((step) => {
    soFar += step.decibans;
    return { ...step, soFar };
  });
  return { start, pushes, end: soFar, inThisOrder };
}

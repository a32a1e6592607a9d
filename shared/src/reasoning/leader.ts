/** Shares closer than this are not told apart. */
export const equalStanding = 1e-12;

/** Position of the largest entry (none of these included), the first of those equal within 1e-12. */
export function leaderOf(standing: ArrayLike<number>): number {
  const least = largest(standing) - equalStanding;
  let leader = 0;
  while (standing[leader]! < least) leader += 1;
  return leader;
}

/** Whether another entry exceeds the leader's by more than 1e-12. */
export function leaderChanged(standing: ArrayLike<number>, leader: number): boolean {
  return largest(standing) > standing[leader]! + equalStanding;
}

function largest(standing: ArrayLike<number>): number {
  let most = -Infinity;
  for (let column = 0; column < standing.length; column += 1)
    if (standing[column]! > most) most = standing[column]!;
  return most;
}
